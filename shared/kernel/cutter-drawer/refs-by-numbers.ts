import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { CutterRefs, DrawerCutter } from './drawer-cutter.ts';
import { pickCutter } from './pick-cutter.ts';

/** What a person may have left out of a frame's copy; where it stands it must agree. */
const LABELS = ['name', 'number'];

/** Whether a frame's cutter carries all numbers of the drawer's, which is in the same unit. */
function carries(copy: Cutter, kept: Cutter): boolean {
  const [a, b] = [copy, kept] as unknown as Record<string, unknown>[];
  const keys = new Set([...Object.keys(a!), ...Object.keys(b!)]);
  return [...keys].every((key) => Object.is(a![key], b![key]) || (LABELS.includes(key) && a![key] === undefined));
}

/**
 * Which cutter of the drawer each cutter of a frame is, told by its numbers: the first that it carries all numbers of,
 * name and place in the changer too unless the frame leaves them out. Roles whose cutter is in no drawer are left out.
 */
export function refsByNumbers(
  { cutters, unit }: Pick<Particulars, 'cutters' | 'unit'>,
  drawer: readonly DrawerCutter[],
): CutterRefs {
  const inUnit = drawer.map((entry) => ({ id: entry.id, cutter: pickCutter(entry, unit) }));
  const refs: Partial<Record<CutterRole, string>> = {};
  for (const [role, copy] of Object.entries(cutters) as [CutterRole, Cutter | undefined][]) {
    const found = copy && inUnit.find(({ cutter }) => carries(copy, cutter));
    if (found) refs[role] = found.id;
  }
  return refs;
}

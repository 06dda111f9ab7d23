import type { CutterRole, Cutter } from '../cutters/cutter.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { CutterRefs, DrawerCutter } from './drawer-cutter.ts';
import { pickCutter } from './pick-cutter.ts';

const KEYS = [
  'kind',
  'diameter',
  'includedAngle',
  'tipRadius',
  'sideAngle',
  'profileRadius',
  'tipFlat',
  'fluteLength',
  'maxPass',
  'name',
  'number',
];

function sameCutter(a: Cutter | undefined, b: Cutter): boolean {
  return a !== undefined && KEYS.every((key) => Object.is(a[key as keyof Cutter], b[key as keyof Cutter]));
}

/** Roles whose copy in the frame is not what the drawer says, because one of the two was changed since it was picked. */
export function staleCutters(
  particulars: Particulars,
  refs: CutterRefs,
  drawer: readonly DrawerCutter[],
): CutterRole[] {
  return (Object.keys(refs) as CutterRole[]).filter((role) => {
    const kept = drawer.find((cutter) => cutter.id === refs[role]);
    return kept !== undefined && !sameCutter(particulars.cutters[role], pickCutter(kept, particulars.unit));
  });
}

/** The frame with a fresh copy of each cutter that it refers to; references that lead nowhere leave the frame's own. The very same object when nothing changes. */
export function refreshCutters(
  particulars: Particulars,
  refs: CutterRefs,
  drawer: readonly DrawerCutter[],
): Particulars {
  const fresh = staleCutters(particulars, refs, drawer).map((role) => [
    role,
    pickCutter(
      drawer.find((c) => c.id === refs[role])!,
      particulars.unit,
    ),
  ]);
  if (fresh.length === 0) return particulars;
  return {
    ...particulars,
    cutters: { ...particulars.cutters, ...(Object.fromEntries(fresh) as Partial<Particulars['cutters']>) },
  };
}

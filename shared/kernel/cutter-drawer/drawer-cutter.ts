import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import type { Unit } from '../units/unit.ts';

/** A cutter as it lies in a shop's drawer: its numbers in `unit`, with a name to pick it by. */
export interface DrawerEntry {
  readonly unit: Unit;
  readonly cutter: Cutter & { readonly name: string };
  /** What a person should know of it; '' for nothing. */
  readonly remarks: string;
}

/** One that is kept, with an id that frames refer to. */
export interface DrawerCutter extends DrawerEntry {
  readonly id: string;
}

/**
 * Which cutter of the drawer each cutter of a frame was picked from, by role. Kept beside a frame's draft and not in its
 * particulars: a frame file holds its own copy of the numbers, so that it stands by itself.
 */
export type CutterRefs = Readonly<Partial<Record<CutterRole, string>>>;

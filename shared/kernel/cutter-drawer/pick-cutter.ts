import { FIT } from '../checks/check-cutters.ts';
import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import type { Unit } from '../units/unit.ts';
import { convertCutter } from './convert-cutter.ts';
import type { DrawerEntry } from './drawer-cutter.ts';

/** The copy of a drawer's cutter that a frame in `unit` keeps. */
export const pickCutter = ({ cutter, unit: from }: DrawerEntry, unit: Unit): Cutter =>
  convertCutter(cutter, from, unit);

/** The work that a cutter can do on a frame, by its kind; whether it fits a frame's sizes is the checks' work. */
export const rolesOf = ({ kind }: Cutter): CutterRole[] =>
  (Object.keys(FIT) as CutterRole[]).filter((role) => FIT[role].includes(kind));

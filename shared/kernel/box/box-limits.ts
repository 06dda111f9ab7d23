import type { Unit } from '../units/unit.ts';

const byUnit = (inch: number, millimetre: number) => (unit: Unit) => (unit === 'in' ? inch : millimetre);

/** Most clearance of a dado that still holds its panel upright. Common practice, no source. */
export const mostClearance = byUnit(0.0625, 1.5);

/** Least width and height of an opening that is of use. Common practice, no source. */
export const leastOpening = byUnit(1, 25);

/** Most partitions of one box: more would not be a box but a rack. */
export const MOST_PARTITIONS = 20;

/** Least width of a top rail that covers no part. Common practice, no source. */
export const leastRail = byUnit(0.5, 12);

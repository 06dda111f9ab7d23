import type { Unit } from '../../units/unit.ts';

const byUnit = (inch: number, millimetre: number) => (unit: Unit) => (unit === 'in' ? inch : millimetre);

/** A coordinate this near a number of TIDY_DIGITS decimals is meant to be that: what is left over when a drawing far from its origin is moved. Unit of the frame. */
export const TIDY = 0.000_000_15;

/** Decimals of a tidied coordinate; as many as DXFs usually carry. */
export const TIDY_DIGITS = 6;

/** Share of its longest side by which a point is set off that side to be surely inside a loop. */
export const INSIDE_SHARE = 0.000_1;

/** Openings whose upper edges differ by no more stand in one row when they are put in reading order. Common practice, no source. */
export const sameRow = byUnit(0.5, 12);

/** Sides of a dado's rectangle may be this far off upright or level. */
export const upright = byUnit(0.0005, 0.01);

/** How far a coordinate of a frame made of members may lie from the traced one, and two widths that are called equal may differ. */
export const membersAgree = byUnit(0.0005, 0.01);

/** Share of membersAgree within which a layout is looked for first: floating point noise and no more. */
export const EXACT_SHARE = 0.001;

/** By how much the bulge of a half circle may be over 1 and still be one. */
export const HALF_CIRCLE = 0.000_01;

import type { Unit } from './units/unit.ts';

/** Two coordinates nearer than this are the same coordinate: rounding of sums such as (Bw − t) − (x + k). Unit of the frame. */
export const SAME = 1e-9;

/** Vertices nearer than this are welded when outlines are merged or read, so that no sliver is left. Unit of the frame. */
export const WELD = 1e-7;

/** Two directions whose sine of the angle between them is under this run on smoothly: no corner there. */
export const SMOOTH = 1e-7;

/** A bulge under this is a straight line. */
export const STRAIGHT_BULGE = 1e-12;

/** Proof: how far a coordinate read back may lie from the intended one when six decimals are written. Unit of the file. */
export const PROOF = 1e-6;

/** Sum of members against width or height: more than this and they do not add up. Unit of the frame. */
export const ADD_UP = 1e-6;

const byUnit = (inch: number, millimetre: number) => (unit: Unit) => (unit === 'in' ? inch : millimetre);

/** Corner lift: how far beyond the corner's sides a chord between two samples may let the cutter reach. */
export const liftChord = byUnit(0.0002, 0.005);

/** Curves drawn or compared as chords (screen, clip areas): largest distance from the curve. */
export const drawingChord = byUnit(0.001, 0.02);

/** Least board between a dado and an opening, an edge or another dado before a caution. */
export const leastWall = byUnit(0.125, 3);

/** A member narrower than the first and longer than the second is a caution. Common practice, no source. */
export const slenderWidth = byUnit(1.25, 32);
export const slenderLength = byUnit(24, 600);

/** Allowance wanted beyond the perimeter cutter's diameter. Common practice, no source. */
export const allowanceSpare = byUnit(0.125, 3);

/** How much MDF may be thicker than it says: ANSI A208.2 (from memory). */
export const boardTolerance = byUnit(0.005, 0.13);

/** Sheet of MDF for cabinets, 49 × 97 in. Common practice, no source. */
export const sheetShort = byUnit(49, 49 * 25.4);
export const sheetLong = byUnit(97, 97 * 25.4);

/** Least board left under a bead or quirk above a dado. Common practice, no source. */
export const leastUnderBead = byUnit(0.25, 6);

/** Share of the quirk cutter's width by which lines side by side overlap, so that no ridge is left between them. Common practice, no source. */
export const QUIRK_OVERLAP = 0.1;

/** Greatest share of the thickness that a dado may take. Common practice, no source. */
export const DEEPEST_DADO = 2 / 3;

/** How far a cutter may cut into the entered bead, or leave it standing, before a caution. Common practice, no source. */
export const beadShave = byUnit(0.002, 0.05);

/** Two stands of a cutter on its way up are not divided once their radii are this near. Unit of the frame. */
export const CLOSEST_STANDS = 1e-9;

/** Least angle that a chord of a flattened arc spans, so that a huge arc does not become endless chords. Radians. */
export const LEAST_CHORD_ANGLE = 1e-4;

/** Left in a corner, in the frame's unit: less than this is said to be nothing. */
export const NOTHING_LEFT = 1e-6;

/** Both sides of a step in a section, so that walls are drawn upright. Unit of the frame. */
export const BESIDE_STEP = 1e-7;

/** Dados whose depths differ by less are one line set. Unit of the frame. */
export const SAME_DEPTH = 1e-6;

/** Share of a corner's half angle by which looks along its walls keep off them: on a wall itself every stand only touches. */
export const OFF_THE_WALL = 1e-3;

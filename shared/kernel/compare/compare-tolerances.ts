import { convertLength } from '../units/convert-length.ts';
import type { Unit } from '../units/unit.ts';

/** Two lengths nearer than this, in inches, are the same length in both states: far under what a machine can place, far over rounding. */
const SAME_INCHES = 1e-6;

/** The same in a frame's unit. */
export const sameLength = (unit: Unit): number => convertLength(SAME_INCHES, 'in', unit);

/** Angles are entered and never worked out: nearer than this they are the same. Degrees. */
export const SAME_ANGLE = 1e-9;

/** Into how many pieces each line and arc is divided to find where two outlines lie furthest apart. */
export const OUTLINE_PIECES = 16;

/** Overlap, as a share of what both cover together, from which two things are one thing that changed: a sliver in common does not make them one. */
export const LEAST_OVERLAP = 0.05;

/** What the same label is worth between openings that overlap alike: it decides between equals and nothing else. */
export const LABEL_WORTH = 1e-6;

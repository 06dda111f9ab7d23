import { MM_PER_INCH, type Unit } from '../../units/unit.ts';

/** How far lines and arcs may lie from the ellipse or spline they stand for: 0.01 mm, in the drawing's unit. */
export const unitChord = (unit: Unit): number => (unit === 'in' ? 0.01 / MM_PER_INCH : 0.01);

/** The same where the unit is not known: this share of the curve's own size (its larger extent), which is scale-free. */
export const RELATIVE_CHORD = 1e-5;

/** No chord tolerance is taken finer than this share of the curve's size or of its distance from the origin: rounding. */
export const LEAST_CHORD = 1e-12;

/** A piece of a curve is a line when its control points lie within this share of the chord tolerance of the chord. */
export const STRAIGHT_SHARE = 1 / 16;

/** Arcs whose radius is more than this many chords are proved as lines, so that the proof does not drown in rounding. */
export const FLATTEST_ARC = 1e6;

/** Neighbouring arcs whose centres differ by less than this share of the radius are one arc. */
export const SAME_CIRCLE = 1e-9;

/** A placement whose two axes differ in length, or lean, by less than this share keeps circles round. */
export const ROUND_PLACEMENT = 1e-9;

/** Heights of one entity that differ by less than this share of its coordinates (at least of 1) are one height. */
export const FLAT = 1e-9;

/** An extrusion whose unit vector leans by less than this from the Z axis stands upright. */
export const UPRIGHT = 1e-9;

/** Knots nearer than this share of their whole range are one knot: a span between them draws nothing. */
export const SAME_KNOT = 1e-12;

/** An angle nearer than this to whole turns is whole turns. Radians. */
export const WHOLE_TURN = 1e-9;

/** Points to draw through that lie nearer than this share of their extents are one point. */
export const SAME_FIT_POINT = 1e-12;

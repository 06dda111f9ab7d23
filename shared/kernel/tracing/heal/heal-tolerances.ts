import { MM_PER_INCH, type Unit } from '../../units/unit.ts';

/** Gap between two ends that is closed when nobody says otherwise. Millimetres, whatever the drawing's unit. */
export const USUAL_GAP_MM = 0.05;

/** Greatest gap that may be asked for: under the smallest feature of a frame, so that no feature can be taken for a gap. Millimetres. */
export const GREATEST_GAP_MM = 1;

/** Ends nearer than this are one point and no gap: rounding of files with four decimals in mm or five in inches. Millimetres. */
const WELD_MM = 0.0005;

/** A segment shorter than this is a sliver. Millimetres, and never over a tenth of the gap. */
const SLIVER_MM = 0.005;

/** Share of the weld: an arc that rises less over its chord is a line; the centre of its circle could not be told. */
export const FLAT_SHARE = 0.01;

/** Share of its length by which a segment may lie beside another and still be a second copy of it, within the gap. */
export const COPY_SHARE = 0.1;

/** A drawing that lies further than this from its origin is worked on about an origin of its own. Drawing units. */
export const FAR_AWAY = 100_000;

/** A piece within the gap is a crumb of an edge more than so many gaps long; of a shorter one it may be a true part. */
export const FAR_LONGER = 4;

/** Sine between two directions under which their lines' crossing is too far along to be the corner that was meant: about 0.6°. */
export const NEARLY_PARALLEL = 0.01;

/** Sine between two directions at a crossing under which curves only touch. */
export const TOUCHING = 0.0001;

/** Crossings that are listed; a drawing with more is a hatch or a mistake, and nobody mends it one by one. */
export const MOST_CROSSINGS = 500;

/** Points of a cell of the welding grid are looked at one by one: cells are this many welds wide. */
export const WELDS_A_CELL = 64;

/** Arcs of one circle that follow each other become one arc up to this sweep: a fuller one has ends too near each other. Radians. */
export const WIDEST_ARC = 1.9 * Math.PI;

/** By how much the arcs of a full circle may miss a whole turn together, all their ends being on it. Radians. */
export const FULL_TURN = 0.01;

/** Lines of a run that may be an arc: this many at least. */
export const LEAST_ARC_LINES = 4;

/** A vertex that turns by more is a corner, never one of an arc drawn as lines: hexagons and octagons stay what they are. Radians, 30°. */
export const STEEPEST_ARC_TURN = Math.PI / 6;

/** Lines of an arc drawn as lines are alike in length up to this factor, but for the first and the last, which may be shorter. */
export const ARC_LINES_ALIKE = 1.5;

export interface HealLimits {
  readonly gap: number;
  readonly weld: number;
  readonly sliver: number;
}

/** The tolerances in drawing units. Throws for a gap below 0 or over GREATEST_GAP_MM. */
export function healLimits(gapMm: number, unit: Unit): HealLimits {
  if (!(gapMm >= 0 && gapMm <= GREATEST_GAP_MM))
    throw new RangeError(`gap: got ${gapMm} mm, takes 0 to ${GREATEST_GAP_MM}`);
  const inUnit = (mm: number) => (unit === 'in' ? mm / MM_PER_INCH : mm);
  return {
    gap: inUnit(Math.max(gapMm, WELD_MM)),
    weld: inUnit(WELD_MM),
    sliver: inUnit(Math.max(WELD_MM, Math.min(SLIVER_MM, gapMm / 10))),
  };
}

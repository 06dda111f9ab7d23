import type { Contour, Point } from '../contour/contour.ts';
import { offsetContour } from '../contour/offset-contour.ts';
import { canLift } from '../cutters/height-at-radius.ts';
import { passDepths } from '../cutters/pass-depths.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { throughDepth } from '../cutters/tip-depth.ts';
import type { Opening } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { liftChord } from '../tolerances.ts';
import { cornerLift } from './corner-lift.ts';
import { cornerDepth, heldDepth } from './held-depth.ts';
import { insideCorners } from './inside-corners.ts';
import { liftSamples } from './lift-samples.ts';
import type { LineSet, Shape } from './line-set.ts';

/** The numbers of the cut through an opening's edge; lengths below the face, radii about the axis. */
export interface OpeningCut {
  /** D: depth of the tip. */
  readonly tipDepth: number;
  /** z0: where the entered size is true. */
  readonly heldDepth: number;
  /** zc: the plane in which lifted corners are square. */
  readonly planeDepth: number;
  /** ρ(D − z0): how far the axis runs inside the entered size. */
  readonly axisOffset: number;
  /** How far the edge lies outside the entered size at the face, and at the back (negative: inside). */
  readonly atFace: number;
  readonly atBack: number;
  /** The same in the corners' plane. */
  readonly atPlane: number;
}

/** An opening that cannot be cut: why, where, and for an arc its radius. */
export interface OpeningProblem {
  readonly opening: Opening;
  readonly reason: 'small' | 'arc' | 'collapse' | 'crosses';
  readonly at: Point;
  readonly radius?: number;
}

/** Depths and offsets that follow from edge, board and opening cutter. */
export function openingCut({ edge, thickness, cutters, setup }: Particulars): OpeningCut {
  const cutter = cutters.opening;
  const tipDepth = throughDepth(cutter, thickness, setup.spoilboard);
  const held = heldDepth(edge, thickness);
  const plane = cornerDepth(edge);
  const axisOffset = radiusAtHeight(cutter, tipDepth - held);
  const widerAt = (depth: number) => radiusAtHeight(cutter, tipDepth - depth) - axisOffset;
  return { tipDepth, heldDepth: held, planeDepth: plane, axisOffset, atFace: widerAt(0), atBack: widerAt(thickness), atPlane: widerAt(plane) };
}

/** The axis of an opening's cut, or why there is none. */
function axisOf(opening: Opening, cut: OpeningCut): Contour | OpeningProblem {
  const { extents, width, height } = opening;
  if (Math.min(width, height) < 2 * cut.axisOffset) return { opening, reason: 'small', at: { x: extents.minX, y: extents.minY } };
  const moved = offsetContour(opening.contour, -cut.axisOffset);
  return moved.ok ? moved.contour : { opening, reason: moved.reason, at: moved.at, radius: moved.radius };
}

/** The entered openings, their axes and their corner lifts, frame view; openings that cannot be cut come back as problems. */
export function openingLineSets(particulars: Particulars, openings: readonly Opening[]): { lineSets: LineSet[]; problems: OpeningProblem[]; cut: OpeningCut } {
  const cutter = particulars.cutters.opening;
  const cut = openingCut(particulars);
  const problems: OpeningProblem[] = [];
  const entered: Shape[] = [];
  const axes: Shape[] = [];
  const lifts: Shape[] = [];
  const chord = liftChord(particulars.unit);
  const climb = canLift(cutter)
    ? { samples: liftSamples(cutter, cut.tipDepth - cut.planeDepth, chord), widening: cut.atPlane, planeDepth: cut.planeDepth, chord }
    : undefined;

  for (const opening of openings) {
    const axis = axisOf(opening, cut);
    if ('reason' in axis) {
      problems.push(axis);
      continue;
    }
    const of = [opening.id];
    entered.push({ kind: 'contour', contour: opening.contour, of });
    axes.push({ kind: 'contour', contour: axis, of });
    if (!climb) continue;
    for (const corner of insideCorners(opening.contour)) {
      const points = cornerLift(corner, climb);
      if (points) lifts.push({ kind: 'climb', points, of });
      else problems.push({ opening, reason: 'collapse', at: corner.after.a });
    }
  }
  const passes = passDepths(cut.tipDepth, cutter.maxPass);
  const common = { face: 'front', variant: '', cutter: 'opening', depth: cut.tipDepth } as const;
  const lineSets: LineSet[] = [];
  if (entered.length > 0) {
    lineSets.push({ ...common, set: 'OPENING', side: 'inside', passes, shapes: entered });
    lineSets.push({ ...common, set: 'OPENING_AXIS', side: 'on', passes, shapes: axes });
  }
  if (lifts.length > 0) lineSets.push({ ...common, set: 'CORNER_LIFT', side: 'on', passes: [cut.tipDepth], shapes: lifts });
  return { lineSets, problems, cut };
}

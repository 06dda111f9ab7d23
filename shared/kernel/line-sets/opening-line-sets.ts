import type { Contour, Point } from '../contour/contour.ts';
import { offsetContour } from '../contour/offset-contour.ts';
import { passDepths } from '../cutters/pass-depths.ts';
import type { Opening } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { liftChord } from '../tolerances.ts';
import { cornerLift, type LiftSettings } from './corner-lift.ts';
import { insideCorners } from './inside-corners.ts';
import { liftSamples } from './lift-samples.ts';
import type { LineSet, Shape } from './line-set.ts';
import type { OpeningCut } from './opening-cut.ts';

/** An opening that cannot be cut: why, where, and for an arc its radius. */
export interface OpeningProblem {
  readonly opening: Opening;
  readonly reason: 'small' | 'arc' | 'collapse' | 'crosses';
  readonly at: Point;
  readonly radius?: number;
}

/** The axis of an opening's cut, or why there is none. */
function axisOf(opening: Opening, cut: OpeningCut): Contour | OpeningProblem {
  const { extents, width, height } = opening;
  if (Math.min(width, height) < 2 * cut.axisOffset)
    return { opening, reason: 'small', at: { x: extents.minX, y: extents.minY } };
  const moved = offsetContour(opening.contour, -cut.axisOffset);
  return moved.ok ? moved.contour : { opening, reason: moved.reason, at: moved.at, radius: moved.radius };
}

/** How the cutter climbs into the corners of openings with this cut; undefined for a cutter that cannot. */
function liftSettings({ cutters: { opening: cutter }, unit }: Particulars, cut: OpeningCut): LiftSettings | undefined {
  if (cut.climbEnd === undefined) return undefined;
  const chord = liftChord(unit);
  return {
    samples: liftSamples(cutter, cut.tipDepth - cut.planeDepth, chord, cut.climbEnd - cut.planeDepth),
    widening: cut.atPlane,
    planeDepth: cut.planeDepth,
    chord,
  };
}

/**
 * The entered openings of one kind of edge, their axes and their corner lifts, frame view; openings that cannot be cut come
 * back as problems. `variant` tells the sets of square openings apart in a frame that has beaded ones too.
 */
export function openingLineSets(
  particulars: Particulars,
  openings: readonly Opening[],
  cut: OpeningCut,
  variant: string,
): { lineSets: LineSet[]; problems: OpeningProblem[] } {
  const cutter = particulars.cutters.opening;
  const problems: OpeningProblem[] = [];
  const entered: Shape[] = [];
  const axes: Shape[] = [];
  const lifts: Shape[] = [];
  const climb = liftSettings(particulars, cut);

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
  const common = { face: 'front', variant, cutter: 'opening', depth: cut.tipDepth } as const;
  const lineSets: LineSet[] = [];
  if (entered.length > 0) {
    lineSets.push({ ...common, set: 'OPENING', side: 'inside', passes, shapes: entered });
    lineSets.push({ ...common, set: 'OPENING_AXIS', side: 'on', passes, shapes: axes });
  }
  if (lifts.length > 0)
    lineSets.push({ ...common, set: 'CORNER_LIFT', side: 'on', passes: [cut.tipDepth], shapes: lifts });
  return { lineSets, problems };
}

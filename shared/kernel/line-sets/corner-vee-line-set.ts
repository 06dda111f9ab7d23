import { offsetContour } from '../contour/offset-contour.ts';
import type { Cutter, VeeCutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { Opening } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { drawingChord } from '../tolerances.ts';
import type { LineSet, Shape } from './line-set.ts';
import type { OpeningCut } from './opening-cut.ts';
import type { OpeningProblem } from './opening-line-sets.ts';
import { veeCorners } from './vee-corners.ts';

/** How deep the tip of a V-cutter begins in an opening's corners: as deep as its flute reaches, no deeper than the board. */
export const veeFloor = (cutter: Cutter, thickness: number): number => Math.min(cutter.fluteLength, thickness);

/** The V-cutter that follows into the corners of this cut; undefined when the edge does not ask for it, the cutter is no V, or its flute does not reach below the corners' plane. */
export function followingVee(
  { edge, cutters: { corner }, thickness }: Particulars,
  cut: OpeningCut,
): VeeCutter | undefined {
  if (edge.corners !== 'vee' || corner?.kind !== 'vee') return undefined;
  return veeFloor(corner, thickness) > cut.planeDepth ? corner : undefined;
}

/**
 * A V-cutter after the opening cutter, in every inside corner: sharp in the corners' plane, and leaving tan(β/2)·z a side at
 * z below it. Nothing where none follows.
 */
export function cornerVeeLineSet(
  p: Particulars,
  openings: readonly Opening[],
  cut: OpeningCut,
  variant: string,
): { lineSets: LineSet[]; problems: OpeningProblem[] } {
  const cutter = followingVee(p, cut);
  if (!cutter) return { lineSets: [], problems: [] };
  const floor = veeFloor(cutter, p.thickness);
  const shapes: Shape[] = [];
  const problems: OpeningProblem[] = [];
  const settings = {
    floor,
    plane: cut.planeDepth,
    filletRadius: radiusAtHeight(p.cutters.opening, cut.tipDepth - cut.planeDepth),
    cutter,
    chord: drawingChord(p.unit),
  };
  for (const opening of openings) {
    const wall = offsetContour(opening.contour, cut.atPlane);
    if (!wall.ok) {
      problems.push({ opening, reason: wall.reason, at: wall.at, radius: wall.radius });
      continue;
    }
    const { paths, missed } = veeCorners(wall.contour, settings);
    for (const points of paths) shapes.push({ kind: 'climb', points, of: [opening.id] });
    for (const at of missed) problems.push({ opening, reason: 'collapse', at });
  }
  if (shapes.length === 0) return { lineSets: [], problems };
  return {
    lineSets: [
      {
        face: 'front',
        set: 'CORNER_VEE',
        variant,
        cutter: 'corner',
        side: 'on',
        depth: floor,
        passes: [floor],
        shapes,
      },
    ],
    problems,
  };
}

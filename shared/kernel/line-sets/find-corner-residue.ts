import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { Opening } from '../frame/members.ts';
import type { CornerResidue } from './corner-residue.ts';
import { followingVee, veeFloor } from './corner-vee-line-set.ts';
import { insideCorners } from './inside-corners.ts';
import type { Particulars } from '../particulars/particulars.ts';
import type { OpeningCut } from './opening-cut.ts';
import { openingGroups } from './opening-groups.ts';

/** On the diagonal, a radius ρ tangent to both sides of a corner of inside angle θ leaves ρ(1/sin(θ/2) − 1); ρ(√2 − 1) when square. */
const diagonalShare = (angle: number) => 1 / Math.sin(angle / 2) - 1;

/**
 * What is left on the diagonal at depth z by lifting into the corner: the nearest that any stand of the cutter, tip at depth d,
 * comes to the corner of the walls at that depth. Walls stand inside the corner's sides by ρ(D − zc) − ρ(D − z).
 */
function liftedDiagonal(cutter: Cutter, cut: OpeningCut, climbEnd: number, angle: number, z: number): number {
  const { tipDepth, planeDepth } = cut;
  const highest = Math.max(z, climbEnd);
  const reach = 1 / Math.sin(angle / 2);
  const wall = radiusAtHeight(cutter, tipDepth - planeDepth) - radiusAtHeight(cutter, tipDepth - z);
  const left = (d: number) => reach * radiusAtHeight(cutter, d - planeDepth) - radiusAtHeight(cutter, d - z);
  // One valley between the end of the climb and full depth; golden-section search.
  const golden = (Math.sqrt(5) - 1) / 2;
  let [low, high] = [highest, tipDepth];
  for (let i = 0; i < 50; i++) {
    const a = high - golden * (high - low);
    const b = low + golden * (high - low);
    if (left(a) <= left(b)) high = b;
    else low = a;
  }
  return Math.max(0, Math.min(left(low), left(highest), left(tipDepth)) - reach * wall);
}

/**
 * What a V-cutter leaves on the diagonal at depth z: of its stands on the way up the one with its tip there comes nearest, at
 * (z − zc)·tan(β/2)/sin(θ/2) from the corner in its plane. Nothing is reached below where its tip begins.
 */
function followedDiagonal(
  vee: Cutter,
  cutter: Cutter,
  cut: OpeningCut,
  p: Particulars,
  angle: number,
  z: number,
): number {
  if (z >= veeFloor(vee, p.thickness)) return Infinity;
  const reach = 1 / Math.sin(angle / 2);
  const wall = radiusAtHeight(cutter, cut.tipDepth - cut.planeDepth) - radiusAtHeight(cutter, cut.tipDepth - z);
  return Math.max(0, reach * (radiusAtHeight(vee, z - cut.planeDepth) - wall));
}

/** Residue in the corners' plane (the face, or a bead's base) and at a quarter, half and all of the thickness, for each angle among an opening's corners. */
function findCornerResidue(p: Particulars, cut: OpeningCut, openings: readonly Opening[]): CornerResidue[] {
  const { thickness, cutters } = p;
  const cutter = cutters.opening;
  const vee = followingVee(p, cut);
  const byAngle = new Map<string, CornerResidue['levels']>();
  const levelsAt = (angle: number) => {
    const key = angle.toFixed(6);
    const known = byAngle.get(key);
    if (known) return known;
    const share = diagonalShare(angle);
    const levels = [cut.planeDepth, thickness / 4, thickness / 2, thickness].map((depth) => {
      const radius = radiusAtHeight(cutter, cut.tipDepth - depth);
      const unlifted = { radius, diagonal: radius * share };
      const before =
        cut.climbEnd === undefined ? unlifted.diagonal : liftedDiagonal(cutter, cut, cut.climbEnd, angle, depth);
      const lifted = cut.climbEnd === undefined ? unlifted : { radius: before / share, diagonal: before };
      const followed = vee && Math.min(before, followedDiagonal(vee, cutter, cut, p, angle, depth));
      return { depth, lifted, unlifted, followed };
    });
    byAngle.set(key, levels);
    return levels;
  };
  const out: CornerResidue[] = [];
  for (const opening of openings) {
    const counts = new Map<string, CornerResidue>();
    for (const corner of insideCorners(opening.contour)) {
      const key = corner.angle.toFixed(6);
      const known = counts.get(key);
      counts.set(key, {
        opening: opening.id,
        angle: corner.angle,
        place: known?.place ?? { x: corner.after.a.x, y: corner.after.a.y },
        count: (known?.count ?? 0) + 1,
        levels: levelsAt(corner.angle),
      });
    }
    out.push(...counts.values());
  }
  return out;
}

/** What is left in the corners of all openings of a frame. */
export const frameResidues = (p: Particulars, openings: readonly Opening[]): CornerResidue[] =>
  openingGroups(p, openings).groups.flatMap((group) => findCornerResidue(p, group.cut, group.openings));

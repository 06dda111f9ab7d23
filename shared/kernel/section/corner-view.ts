import type { Point } from '../contour/contour.ts';
import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { OpeningCut } from '../line-sets/opening-cut.ts';
import type { CornerMethod } from '../particulars/particulars.ts';
import { OFF_THE_WALL } from '../tolerances.ts';

/** An inside corner between straight sides, and what is done in it. */
export interface CornerSituation {
  readonly cutter: Cutter;
  readonly cut: OpeningCut;
  /** The V-cutter that follows, for method 'vee', and how deep its tip begins. */
  readonly vee?: { readonly cutter: Cutter; readonly floor: number };
  readonly method: CornerMethod;
  /** Inside angle, radians. */
  readonly angle: number;
}

/** What is left standing in the corner at one depth. */
export interface CornerSlice {
  readonly depth: number;
  /**
   * Outline of what is left, between both walls and the cutters' reach. The corner of the walls at this depth is at 0, 0,
   * the bisector runs along +X.
   */
  readonly left: readonly Point[];
  /** Along the bisector from the walls' corner to the first cut board. */
  readonly diagonal: number;
  /** How far the walls at this depth stand inside the corner's sides in its plane (negative: outside). */
  readonly wallInside: number;
}

/** One stand of a cutter: its axis along the bisector from the corner in its plane, and its radius at the depth looked at. */
interface Stand {
  readonly along: number;
  readonly radius: number;
}

const STANDS = 240;
const RAYS = 64;

/** All stands of a cutter with its tip from depth `from` up to `end`, or the one at `from` when it does not climb. */
function standsOf(
  cutter: Cutter,
  plane: number,
  from: number,
  z: number,
  reach: number,
  end: number | undefined,
): Stand[] {
  const out: Stand[] = [];
  const top = Math.max(z, end ?? from);
  for (let i = 0; i <= (end === undefined ? 0 : STANDS); i++) {
    // Denser towards the top, where a round nose changes fastest.
    const d = top + (from - top) * (1 - i / STANDS) ** 4;
    const radius = radiusAtHeight(cutter, d - z);
    if (radius > 0) out.push({ along: reach * radiusAtHeight(cutter, d - plane), radius });
  }
  return out;
}

/** Distance along a ray from the walls' corner (angle φ off the bisector) to the first stand that has cut there; Infinity for none. */
function firstCut(stands: readonly Stand[], from: number, phi: number): number {
  const cos = Math.cos(phi);
  const sin = Math.sin(phi);
  let first = Infinity;
  for (const { along, radius } of stands) {
    const ahead = (along - from) * cos;
    const aside = (along - from) * sin;
    const square = radius * radius - aside * aside;
    if (square < 0) continue;
    const half = Math.sqrt(square);
    if (ahead + half < 0) continue;
    first = Math.min(first, Math.max(0, ahead - half));
  }
  return first;
}

/**
 * What is left in an inside corner at a depth, by a method: the region between the walls that no stand of the cutters
 * reaches, found by looking along rays from the walls' corner. `round`: the cutter at full depth only; `lift`: all its
 * stands on the way up; `vee`: those, and a V-cutter's on its way up.
 */
export function cornerSlice(situation: CornerSituation, z: number): CornerSlice {
  const { cutter, cut, vee, method, angle } = situation;
  const reach = 1 / Math.sin(angle / 2);
  const end = method === 'round' ? undefined : cut.climbEnd;
  const stands = standsOf(cutter, cut.planeDepth, cut.tipDepth, z, reach, end);
  if (method === 'vee' && vee && vee.floor > z)
    stands.push(...standsOf(vee.cutter, cut.planeDepth, vee.floor, z, reach, cut.planeDepth));
  const wallInside = radiusAtHeight(cutter, cut.tipDepth - cut.planeDepth) - radiusAtHeight(cutter, cut.tipDepth - z);
  const corner = wallInside * reach;
  // Just off the walls themselves: there every stand only touches.
  const widest = (angle / 2) * (1 - OFF_THE_WALL);
  const left: Point[] = [{ x: 0, y: 0 }];
  for (let i = 0; i <= RAYS; i++) {
    const phi = widest * ((2 * i) / RAYS - 1);
    const t = firstCut(stands, corner, phi);
    left.push({ x: t * Math.cos(phi), y: t * Math.sin(phi) });
  }
  return { depth: z, left, diagonal: firstCut(stands, corner, 0), wallInside };
}

/** Slices in the corners' plane (the face, or a bead's base) and at a quarter, half and all of the thickness. */
export const cornerSlices = (situation: CornerSituation, thickness: number): CornerSlice[] =>
  [situation.cut.planeDepth, thickness / 4, thickness / 2, thickness].map((z) => cornerSlice(situation, z));

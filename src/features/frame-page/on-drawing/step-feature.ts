import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { FrameContours, Member, Opening } from '#shared/kernel/frame/members.ts';
import { SAME } from '#shared/kernel/tolerances.ts';

/** Going aside counts this much more than going ahead. */
const ASIDE = 3;

/** How far a coordinate lies outside a range; 0 within. */
const outside = (v: number, min: number, max: number): number => Math.max(min - v, v - max, 0);

const clamp = (v: number, min: number, max: number): number => Math.min(max, Math.max(min, v));

interface Step {
  readonly feature: Opening | Member;
  /** Where in it one stands then: its middle in the direction gone, else as near as possible to where one came from. */
  readonly at: Point;
}

/** Room between two places in a direction; 0 where they touch or lie beside each other. */
function gap(from: Extents, to: Extents, right: number, up: number): number {
  const across = right > 0 ? to.minX - from.maxX : right < 0 ? from.minX - to.maxX : 0;
  const along = up > 0 ? to.minY - from.maxY : up < 0 ? from.minY - to.maxY : 0;
  return Math.max(0, across, along);
}

/**
 * The opening or member next to `from` in a direction of frame view, on the line through `at`; null when none lies there.
 * `right` and `up` are −1, 0 or 1, one of them 0.
 */
export function stepFeature(
  { openings, members }: FrameContours,
  from: Opening | Member,
  at: Point,
  right: number,
  up: number,
): Step | null {
  const middle = (e: Extents): number => ((e.minX + e.maxX) / 2) * right + ((e.minY + e.maxY) / 2) * up;
  let best: Opening | Member | null = null;
  let least = Infinity;
  for (const feature of [...openings, ...members]) {
    const { extents: e } = feature;
    if (middle(e) - middle(from.extents) <= SAME) continue;
    const aside = right === 0 ? outside(at.x, e.minX, e.maxX) : outside(at.y, e.minY, e.maxY);
    const cost = gap(from.extents, e, right, up) + ASIDE * aside;
    if (cost >= least - SAME) continue;
    least = cost;
    best = feature;
  }
  if (best === null) return null;
  const { minX, maxX, minY, maxY } = best.extents;
  return {
    feature: best,
    at:
      right === 0
        ? { x: clamp(at.x, minX, maxX), y: (minY + maxY) / 2 }
        : { x: (minX + maxX) / 2, y: clamp(at.y, minY, maxY) },
  };
}

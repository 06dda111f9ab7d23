import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Placement } from '#shared/kernel/placing/placement.ts';
import type { Desk, Measuring } from './desk.ts';
import { nextPoint } from './snap-points.ts';

/** Begins measuring, or ends it. What is selected is left: the arrow keys go one way or the other. */
export function toggleMeasuring({ measuring, selection }: Desk): void {
  selection.set(null);
  measuring.set(measuring.get() ? null : { face: 'front', picked: [], at: null });
}

/** Takes a place as the first or second one; a third begins anew. */
export const pickPlace = (measuring: Measuring, p: Point): Measuring => ({
  ...measuring,
  at: p,
  picked: measuring.picked.length === 1 ? [...measuring.picked, p] : [p],
});

/** Steps to the next place to the right (or left, −1) and up (or down, −1) as the page shows it. `points` in frame view, not empty. */
export function stepPlace(
  measuring: Measuring,
  points: readonly Point[],
  pl: Placement,
  right: number,
  up: number,
): Measuring {
  if (measuring.at === null) return { ...measuring, at: points[0]! };
  const next = nextPoint(points, measuring.at, right * pl.sx, up * pl.sy);
  return next === null ? measuring : { ...measuring, at: next };
}

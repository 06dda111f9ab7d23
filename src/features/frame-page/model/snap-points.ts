import type { Point } from '#shared/kernel/contour/contour.ts';
import { rectangle } from '#shared/kernel/contour/make-contour.ts';
import { placeExtents, unplace } from '#shared/kernel/placing/place.ts';
import { SAME } from '#shared/kernel/tolerances.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/** The places that measuring catches, frame view: corners of perimeter, openings, dados and both boards. */
export function snapPoints({ contours, dados, back, front }: DrawnFrame): Point[] {
  const boards = [back, front].map((face) => rectangle(placeExtents(unplace(face.placement), face.board)));
  const all = [
    contours.perimeter,
    ...contours.openings.map((o) => o.contour),
    ...dados.map((d) => rectangle(d.extents)),
    ...boards,
  ];
  return all.flatMap((contour) => contour.vertices.map(({ x, y }) => ({ x, y })));
}

/** The nearest of some places, no further than `reach`; null when none is. */
export function nearestPoint(points: readonly Point[], to: Point, reach: number): Point | null {
  let best: Point | null = null;
  let least = reach;
  for (const p of points) {
    const away = Math.hypot(p.x - to.x, p.y - to.y);
    if (away > least) continue;
    least = away;
    best = p;
  }
  return best;
}

/**
 * The next place in a direction, for walking from place to place by arrow key: the nearest one ahead, where
 * going aside counts three times. Null when nothing lies ahead. `right` and `up` are −1, 0 or 1.
 */
export function nextPoint(points: readonly Point[], from: Point, right: number, up: number): Point | null {
  let best: Point | null = null;
  let least = Infinity;
  for (const p of points) {
    const ahead = (p.x - from.x) * right + (p.y - from.y) * up;
    const aside = Math.abs((p.x - from.x) * up) + Math.abs((p.y - from.y) * right);
    if (ahead <= SAME) continue;
    const cost = ahead + 3 * aside;
    if (cost >= least) continue;
    least = cost;
    best = p;
  }
  return best;
}

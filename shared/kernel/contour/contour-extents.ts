import type { Contour, Extents, Point } from './contour.ts';
import { segmentsOf, sweepHolds } from './segments.ts';

const QUARTERS = [
  [0, 1, 0],
  [Math.PI / 2, 0, 1],
  [Math.PI, -1, 0],
  [-Math.PI / 2, 0, -1],
] as const;

/** Smallest upright rectangle around points. Throws when there are none. */
export function pointExtents(points: Iterable<Point>): Extents {
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (const p of points) {
    if (p.x < minX) minX = p.x;
    if (p.x > maxX) maxX = p.x;
    if (p.y < minY) minY = p.y;
    if (p.y > maxY) maxY = p.y;
  }
  if (minX === Infinity) throw new RangeError('no points, no extents');
  return { minX, minY, maxX, maxY };
}

/** True extents of a contour, the crowns of its arcs included. Throws when it has no vertices. */
export function contourExtents(contour: Contour): Extents {
  const box = pointExtents(contour.vertices);
  if (contour.vertices.every((v) => v.bulge === 0)) return box;
  const crowns: Point[] = [];
  for (const segment of segmentsOf(contour)) {
    if (segment.kind !== 'arc') continue;
    for (const [angle, x, y] of QUARTERS)
      if (sweepHolds(segment, angle))
        crowns.push({ x: segment.centre.x + x * segment.radius, y: segment.centre.y + y * segment.radius });
  }
  return joinExtents(box, ...(crowns.length > 0 ? [pointExtents(crowns)] : []));
}

/** The rectangle around several. */
export function joinExtents(first: Extents, ...rest: readonly Extents[]): Extents {
  return rest.reduce(
    (a, b) => ({
      minX: Math.min(a.minX, b.minX),
      minY: Math.min(a.minY, b.minY),
      maxX: Math.max(a.maxX, b.maxX),
      maxY: Math.max(a.maxY, b.maxY),
    }),
    first,
  );
}

import type { Contour, Point3 } from './contour.ts';
import { segmentsOf } from './segments.ts';

/** Length of a contour along its lines and arcs. */
export function contourLength(contour: Contour): number {
  let length = 0;
  for (const s of segmentsOf(contour))
    length += s.kind === 'line' ? Math.hypot(s.b.x - s.a.x, s.b.y - s.a.y) : s.radius * Math.abs(s.sweep);
  return length;
}

/** Length of a path in space. */
export function pathLength(points: readonly Point3[]): number {
  let length = 0;
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1]!;
    const b = points[i]!;
    length += Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z);
  }
  return length;
}

import type { Carrier } from '../../contour/intersect-carriers.ts';
import { directionAt, type Segment } from '../../contour/segments.ts';

/** The line without ends or the full circle that a segment lies on. */
export const carrierOf = (s: Segment): Carrier =>
  s.kind === 'line'
    ? { kind: 'line', at: s.a, direction: directionAt(s, 'start') }
    : { kind: 'circle', centre: s.centre, radius: s.radius };

/** Distance of a point from the line without ends or the full circle that a segment lies on. */
export function distanceToCarrier(s: Segment, x: number, y: number): number {
  if (s.kind === 'arc') return Math.abs(Math.hypot(x - s.centre.x, y - s.centre.y) - s.radius);
  const d = directionAt(s, 'start');
  return Math.abs((x - s.a.x) * d.y - (y - s.a.y) * d.x);
}

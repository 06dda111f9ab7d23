import { SMOOTH } from '../tolerances.ts';
import type { Point } from './contour.ts';
import { intersectCarriers, type Carrier } from './intersect-carriers.ts';
import { directionAt, type Segment } from './segments.ts';

/** Radius of an arc moved `distance` to the right of its direction of travel; may come out 0 or negative: then it has collapsed. */
export const offsetRadius = (arc: { readonly radius: number; readonly sweep: number }, distance: number): number =>
  arc.radius + (arc.sweep > 0 ? distance : -distance);

/** What a segment lies on, moved `distance` to the right of its direction of travel; undefined when its arc collapses. */
function offsetCarrier(segment: Segment, distance: number): Carrier | undefined {
  if (segment.kind === 'line') {
    const direction = directionAt(segment, 'start');
    return {
      kind: 'line',
      at: { x: segment.a.x + direction.y * distance, y: segment.a.y - direction.x * distance },
      direction,
    };
  }
  const radius = offsetRadius(segment, distance);
  return radius > 0 ? { kind: 'circle', centre: segment.centre, radius } : undefined;
}

/** Sine of the turn from one segment into the next: positive to the left, 0 when they run on smoothly. −2 when the path turns back on itself. */
export function turnBetween(before: Segment, after: Segment): number {
  const d = directionAt(before, 'end');
  const e = directionAt(after, 'start');
  const sine = d.x * e.y - d.y * e.x;
  return Math.abs(sine) < SMOOTH ? (d.x * e.x + d.y * e.y > 0 ? 0 : -2) : sine;
}

/**
 * Where two joined segments meet once both are moved `distance` to the right of their direction of travel: the mitre,
 * lines and arcs extended until they meet, nearest to where they met before. Undefined when they meet no more.
 */
export function offsetJoint(before: Segment, after: Segment, distance: number): Point | undefined {
  const at = after.a;
  const turn = turnBetween(before, after);
  if (turn === -2) return undefined;
  if (turn === 0) {
    const d = directionAt(after, 'start');
    return { x: at.x + d.y * distance, y: at.y - d.x * distance };
  }
  const p = offsetCarrier(before, distance);
  const q = offsetCarrier(after, distance);
  if (!p || !q) return undefined;
  let nearest: Point | undefined;
  let least = Infinity;
  for (const point of intersectCarriers(p, q)) {
    const away = Math.hypot(point.x - at.x, point.y - at.y);
    if (away < least) {
      least = away;
      nearest = point;
    }
  }
  return nearest;
}

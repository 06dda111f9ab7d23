import { SAME } from '../tolerances.ts';
import type { Point } from './contour.ts';

/** A line without ends, or a full circle: what a segment lies on. */
export type Carrier =
  | { readonly kind: 'line'; readonly at: Point; readonly direction: Point }
  | { readonly kind: 'circle'; readonly centre: Point; readonly radius: number };

type Line = Extract<Carrier, { kind: 'line' }>;
type Circle = Extract<Carrier, { kind: 'circle' }>;

function lineLine(p: Line, q: Line): Point[] {
  const cross = p.direction.x * q.direction.y - p.direction.y * q.direction.x;
  if (Math.abs(cross) < SAME) return [];
  const t = ((q.at.x - p.at.x) * q.direction.y - (q.at.y - p.at.y) * q.direction.x) / cross;
  return [{ x: p.at.x + t * p.direction.x, y: p.at.y + t * p.direction.y }];
}

/** Half the chord that a circle cuts at distance `off` from its centre; undefined when it passes by. A touch counts as one point. */
function halfChord(radius: number, off: number): number | undefined {
  const square = radius * radius - off * off;
  if (square < -2 * radius * SAME) return undefined;
  return square <= 0 ? 0 : Math.sqrt(square);
}

function lineCircle(line: Line, circle: Circle): Point[] {
  const { direction: d } = line;
  const along = (circle.centre.x - line.at.x) * d.x + (circle.centre.y - line.at.y) * d.y;
  const foot = { x: line.at.x + along * d.x, y: line.at.y + along * d.y };
  const half = halfChord(circle.radius, Math.hypot(foot.x - circle.centre.x, foot.y - circle.centre.y));
  if (half === undefined) return [];
  if (half === 0) return [foot];
  return [
    { x: foot.x - half * d.x, y: foot.y - half * d.y },
    { x: foot.x + half * d.x, y: foot.y + half * d.y },
  ];
}

function circleCircle(p: Circle, q: Circle): Point[] {
  const dx = q.centre.x - p.centre.x;
  const dy = q.centre.y - p.centre.y;
  const apart = Math.hypot(dx, dy);
  if (apart < SAME) return [];
  const along = (apart * apart + p.radius * p.radius - q.radius * q.radius) / (2 * apart);
  const half = halfChord(p.radius, along);
  if (half === undefined) return [];
  const foot = { x: p.centre.x + (along * dx) / apart, y: p.centre.y + (along * dy) / apart };
  if (half === 0) return [foot];
  return [
    { x: foot.x - (half * dy) / apart, y: foot.y + (half * dx) / apart },
    { x: foot.x + (half * dy) / apart, y: foot.y - (half * dx) / apart },
  ];
}

/** Where two carriers meet: none, one or two points. Carriers that lie on one another have no meeting point. Directions are unit vectors. */
export function intersectCarriers(p: Carrier, q: Carrier): Point[] {
  if (p.kind === 'line') return q.kind === 'line' ? lineLine(p, q) : lineCircle(p, q);
  return q.kind === 'line' ? lineCircle(q, p) : circleCircle(p, q);
}

import type { Point } from './contour.ts';
import { intersectSegments } from './intersect-segments.ts';
import { sweepHolds, type ArcSegment, type LineSegment, type Segment } from './segments.ts';

function nearestOnLine(s: LineSegment, p: Point): Point {
  const dx = s.b.x - s.a.x;
  const dy = s.b.y - s.a.y;
  const t = Math.max(0, Math.min(1, ((p.x - s.a.x) * dx + (p.y - s.a.y) * dy) / (dx * dx + dy * dy)));
  return { x: s.a.x + t * dx, y: s.a.y + t * dy };
}

function nearestOnArc(s: ArcSegment, p: Point): Point {
  const away = Math.hypot(p.x - s.centre.x, p.y - s.centre.y);
  if (away > 0 && sweepHolds(s, Math.atan2(p.y - s.centre.y, p.x - s.centre.x)))
    return {
      x: s.centre.x + ((p.x - s.centre.x) * s.radius) / away,
      y: s.centre.y + ((p.y - s.centre.y) * s.radius) / away,
    };
  return Math.hypot(p.x - s.a.x, p.y - s.a.y) <= Math.hypot(p.x - s.b.x, p.y - s.b.y) ? s.a : s.b;
}

const nearestOn = (s: Segment, p: Point) => (s.kind === 'line' ? nearestOnLine(s, p) : nearestOnArc(s, p));

/** Points of one segment from which the other may be nearest: its ends, and where the other's centre looks across. */
function candidates(s: Segment, other: Segment): Point[] {
  return other.kind === 'arc' ? [s.a, s.b, nearestOn(s, other.centre)] : [s.a, s.b];
}

/** Least distance between two segments; 0 when they meet. */
export function segmentDistance(s: Segment, t: Segment): number {
  if (intersectSegments(s, t).length > 0) return 0;
  let least = Infinity;
  for (const p of candidates(s, t)) {
    const q = nearestOn(t, p);
    least = Math.min(least, Math.hypot(p.x - q.x, p.y - q.y));
  }
  for (const p of candidates(t, s)) {
    const q = nearestOn(s, p);
    least = Math.min(least, Math.hypot(p.x - q.x, p.y - q.y));
  }
  return least;
}

import { SAME, WELD } from '../tolerances.ts';
import type { Extents, Point } from './contour.ts';
import { intersectCarriers, type Carrier } from './intersect-carriers.ts';
import { directionAt, sweepHolds, type ArcSegment, type Segment } from './segments.ts';

/** Rectangle that surely holds a segment: exact for a line, the chord grown by the sagitta (or the whole circle) for an arc. */
export function segmentBounds(s: Segment): Extents {
  const box = {
    minX: Math.min(s.a.x, s.b.x),
    minY: Math.min(s.a.y, s.b.y),
    maxX: Math.max(s.a.x, s.b.x),
    maxY: Math.max(s.a.y, s.b.y),
  };
  if (s.kind === 'line') return box;
  const grow = s.radius * (1 - Math.cos(Math.min(Math.PI, Math.abs(s.sweep) / 2)));
  return { minX: box.minX - grow, minY: box.minY - grow, maxX: box.maxX + grow, maxY: box.maxY + grow };
}

const carrierOf = (s: Segment): Carrier =>
  s.kind === 'line'
    ? { kind: 'line', at: s.a, direction: directionAt(s, 'start') }
    : { kind: 'circle', centre: s.centre, radius: s.radius };

/** Whether a point of a segment's carrier lies on the segment, ends included within WELD. */
function holds(s: Segment, p: Point): boolean {
  if (Math.hypot(p.x - s.a.x, p.y - s.a.y) <= WELD || Math.hypot(p.x - s.b.x, p.y - s.b.y) <= WELD) return true;
  if (s.kind === 'arc') return sweepHolds(s, Math.atan2(p.y - s.centre.y, p.x - s.centre.x));
  const t = (p.x - s.a.x) * (s.b.x - s.a.x) + (p.y - s.a.y) * (s.b.y - s.a.y);
  return t >= 0 && t <= (s.b.x - s.a.x) ** 2 + (s.b.y - s.a.y) ** 2;
}

const onLine = (s: Segment, p: Point) => {
  const d = directionAt(s, 'start');
  return Math.abs((p.x - s.a.x) * d.y - (p.y - s.a.y) * d.x) <= WELD;
};
const sameCircle = (s: ArcSegment, t: ArcSegment) =>
  Math.hypot(s.centre.x - t.centre.x, s.centre.y - t.centre.y) <= WELD && Math.abs(s.radius - t.radius) <= WELD;

/** Ends of one segment that lie on the other, for segments on one carrier: where an overlap begins and ends. */
const overlapEnds = (s: Segment, t: Segment): Point[] => [
  ...[t.a, t.b].filter((p) => holds(s, p)),
  ...[s.a, s.b].filter((p) => holds(t, p)),
];

/** Points where two segments meet, touch or, when they lie on one carrier, where their overlap begins and ends. */
export function intersectSegments(s: Segment, t: Segment): Point[] {
  if (s.kind === 'line' && t.kind === 'line') {
    const d = directionAt(s, 'start');
    const e = directionAt(t, 'start');
    if (Math.abs(d.x * e.y - d.y * e.x) < SAME) return onLine(s, t.a) ? overlapEnds(s, t) : [];
  } else if (s.kind === 'arc' && t.kind === 'arc' && sameCircle(s, t)) {
    return overlapEnds(s, t);
  }
  return intersectCarriers(carrierOf(s), carrierOf(t)).filter((p) => holds(s, p) && holds(t, p));
}

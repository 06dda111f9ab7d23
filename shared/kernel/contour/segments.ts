import { STRAIGHT_BULGE } from '../tolerances.ts';
import type { Contour, Point } from './contour.ts';

export interface LineSegment {
  readonly kind: 'line';
  readonly a: Point;
  readonly b: Point;
}

/** `start` is the angle of `a` seen from the centre; `sweep` is signed, positive counter-clockwise. Radians. */
export interface ArcSegment {
  readonly kind: 'arc';
  readonly a: Point;
  readonly b: Point;
  readonly centre: Point;
  readonly radius: number;
  readonly start: number;
  readonly sweep: number;
}

export type Segment = LineSegment | ArcSegment;

/**
 * The segment from a to b with a bulge. With chord c: R = c(1 + b²)/(4|b|), centre off the chord's middle
 * by c(1 − b²)/(4b) to the left (DXF Reference, group 42). Throws when an arc has no chord.
 */
export function makeSegment(a: Point, b: Point, bulge: number): Segment {
  if (Math.abs(bulge) <= STRAIGHT_BULGE) return { kind: 'line', a, b };
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const chord = Math.hypot(dx, dy);
  if (chord === 0) throw new RangeError(`an arc from ${a.x}, ${a.y} has no chord`);
  const off = (1 - bulge * bulge) / (4 * bulge);
  const centre = { x: (a.x + b.x) / 2 - dy * off, y: (a.y + b.y) / 2 + dx * off };
  return {
    kind: 'arc',
    a,
    b,
    centre,
    radius: (chord * (1 + bulge * bulge)) / (4 * Math.abs(bulge)),
    start: Math.atan2(a.y - centre.y, a.x - centre.x),
    sweep: 4 * Math.atan(bulge),
  };
}

/** The segments of a contour in order; none for fewer than two vertices. */
export function segmentsOf(contour: Contour): Segment[] {
  const { vertices, closed } = contour;
  const last = closed ? vertices.length : vertices.length - 1;
  const out: Segment[] = [];
  if (vertices.length < 2) return out;
  for (let i = 0; i < last; i++) {
    const a = vertices[i]!;
    out.push(makeSegment(a, vertices[i + 1 === vertices.length ? 0 : i + 1]!, a.bulge));
  }
  return out;
}

/** Direction of travel where a segment begins (or ends), as a unit vector. */
export function directionAt(segment: Segment, end: 'start' | 'end'): Point {
  if (segment.kind === 'line') {
    // Not Math.hypot, which takes several times as long: this runs for each corner of each offset.
    const dx = segment.b.x - segment.a.x;
    const dy = segment.b.y - segment.a.y;
    const length = Math.sqrt(dx * dx + dy * dy);
    return { x: dx / length, y: dy / length };
  }
  const at = end === 'start' ? segment.a : segment.b;
  const side = segment.sweep > 0 ? 1 : -1;
  return {
    x: (-side * (at.y - segment.centre.y)) / segment.radius,
    y: (side * (at.x - segment.centre.x)) / segment.radius,
  };
}

/** Whether the angle (radians) lies within an arc's sweep, its ends included with `slack` radians. */
export function sweepHolds(arc: ArcSegment, angle: number, slack = 0): boolean {
  const turn = 2 * Math.PI;
  const along = arc.sweep > 0 ? angle - arc.start : arc.start - angle;
  const gone = ((along % turn) + turn) % turn;
  return gone <= Math.abs(arc.sweep) + slack || gone >= turn - slack;
}

import type { Contour, Point } from '../contour/contour.ts';
import { pointOnArc } from '../contour/flatten-contour.ts';
import { segmentsOf, sweepHolds, type Segment } from '../contour/segments.ts';
import type { LineChange } from './comparison.ts';
import { OUTLINE_PIECES } from './compare-tolerances.ts';

function distanceTo(segment: Segment, p: Point): number {
  const { a, b } = segment;
  if (segment.kind === 'line') {
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const squared = dx * dx + dy * dy;
    const along = squared === 0 ? 0 : ((p.x - a.x) * dx + (p.y - a.y) * dy) / squared;
    const share = Math.max(0, Math.min(1, along));
    return Math.hypot(a.x + share * dx - p.x, a.y + share * dy - p.y);
  }
  const [x, y] = [p.x - segment.centre.x, p.y - segment.centre.y];
  if (sweepHolds(segment, Math.atan2(y, x))) return Math.abs(Math.hypot(x, y) - segment.radius);
  return Math.min(Math.hypot(p.x - a.x, p.y - a.y), Math.hypot(p.x - b.x, p.y - b.y));
}

function* samples(segments: readonly Segment[]): Generator<Point> {
  for (const segment of segments)
    for (let i = 0; i < OUTLINE_PIECES; i++) {
      const share = i / OUTLINE_PIECES;
      const { a, b } = segment;
      if (i === 0) yield a;
      else if (segment.kind === 'arc') yield pointOnArc(segment, share);
      else yield { x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) };
    }
}

const furthest = (from: readonly Segment[], to: readonly Segment[]): { distance: number; at: Point } => {
  let found = { distance: 0, at: from[0]?.a ?? { x: 0, y: 0 } };
  for (const at of samples(from)) {
    let distance = Infinity;
    for (const segment of to) distance = Math.min(distance, distanceTo(segment, at));
    if (distance > found.distance) found = { distance, at };
  }
  return found;
};

const missing = (of: Contour, among: Contour, within: number): Point[] =>
  of.vertices
    .filter((v) => !among.vertices.some((w) => Math.hypot(v.x - w.x, v.y - w.y) <= within))
    .map(({ x, y }) => ({ x, y }));

/**
 * How far two closed outlines lie apart at most (the greater of both one-way distances, at vertices and at even steps
 * between them), and which vertices only one has. null when they are the same line within `within`; vertices on a line that
 * stays where it was are no change.
 */
export function compareLines(before: Contour, after: Contour, within: number): LineChange | null {
  const [from, to] = [segmentsOf(before), segmentsOf(after)];
  if (from.length === 0 || to.length === 0) return null;
  const forth = furthest(from, to);
  const back = furthest(to, from);
  const { distance, at } = back.distance > forth.distance ? back : forth;
  if (distance <= within) return null;
  return {
    distance,
    at,
    verticesGone: missing(before, after, within),
    verticesNew: missing(after, before, within),
  };
}

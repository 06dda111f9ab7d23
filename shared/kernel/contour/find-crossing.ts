import { WELD } from '../tolerances.ts';
import type { Contour, Extents, Point } from './contour.ts';
import { intersectSegments, segmentBounds } from './intersect-segments.ts';
import { segmentsOf, type Segment } from './segments.ts';

interface Entry {
  readonly segment: Segment;
  readonly box: Extents;
  readonly index: number;
}

const near = (p: Point, q: Point) => Math.abs(p.x - q.x) <= 2 * WELD && Math.abs(p.y - q.y) <= 2 * WELD;

/** Whether a meeting point of two segments of one contour is just the vertex that neighbours share. */
function isJoint(p: Entry, q: Entry, count: number, point: Point): boolean {
  const first = Math.min(p.index, q.index);
  const second = Math.max(p.index, q.index);
  const early = p.index < q.index ? p.segment : q.segment;
  return (
    (second === first + 1 && near(point, early.b)) || (first === 0 && second === count - 1 && near(point, early.a))
  );
}

const entriesOf = (contour: Contour): Entry[] =>
  segmentsOf(contour)
    .map((segment, index) => ({ segment, box: segmentBounds(segment), index }))
    .sort((p, q) => p.box.minX - q.box.minX);

/** A place where a contour crosses, touches or runs along itself, other than its own vertices; undefined when there is none. */
export function findCrossing(contour: Contour): Point | undefined {
  const entries = entriesOf(contour);
  const count = entries.length;
  // Sweep over X: only segments whose rectangles overlap are met.
  for (let i = 0; i < count; i++) {
    const p = entries[i]!;
    for (let j = i + 1; j < count; j++) {
      const q = entries[j]!;
      if (q.box.minX > p.box.maxX + WELD) break;
      if (q.box.minY > p.box.maxY + WELD || q.box.maxY < p.box.minY - WELD) continue;
      for (const point of intersectSegments(p.segment, q.segment)) if (!isJoint(p, q, count, point)) return point;
    }
  }
  return undefined;
}

/** A place where two contours meet or touch; undefined when there is none (apart, or one inside the other). */
export function findMeeting(a: Contour, b: Contour): Point | undefined {
  const others = entriesOf(b);
  for (const p of entriesOf(a)) {
    for (const q of others) {
      if (q.box.minX > p.box.maxX + WELD) break;
      if (q.box.maxX < p.box.minX - WELD || q.box.minY > p.box.maxY + WELD || q.box.maxY < p.box.minY - WELD) continue;
      const [point] = intersectSegments(p.segment, q.segment);
      if (point) return point;
    }
  }
  return undefined;
}

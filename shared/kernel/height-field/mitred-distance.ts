import type { Contour, Extents, Point } from '../contour/contour.ts';
import { segmentBounds } from '../contour/intersect-segments.ts';
import { turnBetween } from '../contour/offset-joint.ts';
import { directionAt, segmentsOf, type Segment } from '../contour/segments.ts';
import { squareToSegment, withinSweep } from './point-to-segment.ts';

/**
 * How far a place lies outside a closed counter-clockwise contour (negative: inside), measured so that all places of one
 * distance lie on the contour's mitred offset (offset-contour.ts): beside a corner by the side that is further, or within
 * a corner that points inwards by the nearer, the sides drawn on beyond it.
 */
export class MitredDistance {
  readonly segments: readonly Segment[];
  readonly boxes: readonly Extents[];
  private readonly turns: readonly number[];

  constructor(contour: Contour) {
    this.segments = segmentsOf(contour);
    this.boxes = this.segments.map(segmentBounds);
    this.turns = this.segments.map((s, i) => turnBetween(s, this.segments[(i + 1) % this.segments.length]!));
  }

  /** Straight-line distance beyond which no place of mitred distance `within` lies: further only beside sharp corners. */
  reach(within: number): number {
    // A corner of inside angle θ reaches 1/sin(θ/2) as far as its sides; sin θ/2 from the turn.
    const sharpest = this.segments.reduce((most, s, i) => {
      const d = directionAt(s, 'end');
      const e = directionAt(this.segments[(i + 1) % this.segments.length]!, 'start');
      const halfAngle = Math.sqrt(Math.max(0, (1 + d.x * e.x + d.y * e.y) / 2));
      return Math.max(most, 1 / Math.max(halfAngle, 1 / 64));
    }, 1);
    return within * sharpest;
  }

  /**
   * The distance, looking at the segments of the given places only (all, when left out): one of them must be the nearest.
   * Undefined when the nearest is further than `reach` away as the crow flies.
   */
  at(p: Point, among?: readonly number[], reach = Infinity): number | undefined {
    let nearest = -1;
    let least = reach * reach;
    const count = among ? among.length : this.segments.length;
    for (let k = 0; k < count; k++) {
      const i = among ? among[k]! : k;
      const square = squareToSegment(this.segments[i]!, p);
      if (square <= least) {
        least = square;
        nearest = i;
      }
    }
    if (nearest < 0) return undefined;
    const s = this.segments[nearest]!;
    const end = endBeyond(s, p);
    if (end === null) return outsideOf(s, p);
    const n = this.segments.length;
    const before = end === 'b' ? nearest : (nearest + n - 1) % n;
    const [p1, p2] = [outsideOf(this.segments[before]!, p), outsideOf(this.segments[(before + 1) % n]!, p)];
    return this.turns[before]! > 0 ? Math.max(p1, p2) : Math.min(p1, p2);
  }
}

/** Which end of a segment is nearest to a place; null when it is a place between them. */
function endBeyond(s: Segment, { x, y }: Point): 'a' | 'b' | null {
  if (s.kind === 'line') {
    const [dx, dy] = [s.b.x - s.a.x, s.b.y - s.a.y];
    const along = (x - s.a.x) * dx + (y - s.a.y) * dy;
    return along <= 0 ? 'a' : along >= dx * dx + dy * dy ? 'b' : null;
  }
  if (withinSweep(s, x, y)) return null;
  return (x - s.a.x) ** 2 + (y - s.a.y) ** 2 < (x - s.b.x) ** 2 + (y - s.b.y) ** 2 ? 'a' : 'b';
}

/** Distance to the right of a segment's carrier, which is outside a counter-clockwise contour. */
function outsideOf(s: Segment, { x, y }: Point): number {
  if (s.kind === 'arc') return (Math.hypot(x - s.centre.x, y - s.centre.y) - s.radius) * (s.sweep > 0 ? 1 : -1);
  const [dx, dy] = [s.b.x - s.a.x, s.b.y - s.a.y];
  return ((x - s.a.x) * dy - (y - s.a.y) * dx) / Math.hypot(dx, dy);
}

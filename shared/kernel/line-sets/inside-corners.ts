import type { Contour } from '../contour/contour.ts';
import { turnBetween } from '../contour/offset-joint.ts';
import { directionAt, segmentsOf, type Segment } from '../contour/segments.ts';

/** A corner that a round cutter inside a contour cannot fill. */
export interface InsideCorner {
  readonly before: Segment;
  readonly after: Segment;
  /** Inside angle, radians, under π. */
  readonly angle: number;
}

/** The inside corners of a counter-clockwise closed contour: where it turns left. Smooth joints are none. */
export function insideCorners(contour: Contour): InsideCorner[] {
  const segments = segmentsOf(contour);
  const out: InsideCorner[] = [];
  segments.forEach((after, i) => {
    const before = segments[i === 0 ? segments.length - 1 : i - 1]!;
    const sine = turnBetween(before, after);
    if (sine <= 0) return;
    const d = directionAt(before, 'end');
    const e = directionAt(after, 'start');
    out.push({ before, after, angle: Math.PI - Math.atan2(sine, d.x * e.x + d.y * e.y) });
  });
  return out;
}

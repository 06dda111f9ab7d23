import type { Contour, Point } from '../../contour/contour.ts';
import { pointOnArc } from '../../contour/flatten-contour.ts';
import { counterClockwise } from '../../contour/make-contour.ts';
import { directionAt, segmentsOf, type Segment } from '../../contour/segments.ts';
import { INSIDE_SHARE } from './frames-tolerances.ts';

/** A point inside a closed contour, close to the middle of its longest chord. Throws for one without segments. */
export function insidePoint(contour: Contour): Point {
  const segments = segmentsOf(counterClockwise(contour));
  const chord = (s: Segment) => Math.hypot(s.b.x - s.a.x, s.b.y - s.a.y);
  const longest = segments.reduce((s, t) => (chord(t) > chord(s) ? t : s));
  const off = chord(longest) * INSIDE_SHARE;
  // Inside is on the left. At the middle of an arc the tangent has the direction of the chord.
  const d = directionAt({ kind: 'line', a: longest.a, b: longest.b }, 'start');
  const middle =
    longest.kind === 'arc'
      ? pointOnArc(longest, 0.5)
      : { x: (longest.a.x + longest.b.x) / 2, y: (longest.a.y + longest.b.y) / 2 };
  return { x: middle.x - d.y * off, y: middle.y + d.x * off };
}

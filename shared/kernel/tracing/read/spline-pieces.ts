import type { Piece } from './bezier-piece.ts';
import { SAME_KNOT } from './read-tolerances.ts';

/**
 * The Bézier pieces of a B-spline, rational or not, one for each span of knots that draws something; exact. `points`
 * holds three numbers a control point: x·w, y·w, w. The curve runs from knot `degree` to knot `count`, clamped or not,
 * so that closed and periodic ones, whose control points come round again in the file, need nothing of their own. Each
 * control point of a piece is the spline's blossom at the span's two ends (Ramshaw, Blossoms are polar forms, 1989),
 * by de Boor's steps.
 */
export function splinePieces(points: Float64Array, knots: readonly number[], degree: number): Piece[] {
  const count = points.length / 3;
  const least = SAME_KNOT * (knots[count]! - knots[degree]!);
  const pieces: Piece[] = [];
  const steps = new Float64Array(3 * (degree + 1));
  for (let span = degree; span < count; span++) {
    const from = knots[span]!;
    const to = knots[span + 1]!;
    if (!(to - from > least)) continue;
    const piece = new Float64Array(3 * (degree + 1));
    for (let j = 0; j <= degree; j++) {
      blossom(points, knots, degree, span, from, to, j, steps);
      piece.set(steps.subarray(3 * degree, 3 * degree + 3), 3 * j);
    }
    // One piece begins exactly where the one before it ended.
    const before = pieces.at(-1);
    if (before) piece.set(before.subarray(before.length - 3), 0);
    pieces.push(piece);
  }
  return pieces;
}

/** de Boor's steps with `to` in the last `j` of them and `from` in the others; the value comes to stand last in `steps`. */
function blossom(
  points: Float64Array,
  knots: readonly number[],
  degree: number,
  span: number,
  from: number,
  to: number,
  j: number,
  steps: Float64Array,
): void {
  steps.set(points.subarray(3 * (span - degree), 3 * (span + 1)));
  for (let r = 1; r <= degree; r++) {
    const u = r > degree - j ? to : from;
    for (let i = degree; i >= r; i--) {
      const low = knots[span - degree + i]!;
      const high = knots[span + 1 + i - r]!;
      const share = (u - low) / (high - low);
      for (let k = 0; k < 3; k++) {
        const at = 3 * i + k;
        steps[at] = steps[at - 3]! + (steps[at]! - steps[at - 3]!) * share;
      }
    }
  }
}

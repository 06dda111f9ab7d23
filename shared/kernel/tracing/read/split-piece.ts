import type { Piece } from './bezier-piece.ts';

/** Both parts of a piece about a parameter between 0 and 1 (de Casteljau). */
export function splitPiece(piece: Piece, t: number): readonly [Piece, Piece] {
  const size = piece.length;
  const left = new Float64Array(size);
  const right = piece.slice();
  for (let k = 0; k < size; k += 3) {
    left[k] = right[0]!;
    left[k + 1] = right[1]!;
    left[k + 2] = right[2]!;
    for (let i = 0; i < size - 3 - k; i++) right[i] = right[i]! + (right[i + 3]! - right[i]!) * t;
  }
  return [left, right];
}

const STEPS = 40;

/**
 * Where a piece crosses the line through (x, y) that stands square on the direction (dx, dy), from behind it to before
 * it: a parameter; null when both ends lie on one side.
 */
export function crossingParameter(piece: Piece, x: number, y: number, dx: number, dy: number): number | null {
  const count = piece.length / 3;
  const ahead = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const w = piece[3 * i + 2]!;
    ahead[i] = (piece[3 * i]! - w * x) * dx + (piece[3 * i + 1]! - w * y) * dy;
  }
  let low = 0;
  let high = 1;
  let atLow = ahead[0]!;
  let atHigh = ahead[count - 1]!;
  if (!(atLow < 0 && atHigh > 0)) return null;
  const scratch = new Float64Array(count);
  // Regula falsi, the Illinois way: the end that stays put counts half.
  let side = 0;
  let t = 0.5;
  for (let step = 0; step < STEPS && high - low > Number.EPSILON; step++) {
    t = (low * atHigh - high * atLow) / (atHigh - atLow);
    if (!(t > low && t < high)) t = (low + high) / 2;
    const value = valueAt(ahead, t, scratch);
    if (value === 0) return t;
    if (value < 0) {
      low = t;
      atLow = value;
      if (side === -1) atHigh /= 2;
      side = -1;
    } else {
      high = t;
      atHigh = value;
      if (side === 1) atLow /= 2;
      side = 1;
    }
  }
  return t;
}

function valueAt(coefficients: Float64Array, t: number, scratch: Float64Array): number {
  scratch.set(coefficients);
  for (let k = coefficients.length - 1; k > 0; k--)
    for (let i = 0; i < k; i++) scratch[i] = scratch[i]! + (scratch[i + 1]! - scratch[i]!) * t;
  return scratch[0]!;
}

import type { Piece } from './bezier-piece.ts';
import { FLATTEST_ARC } from './read-tolerances.ts';

/**
 * Whether every control point, and so the whole piece, lies within a distance of the line from (x0, y0) to (x1, y1), its
 * ends included. As the piece runs from one end to the other, the line is as near to the piece, too.
 */
export function hullWithin(piece: Piece, x0: number, y0: number, x1: number, y1: number, distance: number): boolean {
  const length = Math.hypot(x1 - x0, y1 - y0);
  if (length === 0) return false;
  const dx = (x1 - x0) / length;
  const dy = (y1 - y0) / length;
  for (let i = 0; i < piece.length; i += 3) {
    const x = piece[i]! / piece[i + 2]! - x0;
    const y = piece[i + 1]! / piece[i + 2]! - y0;
    const along = x * dx + y * dy;
    const aside = Math.abs(y * dx - x * dy);
    if (!(aside <= distance && along >= -distance && along <= length + distance)) return false;
  }
  return true;
}

/** Products of binomial coefficients for the square of a Bernstein polynomial, by its count of coefficients. */
const SQUARES = new Map<number, Float64Array>();

/** C(p, i) · C(p, j) / C(2p, i + j), row by row. */
function squareShares(count: number): Float64Array {
  const known = SQUARES.get(count);
  if (known) return known;
  const choose = (n: number, k: number): number => (k === 0 ? 1 : (choose(n, k - 1) * (n - k + 1)) / k);
  const p = count - 1;
  const shares = new Float64Array(count * count);
  for (let i = 0; i < count; i++)
    for (let j = 0; j < count; j++) shares[i * count + j] = (choose(p, i) * choose(p, j)) / choose(2 * p, i + j);
  SQUARES.set(count, shares);
  return shares;
}

/**
 * Whether a piece keeps within the tolerance of the arc that leaves (x0, y0), where the piece begins, along the unit
 * tangent (tx, ty) and ends at (x1, y1), about square to which the piece ends. With q the piece seen from (x0, y0), c the
 * arc's centre seen from there and r its radius, |q − c|² − r² = |q|² − 2 q·c. In Bernstein form, over the square of the
 * weights, that function lies between its least and its greatest coefficient (convex hull), so it is enough that these
 * keep between (r − tolerance)² − r² and (r + tolerance)² − r². That the control points keep between the two radii says
 * that the piece runs along this arc and not along the rest of its circle.
 */
export function followsArc(
  piece: Piece,
  x0: number,
  y0: number,
  tx: number,
  ty: number,
  x1: number,
  y1: number,
  tolerance: number,
): boolean {
  const chordX = x1 - x0;
  const chordY = y1 - y0;
  const square = chordX * chordX + chordY * chordY;
  const aside = tx * chordY - ty * chordX;
  // The centre lies on the left normal at this signed distance: r = chord² / (2 n·chord).
  const radius = square / (2 * aside);
  const size = Math.abs(radius);
  const chord = Math.sqrt(square);
  if (!(size <= FLATTEST_ARC * chord)) {
    // The arc itself leaves its chord by chord² / 8r.
    return hullWithin(piece, x0, y0, x1, y1, tolerance - chord / (8 * FLATTEST_ARC));
  }
  if (tolerance >= size) return false;
  const cx = -ty * radius;
  const cy = tx * radius;
  const count = piece.length / 3;
  const shares = squareShares(count);
  const most = 2 * size * tolerance - tolerance * tolerance;
  const side = Math.sign(radius);
  const slack = size * tolerance;
  for (let k = 0; k <= 2 * (count - 1); k++) {
    let off = 0;
    let weights = 0;
    for (let i = Math.max(0, k - count + 1); i <= Math.min(k, count - 1); i++) {
      const j = k - i;
      const share = shares[i * count + j]!;
      const wi = piece[3 * i + 2]!;
      const wj = piece[3 * j + 2]!;
      const xi = piece[3 * i]! - x0 * wi;
      const yi = piece[3 * i + 1]! - y0 * wi;
      const xj = piece[3 * j]! - x0 * wj;
      const yj = piece[3 * j + 1]! - y0 * wj;
      off += share * (xi * xj + yi * yj - 2 * wi * (xj * cx + yj * cy));
      weights += share * wi * wj;
    }
    if (!(Math.abs(off) <= most * weights)) return false;
  }
  for (let i = 0; i < count; i++) {
    const w = piece[3 * i + 2]!;
    const x = piece[3 * i]! / w - x0 - cx;
    const y = piece[3 * i + 1]! / w - y0 - cy;
    const behind = side * (-cx * y + cy * x);
    const before = side * (x * (chordY - cy) - y * (chordX - cx));
    if (!(behind >= -slack && before >= -slack)) return false;
  }
  return true;
}

import { joinOfBiarc } from './biarc.ts';
import type { Piece } from './bezier-piece.ts';
import type { CurveSink } from './curve-sink.ts';
import { followsArc, hullWithin } from './prove-arc.ts';
import { FITS_A_CURVE, FITS_A_PIECE } from './read-limits.ts';
import { STRAIGHT_SHARE } from './read-tolerances.ts';
import { ArcRow } from './arc-row.ts';
import { crossingParameter, splitPiece } from './split-piece.ts';

/** Halving this often leaves less of a curve than a double can tell apart. */
const MOST_HALVINGS = 60;

/** Tangents at the ends of a piece that lie further than this from its chord call for halving it first. */
const LEAST_COSINE = 0.5;

/**
 * Lays lines and arcs along a row of pieces, each beginning where the one before it ended, and adds them to the sink.
 * Every one lies within the tolerance of the curve, and the curve within the tolerance of them: proved, not sampled
 * (prove-arc.ts). Arcs are biarcs, so that they run on smoothly where the curve does. False when a piece cannot be
 * followed, or not without far more arcs than any drawing needs.
 */
export function fitArcs(
  pieces: readonly Piece[],
  tolerance: number,
  sink: CurveSink,
  ends: readonly number[] | null,
): boolean {
  const origin = pieces[0]!;
  const originX = origin[0]! / origin[2]!;
  const originY = origin[1]! / origin[2]!;
  const row = new ArcRow(sink, originX, originY, ends);
  let left = FITS_A_CURVE + FITS_A_PIECE * pieces.length;
  const rest: { piece: Piece; halvings: number }[] = [];
  for (const far of pieces) {
    // Near the origin the proofs keep their digits.
    const piece = moved(far, -originX, -originY);
    rest.push({ piece, halvings: 0 });
    for (let next = rest.pop(); next !== undefined; next = rest.pop()) {
      sink.countFit();
      if (layAlong(next.piece, tolerance, row)) continue;
      if (next.halvings === MOST_HALVINGS || --left < 0) return false;
      const [before, behind] = splitPiece(next.piece, 0.5);
      rest.push({ piece: behind, halvings: next.halvings + 1 }, { piece: before, halvings: next.halvings + 1 });
    }
  }
  row.finish();
  return true;
}

function moved(piece: Piece, x: number, y: number): Piece {
  const out = new Float64Array(piece.length);
  for (let i = 0; i < piece.length; i += 3) {
    out[i] = piece[i]! + x * piece[i + 2]!;
    out[i + 1] = piece[i + 1]! + y * piece[i + 2]!;
    out[i + 2] = piece[i + 2]!;
  }
  return out;
}

/** Lays a line or two arcs along a piece; false when they would not keep to the tolerance. */
function layAlong(piece: Piece, tolerance: number, row: ArcRow): boolean {
  const last = piece.length - 3;
  const [x0, y0] = pointOf(piece, 0);
  const [x1, y1] = pointOf(piece, last);
  if (hullWithin(piece, x0, y0, x1, y1, tolerance * STRAIGHT_SHARE) || isSpeck(piece, tolerance)) {
    row.line(x1, y1);
    return true;
  }
  const from = direction(piece, 0, 3);
  const to = direction(piece, last, -3);
  if (from === null || to === null) return false;
  const chord = Math.hypot(x1 - x0, y1 - y0);
  if (chord === 0) return false;
  // `to` looks back from the end.
  const lean0 = (from[0] * (x1 - x0) + from[1] * (y1 - y0)) / chord;
  const lean1 = -(to[0] * (x1 - x0) + to[1] * (y1 - y0)) / chord;
  if (lean0 < LEAST_COSINE || lean1 < LEAST_COSINE) return false;
  const join = joinOfBiarc(x0, y0, from[0], from[1], x1, y1, -to[0], -to[1]);
  if (join === null) return false;
  const t = crossingParameter(piece, join.x, join.y, join.dx, join.dy);
  if (t === null) return false;
  const [left, right] = splitPiece(piece, t);
  if (!followsArc(left, x0, y0, from[0], from[1], join.x, join.y, tolerance)) return false;
  if (!followsArc(backwards(right), x1, y1, to[0], to[1], join.x, join.y, tolerance)) return false;
  row.arc(join.x, join.y, join.bulge0);
  row.arc(x1, y1, join.bulge1);
  return true;
}

const pointOf = (piece: Piece, i: number) => [piece[i]! / piece[i + 2]!, piece[i + 1]! / piece[i + 2]!] as const;

/** Whether the whole piece is smaller than the tolerance. */
function isSpeck(piece: Piece, tolerance: number): boolean {
  const [x, y] = pointOf(piece, 0);
  for (let i = 3; i < piece.length; i += 3) {
    const [px, py] = pointOf(piece, i);
    if (!(Math.hypot(px - x, py - y) <= tolerance / 2)) return false;
  }
  return true;
}

/** Unit vector from one end's control point to the next that lies elsewhere: the tangent there. */
function direction(piece: Piece, from: number, step: number): readonly [number, number] | null {
  const [x, y] = pointOf(piece, from);
  for (let i = from + step; i >= 0 && i < piece.length; i += step) {
    const [px, py] = pointOf(piece, i);
    const length = Math.hypot(px - x, py - y);
    if (length > 0) return [(px - x) / length, (py - y) / length];
  }
  return null;
}

function backwards(piece: Piece): Piece {
  const out = new Float64Array(piece.length);
  for (let i = 0; i < piece.length; i += 3) out.set(piece.subarray(piece.length - 3 - i, piece.length - i), i);
  return out;
}

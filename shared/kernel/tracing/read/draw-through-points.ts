import type { Piece } from './bezier-piece.ts';
import { SAME_FIT_POINT } from './read-tolerances.ts';

export type Pair = readonly [number, number];

/**
 * The smooth curve through points where a file gives no other: a cubic spline whose parameter grows with the chords'
 * lengths (Farin, Curves and Surfaces for CAGD, chapter 9). It leaves its first and reaches its last point along the
 * directions given, or without curvature; a closed one runs on smoothly. Empty for fewer than two points.
 */
export function drawThroughPoints(
  given: readonly Pair[],
  closed: boolean,
  startAlong: Pair | null,
  endAlong: Pair | null,
): Piece[] {
  const points = apart(given, closed);
  const spans = closed && points.length > 2 ? points.length : points.length - 1;
  if (spans < 1) return [];
  const at = (i: number): Pair => points[i % points.length]!;
  const chords = Array.from({ length: spans }, (_, i) => Math.hypot(at(i + 1)[0] - at(i)[0], at(i + 1)[1] - at(i)[1]));
  const ring = closed && points.length > 2;
  const slopes = [0, 1].map((axis) => {
    const values = points.map((point) => point[axis]!);
    if (ring) return ringSlopes(values, chords);
    return openSlopes(values, chords, unit(startAlong)?.[axis] ?? null, unit(endAlong)?.[axis] ?? null);
  });
  return chords.map((h, i) => {
    const [x0, y0] = at(i);
    const [x1, y1] = at(i + 1);
    const next = (i + 1) % points.length;
    const third = h / 3;
    const [dx, dy] = [slopes[0]!, slopes[1]!];
    return Float64Array.of(
      x0,
      y0,
      1,
      x0 + dx[i]! * third,
      y0 + dy[i]! * third,
      1,
      x1 - dx[next]! * third,
      y1 - dy[next]! * third,
      1,
      x1,
      y1,
      1,
    );
  });
}

/** Without points that repeat the one before, nor, in a closed curve, the first at the end. */
function apart(points: readonly Pair[], closed: boolean): Pair[] {
  const size = points.reduce(
    (most, [x, y]) => Math.max(most, Math.abs(x - points[0]![0]), Math.abs(y - points[0]![1])),
    0,
  );
  const same = (p: Pair, q: Pair) => Math.hypot(p[0] - q[0], p[1] - q[1]) <= SAME_FIT_POINT * size;
  const out: Pair[] = [];
  for (const point of points) if (out.length === 0 || !same(out[out.length - 1]!, point)) out.push(point);
  if (closed && out.length > 1 && same(out[0]!, out[out.length - 1]!)) out.pop();
  return out;
}

function unit(along: Pair | null): Pair | null {
  const length = along === null ? 0 : Math.hypot(along[0], along[1]);
  return along === null || !(length > 0) ? null : [along[0] / length, along[1] / length];
}

/** Slopes at the points of an open curve, where the second derivative is the same on both sides of each. */
function openSlopes(
  values: readonly number[],
  chords: readonly number[],
  start: number | null,
  end: number | null,
): number[] {
  const count = values.length;
  const low = new Array<number>(count).fill(0);
  const middle = new Array<number>(count).fill(1);
  const high = new Array<number>(count).fill(0);
  const right = new Array<number>(count).fill(0);
  const rise = (i: number) => (values[i + 1]! - values[i]!) / chords[i]!;
  for (let i = 1; i < count - 1; i++) {
    low[i] = chords[i]!;
    middle[i] = 2 * (chords[i - 1]! + chords[i]!);
    high[i] = chords[i - 1]!;
    right[i] = 3 * (chords[i]! * rise(i - 1) + chords[i - 1]! * rise(i));
  }
  // No curvature at an end: 2 m0 + m1 = 3 rise.
  if (start === null) [middle[0], high[0], right[0]] = [2, 1, 3 * rise(0)];
  else right[0] = start;
  if (end === null) [low[count - 1], middle[count - 1], right[count - 1]] = [1, 2, 3 * rise(count - 2)];
  else right[count - 1] = end;
  return solveBands(low, middle, high, right);
}

/** The same for a closed curve: the first and last rows reach round, which one more solution puts right (Sherman and Morrison). */
function ringSlopes(values: readonly number[], chords: readonly number[]): number[] {
  const count = values.length;
  const before = (i: number) => (i + count - 1) % count;
  const rise = (i: number) => (values[(i + 1) % count]! - values[i]!) / chords[i]!;
  const low = chords.slice();
  const middle = chords.map((h, i) => 2 * (chords[before(i)]! + h));
  const high = chords.map((_, i) => chords[before(i)]!);
  const right = chords.map((h, i) => 3 * (h * rise(before(i)) + chords[before(i)]! * rise(i)));
  const first = low[0]!;
  const last = high[count - 1]!;
  const lever = -middle[0]!;
  middle[0] = middle[0]! - lever;
  middle[count - 1] = middle[count - 1]! - (last * first) / lever;
  const reach = new Array<number>(count).fill(0);
  reach[0] = lever;
  reach[count - 1] = last;
  const plain = solveBands(low, middle, high, right);
  const turned = solveBands(low, middle, high, reach);
  const share =
    (plain[0]! + (first * plain[count - 1]!) / lever) / (1 + turned[0]! + (first * turned[count - 1]!) / lever);
  return plain.map((value, i) => value - share * turned[i]!);
}

/** Solves rows of three neighbours (Thomas); the rows are dominated by their middle. */
function solveBands(
  low: readonly number[],
  middle: readonly number[],
  high: readonly number[],
  right: readonly number[],
): number[] {
  const count = middle.length;
  const over = new Array<number>(count).fill(0);
  const out = new Array<number>(count).fill(0);
  for (let i = 0; i < count; i++) {
    const scale = middle[i]! - (i > 0 ? low[i]! * over[i - 1]! : 0);
    over[i] = high[i]! / scale;
    out[i] = (right[i]! - (i > 0 ? low[i]! * out[i - 1]! : 0)) / scale;
  }
  for (let i = count - 2; i >= 0; i--) out[i] = out[i]! - over[i]! * out[i + 1]!;
  return out;
}

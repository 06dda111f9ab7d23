import type { Piece } from './bezier-piece.ts';
import { drawThroughPoints, type Pair } from './draw-through-points.ts';
import type { DrawingPen } from './drawing-pen.ts';
import { drawn, refused, type Drawn } from './entity-plane.ts';
import type { EntityTags } from './entity-tags.ts';
import type { ProblemList } from './problem-list.ts';
import { HIGHEST_DEGREE, MOST_SPLINE_POINTS, WEIGHT_RANGE } from './read-limits.ts';
import { FLAT } from './read-tolerances.ts';
import { splinePieces } from './spline-pieces.ts';

/** Flags of SPLINE (DXF Reference, group 70). */
const CLOSED = 1 | 2;

/** What a SPLINE says, as it stands in the file. */
interface SplineData {
  degree: number;
  flags: number;
  readonly knots: number[];
  readonly weights: number[];
  readonly controlX: number[];
  readonly controlY: number[];
  readonly fitX: number[];
  readonly fitY: number[];
  startX: number;
  startY: number;
  endX: number;
  endY: number;
  lowest: number;
  highest: number;
}

/**
 * SPLINE, in the drawing's own coordinates (DXF Reference, SPLINE): knots in groups 40, weights in 41, control points in
 * 10, fit points in 11, directions at the ends in 12 and 13. Control points come first; where there are none, the curve is
 * drawn through the fit points, and that is told. The counts in groups 72 to 74 are not believed.
 */
export function drawSpline(tags: EntityTags, pen: DrawingPen, problems: ProblemList): Drawn {
  const data = readSpline(tags);
  const { degree, knots, weights, controlX, controlY, fitX, fitY } = data;
  for (const [xs, ys] of [
    [controlX, controlY],
    [fitX, fitY],
  ] as const)
    if (xs.length !== ys.length) tags.need(NaN);
  if (tags.fault !== null) return refused(tags.fault.reason);
  if (controlX.length === 0 && fitX.length === 0) return refused('spline-data');
  if (Math.max(controlX.length, fitX.length) > MOST_SPLINE_POINTS) return refused('spline-data');
  const far = controlX.reduce((most, x, i) => Math.max(most, Math.abs(x), Math.abs(controlY[i]!)), 1);
  if (data.highest - data.lowest > FLAT * far) return refused('not-flat');
  const lifted = data.highest > -Infinity && data.lowest !== 0;
  const closed = (data.flags & CLOSED) !== 0;
  if (controlX.length === 0) {
    const points = fitX.map((x, i): Pair => [x, fitY[i]!]);
    const start: Pair | null = data.startX === data.startX ? [data.startX, data.startY] : null;
    const end: Pair | null = data.endX === data.endX ? [data.endX, data.endY] : null;
    const pieces = drawThroughPoints(points, closed, start, end);
    if (pieces.length > 0) pen.pieces(pieces);
    problems.tally('spline-through-points', tellThroughPoints, tags.line);
    return drawn(lifted);
  }
  if (!fits(degree, knots, weights, controlX.length)) return refused('spline-data');
  const points = new Float64Array(3 * controlX.length);
  for (let i = 0; i < controlX.length; i++) {
    const w = weights[i] ?? 1;
    points.set([controlX[i]! * w, controlY[i]! * w, w], 3 * i);
  }
  const pieces = splinePieces(points, knots, degree);
  if (pieces.length === 0) return refused('spline-data');
  pen.pieces(pieces);
  if (closed && !meets(pieces, far)) problems.tally('spline-left-open', tellLeftOpen, tags.line);
  return drawn(lifted);
}

/** Whether the last piece ends where the first begins. */
function meets(pieces: readonly Piece[], far: number): boolean {
  const first = pieces[0]!;
  const [x, y, w] = pieces[pieces.length - 1]!.subarray(-3);
  return Math.hypot(x! / w! - first[0]! / first[2]!, y! / w! - first[1]! / first[2]!) <= FLAT * far;
}

const tellLeftOpen = (n: number): string =>
  `${n === 1 ? '1 spline is' : `${n} splines are`} marked closed, but the ends do not meet; the gap was left.`;

const tellThroughPoints = (n: number): string =>
  `${n === 1 ? '1 spline says' : `${n} splines say`} only which points to pass: a smooth cubic was drawn through them. Check its shape.`;

/** Whether degree, knots and weights make a curve of that many control points. */
function fits(degree: number, knots: readonly number[], weights: readonly number[], count: number): boolean {
  if (!(degree >= 1 && degree <= HIGHEST_DEGREE) || count <= degree) return false;
  if (knots.length !== count + degree + 1 || (weights.length !== 0 && weights.length !== count)) return false;
  for (let i = 1; i < knots.length; i++) if (!(knots[i]! >= knots[i - 1]!)) return false;
  let least = Infinity;
  let most = 0;
  for (const weight of weights) {
    least = Math.min(least, weight);
    most = Math.max(most, weight);
  }
  return weights.length === 0 || (least > 0 && most <= WEIGHT_RANGE * least);
}

function readSpline(tags: EntityTags): SplineData {
  const data: SplineData = {
    degree: 3,
    flags: 0,
    knots: [],
    weights: [],
    controlX: [],
    controlY: [],
    fitX: [],
    fitY: [],
    startX: NaN,
    startY: NaN,
    endX: NaN,
    endY: NaN,
    lowest: Infinity,
    highest: -Infinity,
  };
  for (let i = 0; i < tags.count; i++)
    switch (tags.codes[i]!) {
      case 70:
        data.flags = tags.whole(i);
        break;
      case 71:
        data.degree = tags.whole(i);
        break;
      case 40:
        data.knots.push(tags.number(i));
        break;
      case 41:
        data.weights.push(tags.number(i));
        break;
      case 10:
        data.controlX.push(tags.number(i));
        break;
      case 20:
        data.controlY.push(tags.number(i));
        break;
      case 11:
        data.fitX.push(tags.number(i));
        break;
      case 21:
        data.fitY.push(tags.number(i));
        break;
      case 12:
        data.startX = tags.number(i);
        break;
      case 22:
        data.startY = tags.number(i);
        break;
      case 13:
        data.endX = tags.number(i);
        break;
      case 23:
        data.endY = tags.number(i);
        break;
      case 30:
      case 31: {
        const z = tags.number(i);
        data.lowest = Math.min(data.lowest, z);
        data.highest = Math.max(data.highest, z);
        break;
      }
    }
  return data;
}

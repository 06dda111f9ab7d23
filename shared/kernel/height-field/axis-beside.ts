import type { Contour, Point } from '../contour/contour.ts';
import { contourArea } from '../contour/contour-area.ts';
import { containsPoint } from '../contour/contains-point.ts';
import { intersectSegments, segmentBounds } from '../contour/intersect-segments.ts';
import { reverseContour } from '../contour/make-contour.ts';
import { offsetRadius, turnBetween } from '../contour/offset-joint.ts';
import { directionAt, segmentsOf, type ArcSegment, type Segment } from '../contour/segments.ts';
import { pointOnArc } from '../contour/flatten-contour.ts';
import type { CutterSide } from '../line-sets/line-set.ts';
import { WELD } from '../tolerances.ts';
import { squareToSegment } from './point-to-segment.ts';

/**
 * The axis of a round cutter of radius `distance` that runs along lines on one side and touches them: every place at that
 * distance from the nearest of them. It rolls about corners that point at it and stops short in those that open to it,
 * as machines do. 'inside' and 'outside' are those of closed contours taken together, islands counted; 'waste' is the
 * outside of closed ones and the right of an open one's direction of travel. Pieces come in no order.
 */
export function axisBeside(contours: readonly Contour[], side: CutterSide, distance: number): Segment[] {
  if (side === 'on' || side === 'none') return contours.flatMap(segmentsOf);
  const lines = contours.map((c) => segmentsOf(c.closed ? orient(c, contours) : c));
  const right = side === 'inside' ? -distance : distance;
  const raw = lines.flatMap((segments, i) => moveAside(segments, contours[i]!.closed, right));
  return keepClear(cutWhereMet(raw), lines.flat(), distance);
}

/** Counter-clockwise, or clockwise for an island: its inside is then the waste. */
function orient(contour: Contour, all: readonly Contour[]): Contour {
  const [first] = contour.vertices;
  const around = all.filter((other) => other !== contour && other.closed && containsPoint(other, first!)).length;
  return contourArea(contour) > 0 === (around % 2 === 0) ? contour : reverseContour(contour);
}

/** Each segment moved to the right, and an arc about each corner that the right side goes round. Neighbours share their ends. */
function moveAside(segments: readonly Segment[], closed: boolean, right: number): Segment[] {
  const out: Segment[] = [];
  segments.forEach((s, i) => {
    const moved = moveSegment(s, right);
    if (moved) out.push(moved);
    const next = segments[i + 1] ?? (closed ? segments[0] : undefined);
    if (!next) return;
    const turn = turnBetween(s, next);
    if (turn === -2 || turn * right > 0) out.push(roundCorner(s, next, right));
  });
  return out;
}

const aside = (p: Point, d: Point, right: number): Point => ({ x: p.x + d.y * right, y: p.y - d.x * right });

/** undefined for an arc that is used up: its neighbours meet without it. */
function moveSegment(s: Segment, right: number): Segment | undefined {
  const a = aside(s.a, directionAt(s, 'start'), right);
  const b = aside(s.b, directionAt(s, 'end'), right);
  if (s.kind === 'line') return { kind: 'line', a, b };
  const radius = offsetRadius(s, right);
  return radius > WELD ? { ...s, a, b, radius } : undefined;
}

function roundCorner(before: Segment, after: Segment, right: number): ArcSegment {
  const centre = before.b;
  const a = aside(centre, directionAt(before, 'end'), right);
  const b = aside(centre, directionAt(after, 'start'), right);
  const start = Math.atan2(a.y - centre.y, a.x - centre.x);
  const turn = 2 * Math.PI;
  const sweep = (((Math.atan2(b.y - centre.y, b.x - centre.x) - start) % turn) + turn) % turn;
  return {
    kind: 'arc',
    a,
    b,
    centre,
    radius: Math.abs(right),
    start,
    sweep: right > 0 ? sweep : sweep === 0 ? 0 : sweep - turn,
  };
}

/** How far along a segment a point of it lies: a length for lines, an angle for arcs. */
function placeOn(s: Segment, p: Point): number {
  if (s.kind === 'line') return Math.hypot(p.x - s.a.x, p.y - s.a.y);
  const turn = 2 * Math.PI;
  const along = Math.atan2(p.y - s.centre.y, p.x - s.centre.x) - s.start;
  return (((s.sweep > 0 ? along : -along) % turn) + turn) % turn;
}

function pieceOf(s: Segment, a: Point, b: Point): Segment {
  if (s.kind === 'line') return { kind: 'line', a, b };
  const from = a === s.a ? 0 : placeOn(s, a);
  const to = b === s.b ? Math.abs(s.sweep) : placeOn(s, b);
  const direction = Math.sign(s.sweep);
  return { ...s, a, b, start: s.start + direction * from, sweep: direction * (to - from) };
}

/** Segments cut at every place where one meets another. */
function cutWhereMet(raw: readonly Segment[]): Segment[] {
  const boxes = raw.map(segmentBounds);
  const cuts: Point[][] = raw.map(() => []);
  raw.forEach((s, i) => {
    for (let j = i + 1; j < raw.length; j++) {
      const [p, q] = [boxes[i]!, boxes[j]!];
      if (p.minX > q.maxX + WELD || q.minX > p.maxX + WELD || p.minY > q.maxY + WELD || q.minY > p.maxY + WELD)
        continue;
      for (const point of intersectSegments(s, raw[j]!)) {
        cuts[i]!.push(point);
        cuts[j]!.push(point);
      }
    }
  });
  const far = (p: Point, q: Point) => Math.hypot(p.x - q.x, p.y - q.y) > WELD;
  return raw.flatMap((s, i) => {
    const inner = cuts[i]!.filter((p) => far(p, s.a) && far(p, s.b)).sort((p, q) => placeOn(s, p) - placeOn(s, q));
    const points = [s.a, ...inner.filter((p, k) => k === 0 || far(p, inner[k - 1]!)), s.b];
    return points.slice(1).map((b, k) => pieceOf(s, points[k]!, b));
  });
}

/** Those pieces whose middle no line comes nearer to than `distance`: pieces do not cross, so the whole piece is clear. */
function keepClear(pieces: readonly Segment[], lines: readonly Segment[], distance: number): Segment[] {
  const least = (distance - WELD) ** 2;
  const boxes = lines.map(segmentBounds);
  return pieces.filter((piece) => {
    const middle =
      piece.kind === 'line'
        ? { x: (piece.a.x + piece.b.x) / 2, y: (piece.a.y + piece.b.y) / 2 }
        : pointOnArc(piece, 0.5);
    return lines.every((line, i) => {
      const box = boxes[i]!;
      if (
        middle.x < box.minX - distance ||
        middle.x > box.maxX + distance ||
        middle.y < box.minY - distance ||
        middle.y > box.maxY + distance
      )
        return true;
      return squareToSegment(line, middle) >= least;
    });
  });
}

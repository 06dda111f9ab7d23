import type { Contour, Point, Vertex } from '../../contour/contour.ts';
import { MM_PER_INCH, type Unit } from '../../units/unit.ts';
import { ARC_LINES_ALIKE, LEAST_ARC_LINES, STEEPEST_ARC_TURN, WIDEST_ARC } from './heal-tolerances.ts';

interface Circle extends Point {
  readonly radius: number;
}

/** Circle through three points; undefined when they lie on a line. */
function circleThrough(p: Point, q: Point, r: Point): Circle | undefined {
  const [ax, ay, bx, by] = [q.x - p.x, q.y - p.y, r.x - p.x, r.y - p.y];
  const twice = 2 * (ax * by - ay * bx);
  if (twice === 0) return undefined;
  const [a, b] = [ax * ax + ay * ay, bx * bx + by * by];
  const x = (by * a - ay * b) / twice;
  const y = (ax * b - bx * a) / twice;
  return { x: p.x + x, y: p.y + y, radius: Math.hypot(x, y) };
}

const lengthOf = (a: Point, b: Point) => Math.hypot(b.x - a.x, b.y - a.y);

/** Angle by which the way turns at q, positive to the left. */
const turnAt = (p: Point, q: Point, r: Point) => {
  const [ax, ay, bx, by] = [q.x - p.x, q.y - p.y, r.x - q.x, r.y - q.y];
  return Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
};

/** Whether the way runs on at q as a curve would. The first and the last line of an arc may be cut short. */
function curvesOn(p: Point, q: Point, r: Point, mayBeShort: 'first' | 'last' | 'neither'): boolean {
  if (Math.abs(turnAt(p, q, r)) > STEEPEST_ARC_TURN) return false;
  const [before, after] = [lengthOf(p, q), lengthOf(q, r)];
  return (
    (mayBeShort === 'first' || after <= before * ARC_LINES_ALIKE) &&
    (mayBeShort === 'last' || before <= after * ARC_LINES_ALIKE)
  );
}

/** The circle on which all points and the middles of all lines between them lie, if there is one. */
function circleOf(points: readonly Point[], tolerance: number, last: Point): Circle | undefined {
  const circle = circleThrough(points[0]!, points[points.length >> 1]!, last);
  if (!circle) return undefined;
  const on = (x: number, y: number) => Math.abs(Math.hypot(x - circle.x, y - circle.y) - circle.radius) <= tolerance;
  const fits = points.every((p, i) => {
    const q = points[i + 1];
    return on(p.x, p.y) && (q === undefined || on((p.x + q.x) / 2, (p.y + q.y) / 2));
  });
  return fits ? circle : undefined;
}

/** Bulge of the arc that all points in a row lie on; undefined when they are no arc. */
function arcThrough(points: readonly Point[], tolerance: number): number | undefined {
  const circle = circleOf(points, tolerance, points.at(-1)!);
  if (!circle) return undefined;
  const lines = points.length - 1;
  let side = 0;
  for (let i = 1; i < lines; i++) {
    const [p, q, r] = [points[i - 1]!, points[i]!, points[i + 1]!];
    const turn = turnAt(p, q, r);
    if (turn === 0 || turn * side < 0) return undefined;
    side = Math.sign(turn);
    if (!curvesOn(p, q, r, i === 1 ? 'first' : i === lines - 1 ? 'last' : 'neither')) return undefined;
  }
  let sweep = 0;
  for (let i = 0; i < lines; i++)
    sweep += 2 * Math.asin(Math.min(1, lengthOf(points[i]!, points[i + 1]!) / (2 * circle.radius)));
  // An arc that rises less than the tolerance is as well a line that wavers.
  const rise = circle.radius * (1 - Math.cos(Math.min(Math.PI, sweep / 2)));
  return sweep > WIDEST_ARC || rise <= tolerance ? undefined : side * Math.tan(sweep / 4);
}

/** The most lines from `first` on that are one arc, and its bulge. Doubles its reach, then halves in: a long arc is not tried line by line. */
function longestArc(vertices: readonly Vertex[], first: number, most: number, tolerance: number) {
  const tried = (lines: number) => arcThrough(vertices.slice(first, first + lines + 1), tolerance);
  let lines = LEAST_ARC_LINES;
  let bulge = lines <= most ? tried(lines) : undefined;
  if (bulge === undefined) return undefined;
  let step = lines;
  for (let growing = true; step >= 1;) {
    const next = lines + step <= most ? tried(lines + step) : undefined;
    if (next !== undefined) {
      lines += step;
      bulge = next;
    } else {
      growing = false;
    }
    step = growing ? step * 2 : step >> 1;
  }
  return { lines, bulge };
}

/** A closed run of lines that is a whole circle, as two arcs. */
function wholeCircle(vertices: readonly Vertex[], tolerance: number): Contour | undefined {
  const n = vertices.length;
  if (n < (2 * Math.PI) / STEEPEST_ARC_TURN || vertices.some((v) => v.bulge !== 0)) return undefined;
  const around = [...vertices, vertices[0]!];
  const circle = circleOf(around, tolerance, vertices[Math.floor((3 * n) / 4)]!);
  const even = vertices.every((q, i) => curvesOn(vertices.at(i - 1)!, q, around[i + 1]!, 'neither'));
  if (!circle || !even) return undefined;
  const side = Math.sign(turnAt(vertices[0]!, vertices[1]!, vertices[2]!));
  const a = vertices[0]!;
  return {
    closed: true,
    vertices: [
      { x: a.x, y: a.y, bulge: side },
      { x: 2 * circle.x - a.x, y: 2 * circle.y - a.y, bulge: side },
    ],
  };
}

/**
 * The contour with arcs in place of runs of short lines: four or more lines alike in length whose ends and middles lie within the
 * tolerance (millimetres) of one circle, and that turn by no more than 30° at a time, so that a hexagon stays one. Ends of a run
 * stay where they are. Throws for a tolerance not above 0.
 */
export function recogniseArcs(contour: Contour, toleranceMm: number, unit: Unit): { contour: Contour; arcs: number } {
  if (!(toleranceMm > 0)) throw new RangeError(`arc tolerance: got ${toleranceMm} mm, takes a length above 0`);
  const tolerance = unit === 'in' ? toleranceMm / MM_PER_INCH : toleranceMm;
  let { vertices } = contour;
  if (contour.closed) {
    const circle = wholeCircle(vertices, tolerance);
    if (circle) return { contour: circle, arcs: 2 };
    // Begun at a true corner, so that no arc lies across the beginning; after the last vertex comes the first again.
    const corner = vertices.findIndex((v, i) => {
      const before = vertices.at(i - 1)!;
      const after = vertices[(i + 1) % vertices.length]!;
      return before.bulge !== 0 || v.bulge !== 0 || !curvesOn(before, v, after, 'neither');
    });
    if (corner > 0) vertices = [...vertices.slice(corner), ...vertices.slice(0, corner)];
    vertices = [...vertices, vertices[0]!];
  }
  const out: Vertex[] = [];
  let arcs = 0;
  let straightTo = 0;
  for (let i = 0; i < vertices.length - 1;) {
    // How far the lines go before the next arc or the end.
    if (straightTo <= i)
      for (straightTo = i; straightTo < vertices.length - 1 && vertices[straightTo]!.bulge === 0;) straightTo++;
    const arc = longestArc(vertices, i, straightTo - i, tolerance);
    out.push(arc ? { ...vertices[i]!, bulge: arc.bulge } : vertices[i]!);
    if (arc) arcs++;
    i += arc ? arc.lines : 1;
  }
  if (!contour.closed) out.push(vertices.at(-1)!);
  return { contour: { closed: contour.closed, vertices: out }, arcs };
}

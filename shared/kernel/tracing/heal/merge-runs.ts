import type { Contour, Vertex } from '../../contour/contour.ts';
import { makeSegment } from '../../contour/segments.ts';
import { pointOnArc } from '../../contour/flatten-contour.ts';
import { FULL_TURN, WIDEST_ARC } from './heal-tolerances.ts';

interface Piece {
  readonly a: Vertex;
  readonly b: Vertex;
}

/** Distance of a vertex from the line through two others; its distance from the first where those are one. */
function offLine(v: Vertex, a: Vertex, b: Vertex): number {
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  if (chord === 0) return Math.hypot(v.x - a.x, v.y - a.y);
  return Math.abs((v.x - a.x) * (b.y - a.y) - (v.y - a.y) * (b.x - a.x)) / chord;
}

/** One arc for two that follow each other, or undefined when they are not of one circle within the tolerance. */
function joinedArc(p: Piece, q: Piece, tolerance: number): Vertex | undefined {
  if (p.a.bulge * q.a.bulge <= 0) return undefined;
  const angle = 4 * (Math.atan(p.a.bulge) + Math.atan(q.a.bulge));
  if (Math.abs(angle) > WIDEST_ARC) return undefined;
  const whole = makeSegment(p.a, q.b, Math.tan(angle / 4));
  if (whole.kind === 'line') return undefined;
  for (const { a, b } of [p, q]) {
    const s = makeSegment(a, b, a.bulge);
    if (s.kind === 'line') return undefined;
    for (const point of [s.a, pointOnArc(s, 0.5), s.b])
      if (Math.abs(Math.hypot(point.x - whole.centre.x, point.y - whole.centre.y) - whole.radius) > tolerance)
        return undefined;
  }
  return { ...p.a, bulge: Math.tan(angle / 4) };
}

function runsOn(p: Piece, q: Piece, tolerance: number): boolean {
  if (p.a.bulge !== 0 || q.a.bulge !== 0) return joinedArc(p, q, tolerance) !== undefined;
  const forward = (p.b.x - p.a.x) * (q.b.x - q.a.x) + (p.b.y - p.a.y) * (q.b.y - q.a.y) > 0;
  return forward && offLine(p.b, p.a, q.b) <= tolerance;
}

/** How many lines from `first` on are one line: all their ends within the tolerance of it. Each end narrows the directions that still serve. */
function straightRun(pieces: readonly Piece[], first: number, tolerance: number): number {
  const { a, b } = pieces[first]!;
  const ux = b.x - a.x;
  const uy = b.y - a.y;
  let reach = Math.hypot(ux, uy);
  let widest = Math.asin(Math.min(1, tolerance / reach));
  let low = -widest;
  let high = widest;
  let i = first + 1;
  for (; i < pieces.length && pieces[i]!.a.bulge === 0; i++) {
    const { x, y } = pieces[i]!.b;
    const far = Math.hypot(x - a.x, y - a.y);
    const angle = Math.atan2(ux * (y - a.y) - uy * (x - a.x), ux * (x - a.x) + uy * (y - a.y));
    if (far <= reach || angle < low || angle > high) break;
    widest = Math.asin(Math.min(1, tolerance / far));
    low = Math.max(low, angle - widest);
    high = Math.min(high, angle + widest);
    reach = far;
  }
  return i - first;
}

const piecesOf = ({ vertices, closed }: Contour): Piece[] =>
  vertices.slice(0, closed ? vertices.length : -1).map((a, i) => ({ a, b: vertices[(i + 1) % vertices.length]! }));

/** All arcs of one circle that go once round: two half circles from the first vertex. */
function fullCircle(pieces: readonly Piece[], tolerance: number): Contour | undefined {
  const sweep = pieces.reduce((sum, { a }) => sum + 4 * Math.atan(a.bulge), 0);
  if (pieces.length < 3 || Math.abs(Math.abs(sweep) - 2 * Math.PI) > FULL_TURN) return undefined;
  const longest = pieces.reduce((p, q) => (Math.abs(q.a.bulge) > Math.abs(p.a.bulge) ? q : p));
  const s = makeSegment(longest.a, longest.b, longest.a.bulge);
  if (s.kind === 'line') return undefined;
  const off = ({ a }: Piece) => Math.abs(Math.hypot(a.x - s.centre.x, a.y - s.centre.y) - s.radius);
  if (pieces.some((p) => p.a.bulge * sweep <= 0 || off(p) > tolerance)) return undefined;
  const first = { ...pieces[0]!.a, bulge: Math.sign(sweep) };
  return { closed: true, vertices: [first, { ...first, x: 2 * s.centre.x - first.x, y: 2 * s.centre.y - first.y }] };
}

/** Whether two neighbours might be one: most contours have none such, and are told apart here without making anything. */
function mayMerge({ vertices, closed }: Contour, tolerance: number): boolean {
  const count = vertices.length;
  for (let i = closed ? 0 : 1; i < (closed ? count : count - 1); i++) {
    const a = vertices[i === 0 ? count - 1 : i - 1]!;
    const b = vertices[i]!;
    const c = vertices[i + 1 === count ? 0 : i + 1]!;
    if (a.bulge * b.bulge > 0) return true;
    if (a.bulge !== 0 || b.bulge !== 0) continue;
    const dx = c.x - a.x;
    const dy = c.y - a.y;
    const across = (b.x - a.x) * dy - (b.y - a.y) * dx;
    if (across * across <= tolerance * tolerance * (dx * dx + dy * dy)) return true;
  }
  return false;
}

/**
 * The contour with straight runs as one line and runs of one circle as one arc, nothing moved by more than the tolerance. A
 * whole circle is two half circles.
 */
export function mergeRuns(contour: Contour, tolerance: number): Contour {
  if (!mayMerge(contour, tolerance)) return contour;
  let pieces = piecesOf(contour);
  if (contour.closed) {
    const circle = fullCircle(pieces, tolerance);
    if (circle) return circle;
    // A closed one is begun at a true corner, so that no run lies across its beginning.
    const corner = pieces.findIndex((p, i) => !runsOn(pieces.at(i - 1)!, p, tolerance));
    if (corner > 0) pieces = [...pieces.slice(corner), ...pieces.slice(0, corner)];
  }
  const vertices: Vertex[] = [];
  for (let i = 0; i < pieces.length;) {
    let piece = pieces[i]!;
    let count = 1;
    if (piece.a.bulge === 0) {
      count = straightRun(pieces, i, tolerance);
    } else {
      for (; i + count < pieces.length; count++) {
        const joined = joinedArc(piece, pieces[i + count]!, tolerance);
        if (!joined) break;
        piece = { a: joined, b: pieces[i + count]!.b };
      }
    }
    vertices.push(piece.a);
    i += count;
  }
  if (!contour.closed) vertices.push(contour.vertices.at(-1)!);
  return { closed: contour.closed, vertices };
}

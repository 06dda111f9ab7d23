import { WELD } from '../tolerances.ts';
import type { Contour, Point, Vertex } from './contour.ts';
import { findCrossing } from './find-crossing.ts';
import { offsetJoint, offsetRadius } from './offset-joint.ts';
import { segmentsOf, type ArcSegment, type Segment } from './segments.ts';

export type OffsetContour =
  | { readonly ok: true; readonly contour: Contour }
  | {
      readonly ok: false;
      /** arc: an arc's radius is used up; collapse: a side is used up or two sides meet no more; crosses: the offset runs over itself. */
      readonly reason: 'arc' | 'collapse' | 'crosses';
      readonly at: Point;
      /** For 'arc': its radius before the offset. */
      readonly radius?: number;
    };

const turn = 2 * Math.PI;
/** The angle brought into (−π, π]. */
const wrap = (angle: number) => angle - turn * Math.ceil((angle - Math.PI) / turn);

/** The bulge of an arc between its new ends, or undefined when nothing of its sweep is left. */
function newBulge(arc: ArcSegment, radius: number, a: Point, b: Point): number | undefined {
  const { centre, start, sweep } = arc;
  const atStart = wrap(Math.atan2(a.y - centre.y, a.x - centre.x) - start);
  const atEnd = wrap(Math.atan2(b.y - centre.y, b.x - centre.x) - (start + sweep));
  const left = sweep + atEnd - atStart;
  const runs = Math.sign(left) === Math.sign(sweep) && Math.abs(left) * radius > WELD && Math.abs(left) < turn;
  return runs ? Math.tan(left / 4) : undefined;
}

const runsOn = (s: Segment, a: Point, b: Point) =>
  (b.x - a.x) * (s.b.x - s.a.x) + (b.y - a.y) * (s.b.y - s.a.y) > 0 && Math.hypot(b.x - a.x, b.y - a.y) > WELD;

/**
 * A closed contour moved `distance` to the right of its direction of travel: outwards for a counter-clockwise one, inwards
 * when negative. Corners are mitred, never rounded; arcs stay arcs about the same centre with a new radius. The vertex count
 * is kept: an offset that would lose a side or arc, or cross itself, comes back as a reason with its place.
 * Throws for an open contour or a distance that is no number.
 */
export function offsetContour(contour: Contour, distance: number): OffsetContour {
  if (!contour.closed) throw new RangeError('an open contour cannot be offset');
  if (!Number.isFinite(distance)) throw new RangeError(`offset: got ${distance}, takes a length`);
  const segments = segmentsOf(contour);
  const n = segments.length;
  const joints: Point[] = [];
  for (let i = 0; i < n; i++) {
    const after = segments[i]!;
    if (after.kind === 'arc' && offsetRadius(after, distance) <= WELD)
      return { ok: false, reason: 'arc', at: after.a, radius: after.radius };
    const joint = offsetJoint(segments[i === 0 ? n - 1 : i - 1]!, after, distance);
    if (!joint) return { ok: false, reason: 'collapse', at: after.a };
    joints.push(joint);
  }
  const vertices: Vertex[] = [];
  for (let i = 0; i < n; i++) {
    const segment = segments[i]!;
    const a = joints[i]!;
    const b = joints[i + 1 === n ? 0 : i + 1]!;
    let bulge: number | undefined = 0;
    if (segment.kind === 'line') {
      if (!runsOn(segment, a, b)) return { ok: false, reason: 'collapse', at: segment.a };
    } else {
      bulge = newBulge(segment, offsetRadius(segment, distance), a, b);
      if (bulge === undefined) return { ok: false, reason: 'arc', at: segment.a, radius: segment.radius };
    }
    vertices.push({ x: a.x, y: a.y, bulge });
  }
  const moved = { closed: true, vertices };
  const crossing = findCrossing(moved);
  return crossing ? { ok: false, reason: 'crosses', at: crossing } : { ok: true, contour: moved };
}

import type { Contour, Point, Point3 } from '../contour/contour.ts';
import { pointOnArc } from '../contour/flatten-contour.ts';
import { offsetJoint, offsetRadius } from '../contour/offset-joint.ts';
import { directionAt, type ArcSegment, type Segment } from '../contour/segments.ts';
import type { VeeCutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { insideCorners } from './inside-corners.ts';

export interface VeeCornerSettings {
  /** Depth of the tip along the walls, below the face. */
  readonly floor: number;
  /** Depth of the plane in which the V's flank touches the walls and the corner comes out sharp. */
  readonly plane: number;
  /** Radius that the cutter before has left in the corner, in that plane. */
  readonly filletRadius: number;
  readonly cutter: VeeCutter;
  /** For walls that are arcs. */
  readonly chord: number;
}

/** Nearest point of a segment's carrier. */
function foot(s: Segment, p: Point): Point {
  if (s.kind === 'line') {
    const d = directionAt(s, 'start');
    const along = (p.x - s.a.x) * d.x + (p.y - s.a.y) * d.y;
    return { x: s.a.x + along * d.x, y: s.a.y + along * d.y };
  }
  const away = Math.hypot(p.x - s.centre.x, p.y - s.centre.y);
  return {
    x: s.centre.x + ((p.x - s.centre.x) * s.radius) / away,
    y: s.centre.y + ((p.y - s.centre.y) * s.radius) / away,
  };
}

/** A point on a wall moved inwards, to the left of its direction of travel. */
function inwards(s: Segment, p: Point, distance: number): Point {
  if (s.kind === 'line') {
    const d = directionAt(s, 'start');
    return { x: p.x - d.y * distance, y: p.y + d.x * distance };
  }
  const radius = offsetRadius(s, -distance);
  return {
    x: s.centre.x + ((p.x - s.centre.x) * radius) / s.radius,
    y: s.centre.y + ((p.y - s.centre.y) * radius) / s.radius,
  };
}

/** Points between two places on a wall's inward offset, ends included; chords of an arc stay within `chord` of it. */
function along(s: Segment, from: Point, to: Point, distance: number, chord: number): Point[] {
  if (s.kind === 'line') return [from, to];
  const radius = offsetRadius(s, -distance);
  const angle = (p: Point) => Math.atan2(p.y - s.centre.y, p.x - s.centre.x);
  const turn = 2 * Math.PI;
  const start = angle(from);
  let sweep = angle(to) - start;
  if (s.sweep > 0 && sweep < 0) sweep += turn;
  if (s.sweep < 0 && sweep > 0) sweep -= turn;
  const arc: ArcSegment = { kind: 'arc', a: from, b: to, centre: s.centre, radius, start, sweep };
  const step = 2 * Math.acos(Math.max(-1, 1 - chord / radius));
  const pieces = Math.max(1, Math.ceil(Math.abs(sweep) / step));
  return [from, ...Array.from({ length: pieces - 1 }, (_, i) => pointOnArc(arc, (i + 1) / pieces)), to];
}

/**
 * One path for each inside corner of a wall (counter-clockwise): along the wall that comes in, from where the fillet of the
 * cutter before begins, up into the corner, back down, and out along the other wall. The V's flank touches the walls in the
 * plane: its axis runs ρ = (floor − plane) · tan(β/2) inside. Corners whose walls meet no more once moved in are `missed`.
 */
export function veeCorners(
  wall: Contour,
  { floor, plane, filletRadius, cutter, chord }: VeeCornerSettings,
): { paths: Point3[][]; missed: Point[] } {
  const reach = radiusAtHeight(cutter, floor - plane);
  const paths: Point3[][] = [];
  const missed: Point[] = [];
  for (const { before, after } of insideCorners(wall)) {
    const bend = offsetJoint(before, after, -reach);
    // A fillet no larger than the V: it is cleared from where the V stands already.
    const fillet = filletRadius > reach ? offsetJoint(before, after, -filletRadius) : bend;
    if (!fillet || !bend) {
      missed.push(after.a);
      continue;
    }
    const deep = (p: Point): Point3 => ({ x: p.x, y: p.y, z: -floor });
    const corner: Point3 = { x: after.a.x, y: after.a.y, z: plane === 0 ? 0 : -plane };
    if (fillet === bend) {
      paths.push([deep(bend), corner]);
      continue;
    }
    const inStart = inwards(before, foot(before, fillet), reach);
    const outEnd = inwards(after, foot(after, fillet), reach);
    paths.push([
      ...along(before, inStart, bend, reach, chord).map(deep),
      corner,
      ...along(after, bend, outEnd, reach, chord).map(deep),
    ]);
  }
  return { paths, missed };
}

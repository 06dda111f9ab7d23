import type { Point, Point3 } from '../contour/contour.ts';
import { offsetJoint } from '../contour/offset-joint.ts';
import { CLOSEST_STANDS } from '../tolerances.ts';
import type { InsideCorner } from './inside-corners.ts';
import type { LiftSample } from './lift-samples.ts';

export interface LiftSettings {
  /** From full depth up to the corner's plane; see lift-samples.ts. */
  readonly samples: readonly LiftSample[];
  /** How far the sides lie outside the entered contour in the corner's plane; 0 when the size is held there. */
  readonly widening: number;
  /** zc: depth of the corner's plane below the face. */
  readonly planeDepth: number;
  /** Largest distance of a chord from the curve that the axis follows beside an arc. */
  readonly chord: number;
}

/**
 * The axis' way up into an inside corner, from full depth to the sharp corner: for each sample it stands where both sides,
 * moved inwards by the sample's radius, meet, so that the cutter stays tangent to both in the corner's plane. Straight sides
 * give the bisector; beside an arc it is a curve and further points are put in. Undefined when the sides meet no more.
 */
export function cornerLift(corner: InsideCorner, settings: LiftSettings): Point3[] | undefined {
  const { samples, widening, planeDepth } = settings;
  const { before, after } = corner;
  const z = (height: number) => -(planeDepth + height);
  const axis = (radius: number) => offsetJoint(before, after, widening - radius);
  const first = axis(samples[0]!.radius);
  const last = axis(0);
  if (!first || !last) return undefined;
  if (before.kind === 'line' && after.kind === 'line') {
    const from = samples[0]!.radius;
    return samples.map(({ radius, height }) => {
      const share = radius / from;
      return { x: last.x + share * (first.x - last.x), y: last.y + share * (first.y - last.y), z: z(height) };
    });
  }
  const points: Point3[] = [{ ...first, z: z(samples[0]!.height) }];
  let standing: Point = first;
  for (let i = 1; i < samples.length; i++) {
    const a = samples[i - 1]!;
    const b = samples[i]!;
    const next = axis(b.radius);
    if (!next) return undefined;
    if (!follow(axis, settings.chord, a, standing, b, next, (p, height) => points.push({ ...p, z: z(height) })))
      return undefined;
    standing = next;
  }
  return points;
}

/** Puts points between two stands until the chords lie on the axis' curve; false when the sides meet no more in between. */
function follow(
  axis: (radius: number) => Point | undefined,
  chord: number,
  a: LiftSample,
  from: Point,
  b: LiftSample,
  to: Point,
  put: (p: Point, height: number) => void,
): boolean {
  // Between two samples the height may be taken as straight: lift-samples.ts has seen to that.
  const middle: LiftSample = { radius: (a.radius + b.radius) / 2, height: (a.height + b.height) / 2 };
  const at = axis(middle.radius);
  if (!at) return false;
  const off = Math.hypot(at.x - (from.x + to.x) / 2, at.y - (from.y + to.y) / 2);
  if (off > chord && a.radius - b.radius > CLOSEST_STANDS)
    return follow(axis, chord, a, from, middle, at, put) && follow(axis, chord, middle, at, b, to, put);
  put(to, b.height);
  return true;
}

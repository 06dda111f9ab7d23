import type { Point, Point3, Vertex } from '../contour/contour.ts';
import { DrawingRefused } from './drawing-refused.ts';

/** Whether two coordinates are one in the file. Most are far apart, so rounding comes last: this runs for each vertex. */
const sameWritten = (a: number, b: number, scale: number): boolean =>
  Math.abs(a - b) * scale < 1 && Math.round(a * scale) === Math.round(b * scale);

const samePlace = (a: Point, b: Point, scale: number): boolean =>
  sameWritten(a.x, b.x, scale) && sameWritten(a.y, b.y, scale);

function refuse(what: string, at: Point | undefined, decimals: number): never {
  throw new DrawingRefused(`a ${what} at ${at?.x}, ${at?.y} shrinks to nothing at ${decimals} decimals`);
}

/**
 * Vertices of a contour without any that would repeat the next one at the file's decimals (the segment between them
 * would have no length), and without −0. Of such a run the first place stays, with the bulge that leaves the last.
 * Throws DrawingRefused when fewer than two are left, or two with nothing but a line between.
 */
export function tidyContour(vertices: readonly Vertex[], closed: boolean, decimals: number): Vertex[] {
  const scale = 10 ** decimals;
  const tidy: Vertex[] = [];
  for (const { x, y, bulge } of vertices) {
    // Adding 0 turns −0 into 0 and leaves every other number as it is.
    const vertex = { x: x + 0, y: y + 0, bulge: bulge + 0 };
    const before = tidy[tidy.length - 1];
    if (before === undefined || !samePlace(before, vertex, scale)) tidy.push(vertex);
    else tidy[tidy.length - 1] = { x: before.x, y: before.y, bulge: vertex.bulge };
  }
  while (closed && tidy.length > 1 && samePlace(tidy[0]!, tidy[tidy.length - 1]!, scale)) tidy.pop();
  const encloses = tidy.length > 2 || tidy.some((v) => v.bulge !== 0);
  if (tidy.length < 2 || (closed && !encloses)) refuse('contour', vertices[0], decimals);
  return tidy;
}

/** The same for a path in space. */
export function tidyPath(points: readonly Point3[], decimals: number): Point3[] {
  const scale = 10 ** decimals;
  const tidy: Point3[] = [];
  for (const { x, y, z } of points) {
    const point = { x: x + 0, y: y + 0, z: z + 0 };
    const before = tidy[tidy.length - 1];
    if (before && samePlace(before, point, scale) && sameWritten(before.z, z, scale)) continue;
    tidy.push(point);
  }
  if (tidy.length < 2) refuse('path', points[0], decimals);
  return tidy;
}

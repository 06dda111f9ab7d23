import type { Point, Point3, Vertex } from '../contour/contour.ts';
import { DrawingRefused } from './drawing-refused.ts';

/** Adding 0 turns −0 into 0 and leaves every other number as it is. */
const plain = (value: number): number => value + 0;

/** A coordinate as it will stand in the file, to compare by. */
const written = (value: number, decimals: number): number => Math.round(value * 10 ** decimals);

const sameWritten = (a: Point, b: Point, decimals: number): boolean =>
  written(a.x, decimals) === written(b.x, decimals) && written(a.y, decimals) === written(b.y, decimals);

/**
 * Vertices of a contour without any that would repeat the next one at the file's decimals (the segment between them
 * would have no length), and without −0. The one that is kept is the later, with the bulge that leaves it; an open
 * contour keeps its first vertex. Throws DrawingRefused when fewer than two
 * are left, or two with nothing but a line between.
 */
export function tidyContour(vertices: readonly Vertex[], closed: boolean, decimals: number): Vertex[] {
  const tidy: Vertex[] = [];
  for (const { x, y, bulge } of vertices) {
    const before = tidy.at(-1);
    const vertex = { x: plain(x), y: plain(y), bulge: plain(bulge) };
    if (before === undefined || !sameWritten(before, vertex, decimals)) tidy.push(vertex);
    else tidy[tidy.length - 1] = { ...before, bulge: vertex.bulge };
  }
  while (closed && tidy.length > 1 && sameWritten(tidy[0]!, tidy.at(-1)!, decimals)) tidy.pop();
  const encloses = tidy.length > 2 || tidy.some((v) => v.bulge !== 0);
  if (tidy.length < 2 || (closed && !encloses)) {
    const at = vertices[0];
    throw new DrawingRefused(`a contour at ${at?.x}, ${at?.y} shrinks to nothing at ${decimals} decimals`);
  }
  return tidy;
}

/** The same for a path in space. */
export function tidyPath(points: readonly Point3[], decimals: number): Point3[] {
  const tidy: Point3[] = [];
  for (const { x, y, z } of points) {
    const before = tidy.at(-1);
    const point = { x: plain(x), y: plain(y), z: plain(z) };
    const repeats =
      before !== undefined &&
      sameWritten(before, point, decimals) &&
      written(before.z, decimals) === written(z, decimals);
    if (!repeats) tidy.push(point);
  }
  if (tidy.length < 2)
    throw new DrawingRefused(`a path at ${points[0]?.x}, ${points[0]?.y} shrinks to nothing at ${decimals} decimals`);
  return tidy;
}

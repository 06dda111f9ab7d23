import type { Contour, Vertex } from '#shared/kernel/contour/contour.ts';

/** The same contour run the other way. */
const reversed = (vertices: readonly Vertex[]): Vertex[] =>
  vertices.map((_, i) => {
    const at = vertices.length - 1 - i;
    return { ...vertices[at]!, bulge: -vertices.at(at - 1)!.bulge };
  });

const farthest = (a: readonly Vertex[], b: readonly Vertex[], shift: number): number =>
  Math.max(
    ...a.map((v, i) => {
      const w = b[(i + shift) % b.length]!;
      return Math.max(Math.abs(v.x - w.x), Math.abs(v.y - w.y), Math.abs(v.bulge - w.bulge));
    }),
  );

/** How far two closed contours differ at most in a coordinate or bulge, wherever each starts and whichever way it runs. */
export function contourDifference(a: Contour, b: Contour): number {
  if (a.vertices.length !== b.vertices.length || a.closed !== b.closed) return Infinity;
  const ways = [b.vertices, reversed(b.vertices)];
  return Math.min(...ways.flatMap((way) => way.map((_, shift) => farthest(a.vertices, way, shift))));
}

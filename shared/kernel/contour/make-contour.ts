import { WELD } from '../tolerances.ts';
import type { Contour, Extents, Point, Vertex } from './contour.ts';
import { contourArea } from './contour-area.ts';

/** A closed counter-clockwise rectangle. */
export function rectangle(e: Extents): Contour {
  return polygon([
    { x: e.minX, y: e.minY },
    { x: e.maxX, y: e.minY },
    { x: e.maxX, y: e.maxY },
    { x: e.minX, y: e.maxY },
  ]);
}

/** A closed contour of straight lines. */
export const polygon = (points: readonly Point[]): Contour => ({
  closed: true,
  vertices: points.map((p) => ({ x: p.x, y: p.y, bulge: 0 })),
});

/** The same contour run the other way: each bulge moves to the segment's other end and changes its sign. */
export function reverseContour(contour: Contour): Contour {
  const { vertices, closed } = contour;
  const n = vertices.length;
  const out: Vertex[] = [];
  for (let i = n - 1; i >= 0; i--) {
    const before = i > 0 ? vertices[i - 1]! : closed ? vertices[n - 1]! : undefined;
    const bulge = before?.bulge ?? 0;
    out.push({ x: vertices[i]!.x, y: vertices[i]!.y, bulge: bulge === 0 ? 0 : -bulge });
  }
  return { closed, vertices: out };
}

/** The contour run counter-clockwise. */
export const counterClockwise = (contour: Contour): Contour =>
  contourArea(contour) < 0 ? reverseContour(contour) : contour;

/** A closed contour without vertices that repeat the one before them (nearer than WELD). */
export function dropRepeats(contour: Contour): Contour {
  const vertices = contour.vertices.filter((v, i, all) => {
    const next = all[i + 1 === all.length ? 0 : i + 1]!;
    return Math.hypot(next.x - v.x, next.y - v.y) > WELD;
  });
  return vertices.length === contour.vertices.length ? contour : { closed: contour.closed, vertices };
}

import type { Contour } from './contour.ts';

/** SVG path data in the contour's own coordinates, Y up: draw it inside a group that turns Y over. Arcs stay arcs. */
export function svgPath(contour: Contour): string {
  const { vertices, closed } = contour;
  const first = vertices[0];
  if (!first) return '';
  let path = `M${first.x} ${first.y}`;
  const last = closed ? vertices.length : vertices.length - 1;
  for (let i = 0; i < last; i++) {
    const a = vertices[i]!;
    const b = vertices[i + 1 === vertices.length ? 0 : i + 1]!;
    if (a.bulge === 0) {
      if (i + 1 < vertices.length) path += `L${b.x} ${b.y}`;
      continue;
    }
    const radius = (Math.hypot(b.x - a.x, b.y - a.y) * (1 + a.bulge * a.bulge)) / (4 * Math.abs(a.bulge));
    path += `A${radius} ${radius} 0 ${Math.abs(a.bulge) > 1 ? 1 : 0} ${a.bulge > 0 ? 1 : 0} ${b.x} ${b.y}`;
  }
  return closed ? `${path}Z` : path;
}

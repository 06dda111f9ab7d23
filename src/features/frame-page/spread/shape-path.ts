import type { Contour, Extents } from '#shared/kernel/contour/contour.ts';
import type { LineSet, Shape } from '#shared/kernel/line-sets/line-set.ts';
import type { PageMap } from '../model/view.ts';

/** Hundredths of a pixel: finer than a screen shows, and short to write. */
const px = (value: number): number => Math.round(value * 100) / 100;

/**
 * SVG path data of a contour in a page's pixels. Written in pixels, not moved there by a transform: the browser then keeps
 * all lines of a face in one layer, and lays none of them out again when the board is fitted anew.
 */
export function contourPath({ vertices, closed }: Contour, map: PageMap): string {
  const { sx, sy, dx, dy } = map;
  const [first] = vertices;
  if (!first) return '';
  // An arc that is mirrored runs the other way.
  const ahead = sx * sy > 0;
  let path = `M${px(sx * first.x + dx)} ${px(sy * first.y + dy)}`;
  const count = vertices.length;
  const last = closed ? count : count - 1;
  for (let i = 0; i < last; i++) {
    const a = vertices[i]!;
    const b = vertices[i + 1 === count ? 0 : i + 1]!;
    if (a.bulge === 0) {
      if (i + 1 < count) path += `L${px(sx * b.x + dx)} ${px(sy * b.y + dy)}`;
      continue;
    }
    const chord = Math.hypot(b.x - a.x, b.y - a.y) * Math.abs(sx);
    const radius = px((chord * (1 + a.bulge * a.bulge)) / (4 * Math.abs(a.bulge)));
    path += `A${radius} ${radius} 0 ${Math.abs(a.bulge) > 1 ? 1 : 0} ${a.bulge > 0 === ahead ? 1 : 0} ${px(sx * b.x + dx)} ${px(sy * b.y + dy)}`;
  }
  return closed ? `${path}Z` : path;
}

function shapePath(shape: Shape, map: PageMap): string {
  if (shape.kind === 'contour') return contourPath(shape.contour, map);
  const { sx, sy, dx, dy } = map;
  let path = '';
  for (const { x, y } of shape.points) path += `${path === '' ? 'M' : 'L'}${px(sx * x + dx)} ${px(sy * y + dy)}`;
  return path;
}

/** All lines of a line set as one path: one element a set keeps repainting cheap. */
export function lineSetPath(lineSet: LineSet, map: PageMap): string {
  let path = '';
  for (const shape of lineSet.shapes) path += shapePath(shape, map);
  return path;
}

export function extentsPath({ minX, minY, maxX, maxY }: Extents, { sx, sy, dx, dy }: PageMap): string {
  return `M${px(sx * minX + dx)} ${px(sy * minY + dy)}H${px(sx * maxX + dx)}V${px(sy * maxY + dy)}H${px(sx * minX + dx)}Z`;
}

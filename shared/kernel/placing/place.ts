import type { Contour, Extents, Point } from '../contour/contour.ts';
import { reverseContour } from '../contour/make-contour.ts';
import type { Shape } from '../line-sets/line-set.ts';
import type { Placement } from './placement.ts';

export const placePoint = (pl: Placement, p: Point): Point => ({ x: pl.sx * p.x + pl.dx, y: pl.sy * p.y + pl.dy });

/** Whether a placement turns the board over, so that left and right turns change places. */
export const turnsOver = (pl: Placement): boolean => pl.sx * pl.sy < 0;

/** A contour moved. When it is turned over it is also run the other way, so that what was counter-clockwise stays so. */
export function placeContour(pl: Placement, contour: Contour): Contour {
  const over = turnsOver(pl);
  const vertices = contour.vertices.map((v) => ({
    x: pl.sx * v.x + pl.dx,
    y: pl.sy * v.y + pl.dy,
    bulge: over && v.bulge !== 0 ? -v.bulge : v.bulge,
  }));
  const placed = { closed: contour.closed, vertices };
  return over ? reverseContour(placed) : placed;
}

export function placeExtents(pl: Placement, e: Extents): Extents {
  const a = placePoint(pl, { x: e.minX, y: e.minY });
  const b = placePoint(pl, { x: e.maxX, y: e.maxY });
  return { minX: Math.min(a.x, b.x), minY: Math.min(a.y, b.y), maxX: Math.max(a.x, b.x), maxY: Math.max(a.y, b.y) };
}

export function placeShape(pl: Placement, shape: Shape): Shape {
  return shape.kind === 'contour'
    ? { ...shape, contour: placeContour(pl, shape.contour) }
    : { ...shape, points: shape.points.map((p) => ({ x: pl.sx * p.x + pl.dx, y: pl.sy * p.y + pl.dy, z: p.z })) };
}

/** The placement that takes everything back. */
export const unplace = (pl: Placement): Placement => ({
  sx: pl.sx,
  sy: pl.sy,
  dx: pl.sx === 1 ? -pl.dx : pl.dx,
  dy: pl.sy === 1 ? -pl.dy : pl.dy,
});

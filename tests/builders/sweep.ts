import type { Contour, Point, Point3 } from '#shared/kernel/contour/contour.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';

/** A cutter's tip along its way, close enough together that nothing is missed between two of them; z is negative below the face. */
export type TipPath = readonly Point3[];

/** A path of straight moves with stands put in, at most `step` apart. */
export function standsAlong(points: readonly Point3[], step: number): TipPath {
  return points.flatMap((a, i) => {
    const b = points[i + 1];
    if (!b) return [a];
    const pieces = Math.max(1, Math.ceil(Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z) / step));
    return Array.from({ length: pieces }, (_, j) => {
      const t = j / pieces;
      return { x: a.x + t * (b.x - a.x), y: a.y + t * (b.y - a.y), z: a.z + t * (b.z - a.z) };
    });
  });
}

/** Stands of a closed contour at one depth, those within `reach` of `about` only. */
export function standsOf(contour: Contour, depth: number, about: Point, reach: number, step: number): TipPath {
  const points = flattenContour(contour, 1e-6);
  const ring = [...points, points[0]!].map((p) => ({ x: p.x, y: p.y, z: -depth }));
  return standsAlong(ring, step).filter((p) => Math.hypot(p.x - about.x, p.y - about.y) < reach);
}

/** How far inside the cutter a place in the board comes at most, at `depth` below the face; negative: by how much it is missed. */
export function reachInto(path: TipPath, cutter: Cutter, place: Point, depth: number): number {
  let most = -Infinity;
  for (const tip of path) {
    const height = -tip.z - depth;
    if (height < 0) continue;
    const reach = radiusAtHeight(cutter, height) - Math.hypot(tip.x - place.x, tip.y - place.y);
    if (reach > most) most = reach;
  }
  return most;
}

/** Distance of a place from a closed polygon, negative inside it. */
export function signedDistance(polygon: readonly Point[], p: Point): number {
  let nearest = Infinity;
  let inside = false;
  polygon.forEach((a, i) => {
    const b = polygon[(i + 1) % polygon.length]!;
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const along = Math.max(0, Math.min(1, ((p.x - a.x) * dx + (p.y - a.y) * dy) / (dx * dx + dy * dy)));
    nearest = Math.min(nearest, Math.hypot(p.x - a.x - along * dx, p.y - a.y - along * dy));
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((p.y - a.y) / dy) * dx) inside = !inside;
  });
  return inside ? -nearest : nearest;
}

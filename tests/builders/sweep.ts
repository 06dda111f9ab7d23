import type { Contour, Point, Point3 } from '#shared/kernel/contour/contour.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';

/** Chords of arcs rise less than this: a hundredth of what is looked for. */
const FLAT = 2e-6;

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
  const points = flattenContour(contour, FLAT);
  const ring = [...points, points[0]!].map((p) => ({ x: p.x, y: p.y, z: -depth }));
  return standsAlong(ring, step).filter((p) => Math.hypot(p.x - about.x, p.y - about.y) < reach);
}

/** How far inside the cutter any of the places comes at `depth` below the face, for each place; negative: by how much it is missed. */
export function reachInto(path: TipPath, cutter: Cutter, places: readonly Point[], depth: number): number[] {
  const cutting = path
    .filter((tip) => -tip.z >= depth)
    .map((tip) => ({ x: tip.x, y: tip.y, radius: radiusAtHeight(cutter, -tip.z - depth) }));
  // Plain loops and no hypot: this is the test's inner loop, run some hundred million times.
  return places.map((p) => {
    let most = -Infinity;
    for (const c of cutting) {
      const dx = c.x - p.x;
      const dy = c.y - p.y;
      const reach = c.radius - Math.sqrt(dx * dx + dy * dy);
      if (reach > most) most = reach;
    }
    return most;
  });
}

/** Places along a closed contour, those within `reach` of `about` only. */
export function placesAlong(contour: Contour, about: Point, reach: number, step: number): readonly Point[] {
  return standsOf(contour, 0, about, reach, step);
}

/** Distance of a place from a closed polygon, negative inside it. */
export function signedDistance(polygon: readonly Point[], p: Point): number {
  let nearest = Infinity;
  let inside = false;
  polygon.forEach((a, i) => {
    const b = polygon[(i + 1) % polygon.length]!;
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const along = Math.max(0, Math.min(1, ((p.x - a.x) * dx + (p.y - a.y) * dy) / (dx * dx + dy * dy)));
    const [ex, ey] = [p.x - a.x - along * dx, p.y - a.y - along * dy];
    nearest = Math.min(nearest, ex * ex + ey * ey);
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((p.y - a.y) / dy) * dx) inside = !inside;
  });
  return inside ? -Math.sqrt(nearest) : Math.sqrt(nearest);
}

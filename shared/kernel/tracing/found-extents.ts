import { contourExtents, joinExtents } from '../contour/contour-extents.ts';
import type { Extents } from '../contour/contour.ts';
import type { FoundCurves } from './found-drawing.ts';

/** Smallest upright rectangle around all that was found, crowns of arcs included; null when that is nothing. */
export function foundExtents({ count, segments }: FoundCurves): Extents | null {
  if (count === 0) return null;
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  let arcs: Extents | null = null;
  for (let i = 0; i < count; i++) {
    const [ax, ay, bx, by, bulge] = segments.subarray(5 * i, 5 * i + 5) as unknown as [
      number,
      number,
      number,
      number,
      number,
    ];
    minX = Math.min(minX, ax, bx);
    minY = Math.min(minY, ay, by);
    maxX = Math.max(maxX, ax, bx);
    maxY = Math.max(maxY, ay, by);
    if (bulge === 0 || (ax === bx && ay === by)) continue;
    const arc = contourExtents({
      closed: false,
      vertices: [
        { x: ax, y: ay, bulge },
        { x: bx, y: by, bulge: 0 },
      ],
    });
    arcs = arcs === null ? arc : joinExtents(arcs, arc);
  }
  const ends = { minX, minY, maxX, maxY };
  return arcs === null ? ends : joinExtents(ends, arcs);
}

import type { Point3 } from '../contour/contour.ts';
import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { ClimbDepth } from './climb-depth.ts';
import { endColumn, endRow, firstColumn, firstRow, sampleX, sampleY } from './grid.ts';
import type { HeightField } from './height-field.ts';

/** Cuts rows `first` up to but not `end` of a field along a path in space, the cutter's tip on it (z negative below the face). */
export function sweepClimb(
  field: HeightField,
  first: number,
  end: number,
  owner: number,
  cutter: Cutter,
  leaves: ClimbDepth,
  path: readonly Point3[],
): void {
  const { grid, depth, by, thickness } = field;
  for (let k = 1; k < path.length; k++) {
    const a = path[k - 1]!;
    const b = path[k]!;
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const way = { length, from: -a.z, to: -b.z };
    const reach = radiusAtHeight(cutter, Math.max(way.from, way.to));
    const ux = length === 0 ? 1 : (b.x - a.x) / length;
    const uy = length === 0 ? 0 : (b.y - a.y) / length;
    const left = firstColumn(grid, Math.min(a.x, b.x) - reach);
    const right = endColumn(grid, Math.max(a.x, b.x) + reach);
    const top = Math.min(end, endRow(grid, Math.max(a.y, b.y) + reach));
    for (let row = Math.max(first, firstRow(grid, Math.min(a.y, b.y) - reach)); row < top; row++) {
      const dy = sampleY(grid, row) - a.y;
      for (let i = left; i < right; i++) {
        const dx = sampleX(grid, i) - a.x;
        const across = ux * dy - uy * dx;
        const d = Math.min(thickness, leaves(way, ux * dx + uy * dy, across * across));
        const at = row * grid.columns + i;
        if (d > depth[at]!) {
          depth[at] = d;
          by[at] = owner;
        }
      }
    }
  }
}

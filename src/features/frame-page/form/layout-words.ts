import type { LayoutPath } from '#shared/kernel/frame/members.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';

/** Steps down the layout of an entry such as 'outline.layout.columns.1.rows.0': [1, 0]. */
export const layoutPathOf = (field: string): LayoutPath =>
  [...field.matchAll(/\.(\d+)/g)].map(([, step]) => Number(step));

const isUnder = (path: LayoutPath | undefined, above: LayoutPath): boolean =>
  path !== undefined && above.every((step, i) => path[i] === step);

/** The openings that lie in a part of the layout. */
export const openingsUnder = (worked: DrawnFrame, path: LayoutPath): readonly FeatureId[] =>
  worked.contours.openings.filter((o) => isUnder(o.path, path)).map((o) => o.id);

/** The mid-stiles or mid-rails of a divided part. */
export const betweensOf = (worked: DrawnFrame, path: LayoutPath): readonly FeatureId[] =>
  worked.contours.members
    .filter((m) => m.path !== undefined && m.path.length === path.length && isUnder(m.path, path))
    .map((m) => m.id);

/** How much of the width or height a part takes as solved; null while the layout does not add up. */
export function solvedSize(worked: DrawnFrame, path: LayoutPath, along: 'width' | 'height'): number | null {
  const extents = worked.contours.openings.filter((o) => isUnder(o.path, path)).map((o) => o.extents);
  if (extents.length === 0) return null;
  return along === 'width'
    ? Math.max(...extents.map((e) => e.maxX)) - Math.min(...extents.map((e) => e.minX))
    : Math.max(...extents.map((e) => e.maxY)) - Math.min(...extents.map((e) => e.minY));
}

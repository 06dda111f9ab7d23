import type { LayoutPath } from '../frame/members.ts';
import { childrenOf, partAt, replacePart, withChildren } from './layout-parts.ts';
import { nextLabel } from './next-label.ts';
import type { LayoutPart } from './particulars.ts';

/**
 * The layout with one more opening at the end (right or bottom) of the divided part at `path`; parts
 * without a size of their own make room. Throws when the path leads nowhere or to an opening: split that.
 */
export function addPart(layout: LayoutPart, path: LayoutPath): LayoutPart {
  const part = partAt(layout, path);
  return replacePart(
    layout,
    path,
    withChildren(part, [...childrenOf(part), { opening: { label: nextLabel(layout) } }]),
  );
}

import type { LayoutPath } from '../frame/members.ts';
import { partAt, replacePart } from './layout-parts.ts';
import { nextLabel } from './next-label.ts';
import type { LayoutPart } from './particulars.ts';

/**
 * The layout with the part at `path` divided in two equal parts with a member of width `between`.
 * The first (left or top) part is what was there; the second is a new opening. The two together keep
 * the size that the part had, so nothing else moves. The new opening of columns takes the arch along,
 * since both heads then lie at the top; of rows it does not.
 * Throws when the path leads nowhere.
 */
export function splitPart(layout: LayoutPart, path: LayoutPath, into: 'columns' | 'rows', between: number): LayoutPart {
  const { size, ...first } = partAt(layout, path);
  const arch = into === 'columns' && 'opening' in first ? first.opening.arch : undefined;
  const second: LayoutPart = { opening: { label: nextLabel(layout), ...(arch === undefined ? {} : { arch }) } };
  const parts = [first as LayoutPart, second];
  const divided = into === 'columns' ? { columns: parts, between } : { rows: parts, between };
  return replacePart(layout, path, size === undefined ? divided : { ...divided, size });
}

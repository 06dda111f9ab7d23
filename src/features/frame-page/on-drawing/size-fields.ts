import type { LayoutPath } from '#shared/kernel/frame/members.ts';
import { partAt, partField } from '#shared/kernel/particulars/layout-parts.ts';
import type { LayoutPart } from '#shared/kernel/particulars/particulars.ts';

export interface SizeFields {
  /** Path of the entry that holds an opening's width; '' where it follows from the frame alone. */
  readonly width: string;
  readonly height: string;
}

/**
 * The entries by which an opening's width and height can be given: the nearest column and the nearest row that it lies in,
 * since whatever is in a column is as wide as it, and whatever is in a row as high. Throws when `path` leads nowhere.
 */
export function sizeFields(layout: LayoutPart, path: LayoutPath): SizeFields {
  let width = '';
  let height = '';
  path.forEach((_step, depth) => {
    const field = `${partField(layout, path.slice(0, depth + 1))}.size`;
    if ('columns' in partAt(layout, path.slice(0, depth))) width = field;
    else height = field;
  });
  return { width, height };
}

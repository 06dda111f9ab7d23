import type { LayoutPath } from '../frame/members.ts';
import { childrenOf, partAt, replacePart, withChildren } from './layout-parts.ts';
import type { LayoutPart } from './particulars.ts';

function resized(part: LayoutPart, size: number | undefined): LayoutPart {
  const { size: _dropped, ...rest } = part;
  return (size === undefined ? rest : { ...rest, size }) as LayoutPart;
}

/**
 * The layout without the part at `path`; the others take its room. When one part is left of a divided
 * one, it takes that one's place and size. When every part left has a fixed size, the last of them is
 * freed, so that the sizes still add up. Throws for the whole layout and when the path leads nowhere.
 */
export function removePart(layout: LayoutPart, path: LayoutPath): LayoutPart {
  const index = path.at(-1);
  if (index === undefined) throw new Error('the whole layout cannot be removed');
  partAt(layout, path);
  const above = path.slice(0, -1);
  const parent = partAt(layout, above);
  const left = childrenOf(parent).toSpliced(index, 1);
  const [only] = left;
  if (only === undefined)
    return replacePart(layout, above, { opening: {}, ...(parent.size === undefined ? {} : { size: parent.size }) });
  if (left.length === 1) return replacePart(layout, above, resized(only, parent.size));
  const fixed = left.every((part) => part.size !== undefined);
  const kept = fixed ? left.with(-1, resized(left[left.length - 1]!, undefined)) : left;
  return replacePart(layout, above, withChildren(parent, kept));
}

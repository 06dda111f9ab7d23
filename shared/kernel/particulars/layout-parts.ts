import type { LayoutPath } from '../frame/members.ts';
import type { LayoutPart, OpeningPart } from './particulars.ts';

/** The parts of a divided part, in drawing order; none for an opening. */
export const childrenOf = (part: LayoutPart): readonly LayoutPart[] =>
  'columns' in part ? part.columns : 'rows' in part ? part.rows : [];

/** The same divided part with other parts in it. Throws for an opening, which has none. */
export function withChildren(part: LayoutPart, children: readonly LayoutPart[]): LayoutPart {
  if ('columns' in part) return { ...part, columns: children };
  if ('rows' in part) return { ...part, rows: children };
  throw new Error('an opening has no parts');
}

const nowhere = (path: LayoutPath): Error => new Error(`no part of the layout at [${path.join(', ')}]`);

/** The part that `path` leads to; the whole layout for []. Throws when it leads nowhere. */
export function partAt(layout: LayoutPart, path: LayoutPath): LayoutPart {
  let part = layout;
  for (const index of path) {
    const next = childrenOf(part)[index];
    if (next === undefined) throw nowhere(path);
    part = next;
  }
  return part;
}

/** The layout with the part at `path` put in place of the one there. Throws when the path leads nowhere. */
export function replacePart(layout: LayoutPart, path: LayoutPath, part: LayoutPart): LayoutPart {
  const [index, ...rest] = path;
  if (index === undefined) return part;
  const children = childrenOf(layout);
  const child = children[index];
  if (child === undefined) throw nowhere(path);
  return withChildren(layout, children.with(index, replacePart(child, rest, part)));
}

/** Path of a part among the particulars, as in findings: 'outline.layout.columns.1.rows.0'. Throws when `path` leads nowhere. */
export function partField(layout: LayoutPart, path: LayoutPath): string {
  let part = layout;
  let field = 'outline.layout';
  for (const index of path) {
    const next = childrenOf(part)[index];
    if (next === undefined) throw nowhere(path);
    field += `.${'columns' in part ? 'columns' : 'rows'}.${index}`;
    part = next;
  }
  return field;
}

export interface PlacedPart {
  readonly path: LayoutPath;
  readonly part: LayoutPart;
}

/** All parts, each before those inside it, in drawing order. */
export const everyPart = (part: LayoutPart, path: LayoutPath = []): PlacedPart[] => [
  { path, part },
  ...childrenOf(part).flatMap((child, i) => everyPart(child, [...path, i])),
];

/** The openings of a layout in drawing order. */
export const openingParts = (layout: LayoutPart): OpeningPart[] =>
  everyPart(layout).flatMap(({ part }) => ('opening' in part ? [part] : []));

import type { Extents } from '../../contour/contour.ts';
import type { LayoutPart } from '../../particulars/particulars.ts';
import { tidyLength } from '../../box/tidy-length.ts';

/** An opening that is to become a leaf of the layout. */
export interface Leaf {
  readonly extents: Extents;
  readonly part: LayoutPart;
}

type Axis = 'columns' | 'rows';

interface Span {
  from: number;
  to: number;
  readonly leaves: Leaf[];
}

/** Along columns from the left, along rows from the top: for rows all is measured downwards. */
const spanOf = ({ minX, maxX, minY, maxY }: Extents, axis: Axis): [from: number, to: number] =>
  axis === 'columns' ? [minX, maxX] : [-maxY, -minY];

/** Openings in groups that a straight cut across the whole space parts from each other. */
function groups(leaves: readonly Leaf[], axis: Axis, within: number): Span[] {
  const sorted = leaves
    .map((leaf) => ({ leaf, span: spanOf(leaf.extents, axis) }))
    .sort((p, q) => p.span[0] - q.span[0]);
  const out: Span[] = [];
  for (const { leaf, span } of sorted) {
    const last = out.at(-1);
    if (last && span[0] < last.to + within) {
      last.to = Math.max(last.to, span[1]);
      last.leaves.push(leaf);
    } else {
      out.push({ from: span[0], to: span[1], leaves: [leaf] });
    }
  }
  return out;
}

const mean = (numbers: readonly number[]) => numbers.reduce((sum, n) => sum + n, 0) / numbers.length;

/** The same space, only as long along the axis as from … to. */
const narrowed = (space: Extents, axis: Axis, from: number, to: number): Extents =>
  axis === 'columns' ? { ...space, minX: from, maxX: to } : { ...space, minY: -to, maxY: -from };

/** Parts with sizes where they do not share equally: of the sizes that occur the most frequent one, or else the greatest, is left to be shared. */
function withSizes(parts: readonly LayoutPart[], sizes: readonly number[], within: number): LayoutPart[] {
  const alike = (size: number) => sizes.filter((other) => Math.abs(other - size) <= within).length;
  const shared = sizes.reduce((best, size) => {
    const more = alike(size) - alike(best);
    return more > 0 || (more === 0 && size > best + within) ? size : best;
  });
  return parts.map((part, i) =>
    Math.abs(sizes[i]! - shared) <= within ? part : { ...part, size: tidyLength(sizes[i]!) },
  );
}

function divide(leaves: readonly Leaf[], space: Extents, axis: Axis, within: number): LayoutPart | undefined {
  const spans = groups(leaves, axis, within);
  if (spans.length < 2) return undefined;
  const gaps = spans.slice(1).map((span, i) => span.from - spans[i]!.to);
  const between = Math.max(...gaps);
  // Mid-stiles of one part are all alike: where they are not, the wider ones part groups that the narrower ones divide.
  const joined: Span[] = [];
  const cuts: number[] = [];
  spans.forEach((span, i) => {
    const last = joined.at(-1);
    if (last && between - gaps[i - 1]! > within) {
      last.to = span.to;
      last.leaves.push(...span.leaves);
    } else {
      if (last) cuts.push(gaps[i - 1]!);
      joined.push({ ...span, leaves: [...span.leaves] });
    }
  });
  const [first, last] = spanOf(space, axis);
  if (Math.abs(joined[0]!.from - first) > within || Math.abs(joined.at(-1)!.to - last) > within) return undefined;
  const parts: LayoutPart[] = [];
  for (const span of joined) {
    const part = findLayout(span.leaves, narrowed(space, axis, span.from, span.to), within);
    if (!part) return undefined;
    parts.push(part);
  }
  const sized = withSizes(
    parts,
    joined.map(({ from, to }) => to - from),
    within,
  );
  const width = tidyLength(mean(cuts));
  return axis === 'columns' ? { columns: sized, between: width } : { rows: sized, between: width };
}

/**
 * The layout tree whose openings fill the space as these do, or undefined when no cuts straight across part them, or one of them
 * does not fill its place. Columns are tried before rows.
 */
export function findLayout(leaves: readonly Leaf[], space: Extents, within: number): LayoutPart | undefined {
  const [only] = leaves;
  if (leaves.length === 1 && only) {
    const e = only.extents;
    const fills = [e.minX - space.minX, e.maxX - space.maxX, e.minY - space.minY, e.maxY - space.maxY];
    return fills.every((off) => Math.abs(off) <= within) ? only.part : undefined;
  }
  return divide(leaves, space, 'columns', within) ?? divide(leaves, space, 'rows', within);
}

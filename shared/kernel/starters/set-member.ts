import { childrenOf, withChildren } from '../particulars/layout-parts.ts';
import type { LayoutPart, MembersOutline, Particulars } from '../particulars/particulars.ts';
import { SAME } from '../tolerances.ts';
import type { Changeable, MemberChange } from './member-change.ts';

export interface SetMember {
  readonly particulars: Particulars;
  /** What the entries were that changed, each once; none when nothing did. */
  readonly was: readonly number[];
  /** What the entries are that `from` left alone, each once. */
  readonly others: readonly number[];
  /** Whether the frame has any entry of this name. */
  readonly found: boolean;
}

/** Widths met on the way, and whether one is to be changed. */
interface Sift {
  readonly was: Set<number>;
  readonly others: Set<number>;
  readonly all: Set<number>;
  (value: number): number;
}

function siftFor({ from, to }: MemberChange): Sift {
  const was = new Set<number>();
  const others = new Set<number>();
  const all = new Set<number>();
  const sift = (value: number): number => {
    all.add(value);
    if (from !== undefined && Math.abs(value - from) > SAME) {
      others.add(value);
      return value;
    }
    if (Math.abs(value - to) > SAME) was.add(value);
    return to;
  };
  return Object.assign(sift, { was, others, all });
}

function withBetweens(part: LayoutPart, key: 'columns' | 'rows', sift: Sift): LayoutPart {
  if ('opening' in part) return part;
  const children = childrenOf(part).map((child) => withBetweens(child, key, sift));
  const inside = withChildren(part, children);
  return key in part && children.length > 1 ? ({ ...inside, between: sift(part.between) } as LayoutPart) : inside;
}

function setInOutline(outline: MembersOutline, what: Changeable, sift: Sift): MembersOutline {
  const { stiles, rails } = outline;
  switch (what) {
    case 'left stile':
      return { ...outline, stiles: { ...stiles, left: sift(stiles.left) } };
    case 'right stile':
      return { ...outline, stiles: { ...stiles, right: sift(stiles.right) } };
    case 'top rail':
      return { ...outline, rails: { ...rails, top: sift(rails.top) } };
    case 'bottom rail':
      return { ...outline, rails: { ...rails, bottom: sift(rails.bottom) } };
    case 'feet':
      return { ...outline, feet: sift(outline.feet) };
    case 'mid-stiles':
      return { ...outline, layout: withBetweens(outline.layout, 'columns', sift) };
    case 'mid-rails':
      return { ...outline, layout: withBetweens(outline.layout, 'rows', sift) };
    default:
      return outline;
  }
}

/** The particulars with one change put in, wherever `from` allows; dados keep their places. A traced outline has no members and stays as it is. */
export function setMember(particulars: Particulars, change: MemberChange): SetMember {
  const sift = siftFor(change);
  const { outline, dados } = particulars;
  const changed = ((): Particulars => {
    switch (change.what) {
      case 'thickness':
        return { ...particulars, thickness: sift(particulars.thickness) };
      case 'dado clearance':
        return { ...particulars, dados: dados.map((dado) => ({ ...dado, clearance: sift(dado.clearance) })) };
      case 'dado depth':
        return { ...particulars, dados: dados.map((dado) => ({ ...dado, depth: sift(dado.depth) })) };
      default:
        return outline.kind === 'members'
          ? { ...particulars, outline: setInOutline(outline, change.what, sift) }
          : particulars;
    }
  })();
  return {
    particulars: sift.was.size > 0 ? changed : particulars,
    was: [...sift.was],
    others: [...sift.others],
    found: sift.all.size > 0,
  };
}

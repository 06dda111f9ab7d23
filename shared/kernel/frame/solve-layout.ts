import type { Extents } from '../contour/contour.ts';
import type { LayoutPart, OpeningPart } from '../particulars/particulars.ts';
import { ADD_UP, SAME } from '../tolerances.ts';
import type { LayoutPath } from './members.ts';

export interface SolvedOpening {
  readonly path: LayoutPath;
  readonly part: OpeningPart;
  readonly extents: Extents;
}

/** A mid-stile (between columns) or mid-rail (between rows); `index` 0 is the leftmost or topmost of its part. */
export interface SolvedBetween {
  readonly path: LayoutPath;
  readonly kind: 'mid-stile' | 'mid-rail';
  readonly index: number;
  readonly extents: Extents;
}

/** Parts of one node that do not fill it: `over` is how much too long (positive) or short they are. */
export interface LayoutMisfit {
  readonly path: LayoutPath;
  readonly along: 'width' | 'height';
  readonly over: number;
  readonly extents: Extents;
}

export interface SolvedLayout {
  readonly openings: SolvedOpening[];
  readonly betweens: SolvedBetween[];
  readonly misfits: LayoutMisfit[];
}

/**
 * Lays the tree out in the space between the outer members, frame view. Parts with a size keep it; the others share what is
 * left equally. Columns run left to right, rows top to bottom. Where a node's parts do not fill it, it is listed as a misfit
 * and its parts are left out.
 */
export function solveLayout(layout: LayoutPart, space: Extents): SolvedLayout {
  const solved: SolvedLayout = { openings: [], betweens: [], misfits: [] };
  solvePart(layout, space, [], solved);
  return solved;
}

function solvePart(part: LayoutPart, space: Extents, path: LayoutPath, solved: SolvedLayout): void {
  if ('opening' in part) {
    solved.openings.push({ path, part, extents: space });
    return;
  }
  const across = 'columns' in part;
  const children = across ? part.columns : part.rows;
  const length = across ? space.maxX - space.minX : space.maxY - space.minY;
  const betweens = part.between * (children.length - 1);
  const fixed = children.reduce((sum, c) => sum + (c.size ?? 0), 0);
  const free = children.filter((c) => c.size === undefined).length;
  const rest = length - betweens - fixed;
  if (free === 0 ? Math.abs(rest) > ADD_UP : rest <= SAME) {
    solved.misfits.push({ path, along: across ? 'width' : 'height', over: -rest, extents: space });
    return;
  }
  const share = rest / free;
  let gone = 0;
  children.forEach((child, i) => {
    const isLast = i === children.length - 1;
    const size = child.size ?? share;
    const end = isLast ? length : gone + size;
    const slice = (from: number, to: number): Extents =>
      across
        ? {
            minX: space.minX + from,
            maxX: to === length ? space.maxX : space.minX + to,
            minY: space.minY,
            maxY: space.maxY,
          }
        : {
            minX: space.minX,
            maxX: space.maxX,
            maxY: space.maxY - from,
            minY: to === length ? space.minY : space.maxY - to,
          };
    solvePart(child, slice(gone, end), [...path, i], solved);
    if (!isLast)
      solved.betweens.push({
        path,
        kind: across ? 'mid-stile' : 'mid-rail',
        index: i,
        extents: slice(end, end + part.between),
      });
    gone = end + part.between;
  });
}

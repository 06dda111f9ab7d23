import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Flip } from '#shared/kernel/particulars/particulars.ts';
import { about, NO_TURN, type Turn } from '../model/turning.ts';

/** One copy of the part: which point of it comes to which place of the scene, and how it is turned. */
export interface CopyPlace {
  readonly from: { readonly x: number; readonly y: number; readonly z: number };
  readonly to: Point;
  readonly turn: Turn;
}

interface Copies {
  readonly shown: 'front' | 'back' | 'both';
  readonly flip: Flip;
}

/** Room beside copies, and around all, as a share of their size. */
const GAP = 0.06;
const ROOM = 1.12;

/**
 * One copy in the middle; or two about the fold as in the spread: the part turned over at the left, or above when the
 * board is turned end over end, and the part front up beside it.
 */
export function spreadOut(
  { minX, minY, maxX, maxY }: Extents,
  thickness: number,
  { shown, flip }: Copies,
): CopyPlace[] {
  const from = { x: (minX + maxX) / 2, y: (minY + maxY) / 2, z: -thickness / 2 };
  if (shown !== 'both') return [{ from, to: { x: 0, y: 0 }, turn: NO_TURN }];
  const isSide = flip === 'side-to-side';
  const off = ((isSide ? maxX - minX : maxY - minY) * (1 + GAP)) / 2;
  return [
    { from, to: isSide ? { x: off, y: 0 } : { x: 0, y: -off }, turn: NO_TURN },
    { from, to: isSide ? { x: -off, y: 0 } : { x: 0, y: off }, turn: about(isSide ? 'up' : 'right', Math.PI) },
  ];
}

/** Length of the scene that the screen is high at zoom 1, so that all copies fit a screen of this width over height. */
export function visibleHeight(
  { minX, minY, maxX, maxY }: Extents,
  thickness: number,
  { shown, flip }: Copies,
  aspect: number,
): number {
  const copies = (runs: Flip) => (shown === 'both' && flip === runs ? 2 + GAP : 1);
  const width = (maxX - minX + thickness) * copies('side-to-side');
  const height = (maxY - minY + thickness) * copies('end-over-end');
  return ROOM * Math.max(height, width / aspect);
}

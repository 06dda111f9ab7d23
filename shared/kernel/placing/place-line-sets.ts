import { rectangle } from '../contour/make-contour.ts';
import type { Extents } from '../contour/contour.ts';
import type { Face, LineSet } from '../line-sets/line-set.ts';
import type { FaceWork } from '../worked-frame.ts';
import { placeShape } from './place.ts';
import type { Placement } from './placement.ts';

/** Line sets of one face in frame view, laid on the board in that face's setup, with those that belong to the board and the blank last. */
export function placeLineSets(
  face: Face,
  placement: Placement,
  board: Extents,
  lineSets: readonly LineSet[],
  boardLineSets: readonly LineSet[],
): FaceWork {
  const blank: LineSet = {
    face,
    set: 'BLANK',
    variant: '',
    cutter: null,
    side: 'none',
    depth: 0,
    passes: [],
    shapes: [{ kind: 'contour', contour: rectangle(board), of: ['blank'] }],
  };
  const placed = lineSets.map((set) => ({ ...set, shapes: set.shapes.map((shape) => placeShape(placement, shape)) }));
  return { face, placement, board, lineSets: [...placed, ...boardLineSets, blank] };
}

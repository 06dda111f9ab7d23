import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { placeExtents, unplace } from '#shared/kernel/placing/place.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { PageMap } from '../model/view.ts';
import type { PaintedPath } from './painted.ts';
import { contourPath, extentsPath } from './shape-path.ts';

/** The board as it lies under this face. On the front the openings show the sheet beneath. `map` is from frame view. */
export function paintBoard({ contours, ...worked }: DrawnFrame, face: Face, map: PageMap): PaintedPath[] {
  const { board, placement } = worked[face];
  const outer = extentsPath(placeExtents(unplace(placement), board), map);
  const perimeter = contourPath(contours.perimeter, map);
  const openings = contours.openings.map((o) => contourPath(o.contour, map)).join('');
  const path = (key: string, d: string, look: string): PaintedPath => ({ kind: 'path', key, d, look });
  return face === 'back'
    ? [
        path('board', outer, 'fill-board'),
        path('frame', perimeter + openings, 'fill-none stroke-pencil [stroke-width:1] [stroke-dasharray:5_4]'),
      ]
    : [path('board', outer + openings, 'fill-board'), path('frame', perimeter + openings, 'fill-board-light')];
}

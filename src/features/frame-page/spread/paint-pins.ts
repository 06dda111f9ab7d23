import { placePoint, unplace } from '#shared/kernel/placing/place.ts';
import type { FaceWork } from '#shared/kernel/worked-frame.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';
import type { PaintedPin } from './painted.ts';

export const PIN_RADIUS_PX = 4.5;

/** The machine's locating pins against the lower and the left edge, near the corner where both setups begin. */
export function paintPins({ board, placement }: FaceWork, view: View, page: PageSize): PaintedPin[] {
  const places = [
    { at: { x: board.maxX * 0.06, y: 0 }, dx: 0, dy: PIN_RADIUS_PX },
    { at: { x: board.maxX * 0.3, y: 0 }, dx: 0, dy: PIN_RADIUS_PX },
    { at: { x: 0, y: board.maxY * 0.08 }, dx: -PIN_RADIUS_PX, dy: 0 },
  ];
  return places.map(({ at, dx, dy }, i) => {
    const { x, y } = toPage(view, placement, page, placePoint(unplace(placement), at));
    return { kind: 'pin', key: `pin-${i}`, x: x + dx, y: y + dy };
  });
}

import { toPage, type PageSize, type View } from '../model/view.ts';
import { placePoint, unplace } from '#shared/kernel/placing/place.ts';
import type { FaceWork } from '#shared/kernel/worked-frame.ts';

const RADIUS_PX = 4.5;

/** The machine's locating pins against the lower and the left edge, near the corner where both setups begin. */
export function Pins({ work, view, page }: { readonly work: FaceWork; readonly view: View; readonly page: PageSize }) {
  const { board, placement } = work;
  const places = [
    { at: { x: board.maxX * 0.06, y: 0 }, dx: 0, dy: RADIUS_PX },
    { at: { x: board.maxX * 0.3, y: 0 }, dx: 0, dy: RADIUS_PX },
    { at: { x: 0, y: board.maxY * 0.08 }, dx: -RADIUS_PX, dy: 0 },
  ];
  return places.map(({ at, dx, dy }, i) => {
    const p = toPage(view, placement, page, placePoint(unplace(placement), at));
    return (
      <circle key={i} cx={p.x + dx} cy={p.y + dy} r={RADIUS_PX} className="fill-paper stroke-ink [stroke-width:1.25]" />
    );
  });
}

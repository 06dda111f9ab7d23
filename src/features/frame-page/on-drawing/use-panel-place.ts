import { useLayoutEffect, useRef, type RefObject } from 'react';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';
import { usePageSize } from '../../../ui/use-page-size.ts';
import { placePanel, type Box } from './place-panel.ts';

interface PanelPlace {
  readonly panel: RefObject<HTMLElement | null>;
  readonly worked: DrawnFrame;
  readonly view: View;
  readonly page: PageSize;
  /** Page on which the extents were picked. */
  readonly face: Face;
  /** Frame view. */
  readonly extents: Extents;
}

/** Where the spread's parts are on the screen. */
interface Laid {
  readonly spread: DOMRect;
  readonly back: DOMRect;
  readonly front: DOMRect;
}

const rectOf = (spread: Element, face: Face): DOMRect =>
  spread.querySelector(`[data-face="${face}"]`)!.getBoundingClientRect();

/** What can be seen of a rectangle of frame view on a page, in pixels of the spread. */
function boxOn(laid: Laid, face: Face, { worked, view, page, extents }: PanelPlace): Box {
  const area = laid[face];
  const { placement } = worked[face];
  const a = toPage(view, placement, page, { x: extents.minX, y: extents.minY });
  const b = toPage(view, placement, page, { x: extents.maxX, y: extents.maxY });
  const within = (v: number, most: number): number => Math.max(0, Math.min(most, v));
  const left = within(Math.min(a.x, b.x), area.width);
  const top = within(Math.min(a.y, b.y), area.height);
  return {
    left: area.left - laid.spread.left + left,
    top: area.top - laid.spread.top + top,
    width: within(Math.max(a.x, b.x), area.width) - left,
    height: within(Math.max(a.y, b.y), area.height) - top,
  };
}

/** Keeps the panel beside what it edits, on whichever page there is room. */
export function usePanelPlace(place: PanelPlace): void {
  const { panel, worked, page, face } = place;
  const size = usePageSize(panel);
  const { flip } = worked.blank;
  const laid = useRef<Laid | null>(null);
  const now = useRef<Point | null>(null);

  // Asking where things are makes the browser lay the page out, for which a keystroke should not wait.
  useLayoutEffect(() => {
    const spread = panel.current?.closest('[data-spread]');
    laid.current = spread
      ? { spread: spread.getBoundingClientRect(), back: rectOf(spread, 'back'), front: rectOf(spread, 'front') }
      : null;
  }, [panel, page, flip, size]);

  useLayoutEffect(() => {
    if (!panel.current || !laid.current || size === null) return;
    const { width, height } = laid.current.spread;
    const own = boxOn(laid.current, face, place);
    const other = boxOn(laid.current, face === 'back' ? 'front' : 'back', place);
    const next = placePanel({ spread: { width, height }, panel: size, own, other, now: now.current });
    if (next === now.current) return;
    now.current = next;
    panel.current.style.setProperty('transform', `translate(${next.x}px, ${next.y}px)`);
  });
}

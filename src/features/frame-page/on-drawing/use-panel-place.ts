import { useLayoutEffect, useRef, type RefObject } from 'react';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';
import { usePageSize } from '../spread/use-page-size.ts';
import { placePanel, type Box } from './place-panel.ts';

interface PanelPlace {
  readonly panel: RefObject<HTMLElement | null>;
  readonly worked: WorkedFrame;
  readonly view: View;
  readonly page: PageSize;
  /** Page on which the extents were picked. */
  readonly face: Face;
  /** Frame view. */
  readonly extents: Extents;
}

/** What can be seen of a rectangle of frame view on a page, in pixels of the spread. */
function boxOn(spread: Element, face: Face, { worked, view, page, extents }: PanelPlace): Box {
  const area = spread.querySelector(`[data-face="${face}"]`)!.getBoundingClientRect();
  const origin = spread.getBoundingClientRect();
  const { placement } = worked[face];
  const a = toPage(view, placement, page, { x: extents.minX, y: extents.minY });
  const b = toPage(view, placement, page, { x: extents.maxX, y: extents.maxY });
  const within = (v: number, most: number): number => Math.max(0, Math.min(most, v));
  const left = within(Math.min(a.x, b.x), area.width);
  const top = within(Math.min(a.y, b.y), area.height);
  return {
    left: area.left - origin.left + left,
    top: area.top - origin.top + top,
    width: within(Math.max(a.x, b.x), area.width) - left,
    height: within(Math.max(a.y, b.y), area.height) - top,
  };
}

/** Keeps the panel beside what it edits, on whichever page there is room. */
export function usePanelPlace(place: PanelPlace): void {
  const { panel, face } = place;
  const size = usePageSize(panel);
  const now = useRef<Point | null>(null);
  useLayoutEffect(() => {
    const spread = panel.current?.closest('[data-spread]');
    if (!panel.current || !spread || size === null) return;
    const { width, height } = spread.getBoundingClientRect();
    const own = boxOn(spread, face, place);
    const other = boxOn(spread, face === 'back' ? 'front' : 'back', place);
    now.current = placePanel({ spread: { width, height }, panel: size, own, other, now: now.current });
    panel.current.style.transform = `translate(${now.current.x}px, ${now.current.y}px)`;
  });
}

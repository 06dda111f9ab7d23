import type { Extents } from '#shared/kernel/contour/contour.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { boardInFrameView, fitTo, type PageSize, type View } from './view.ts';

/** Share of the page left free on each side of the place, so that one sees where on the board it is. */
const FREE_SHARE = 0.25;
/** The nearest look: this share of the frame's longer side fills the page. A corner alone says nothing. */
const NEAREST_SHARE = 0.15;

const union = (all: readonly Extents[]): Extents => ({
  minX: Math.min(...all.map((e) => e.minX)),
  minY: Math.min(...all.map((e) => e.minY)),
  maxX: Math.max(...all.map((e) => e.maxX)),
  maxY: Math.max(...all.map((e) => e.maxY)),
});

/** Where all of them are; null when there is no such place. */
function overlap(all: readonly Extents[]): Extents | null {
  const e = {
    minX: Math.max(...all.map((e) => e.minX)),
    minY: Math.max(...all.map((e) => e.minY)),
    maxX: Math.min(...all.map((e) => e.maxX)),
    maxY: Math.min(...all.map((e) => e.maxY)),
  };
  return e.minX <= e.maxX && e.minY <= e.maxY ? e : null;
}

/** The view that shows what a finding means: where its places meet, else all of them. Never further away than the whole board. */
export function viewOfPlaces(worked: DrawnFrame, places: readonly Extents[], page: PageSize): View {
  const whole = fitTo(boardInFrameView(worked), page);
  const near = fitTo(overlap(places) ?? union(places), page, Math.min(page.width, page.height) * FREE_SHARE);
  const nearest =
    Math.min(page.width, page.height) / (NEAREST_SHARE * Math.max(worked.contours.width, worked.contours.height));
  return { centre: near.centre, scale: Math.max(whole.scale, Math.min(near.scale, nearest)) };
}

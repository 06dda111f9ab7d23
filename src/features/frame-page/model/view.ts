import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import { placeExtents, unplace } from '#shared/kernel/placing/place.ts';
import type { Placement } from '#shared/kernel/placing/placement.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/**
 * How the two pages look at the board. Both look at the same place of the frame at the same scale: what is in the
 * middle of the back's page is in the middle of the front's.
 */
export interface View {
  /** Pixels a unit of length. */
  readonly scale: number;
  /** Frame view. */
  readonly centre: Point;
}

/** A page's drawing area in pixels. */
export interface PageSize {
  readonly width: number;
  readonly height: number;
}

/** Room about the fitted board for lines that run past it, sizes and labels. */
const FIT_MARGIN_PX = 34;
/** Zoom of one key or button press. */
export const ZOOM_STEP = 1.25;
const LEAST_SCALE = 0.02;
const GREATEST_SCALE = 40_000;

const clampScale = (scale: number): number => Math.min(GREATEST_SCALE, Math.max(LEAST_SCALE, scale));

const around = (a: Extents, b: Extents): Extents => ({
  minX: Math.min(a.minX, b.minX),
  minY: Math.min(a.minY, b.minY),
  maxX: Math.max(a.maxX, b.maxX),
  maxY: Math.max(a.maxY, b.maxY),
});

/** The board as loaded and as squared, both in frame view. */
export const boardInFrameView = ({ back, front }: DrawnFrame): Extents =>
  around(placeExtents(unplace(back.placement), back.board), placeExtents(unplace(front.placement), front.board));

/** The view that shows a rectangle of frame view whole and as large as the page allows. */
export function fitTo(e: Extents, page: PageSize, margin = FIT_MARGIN_PX): View {
  const across = Math.max(1, page.width - 2 * margin);
  const up = Math.max(1, page.height - 2 * margin);
  // A place without size, such as a corner, is shown with about as much around it as its own neighbourhood.
  const scale = Math.min(across / Math.max(e.maxX - e.minX, 1e-6), up / Math.max(e.maxY - e.minY, 1e-6));
  return { scale: clampScale(scale), centre: { x: (e.minX + e.maxX) / 2, y: (e.minY + e.maxY) / 2 } };
}

/** Pixels from the page's upper left corner to frame view. */
export const fromPage = (view: View, pl: Placement, page: PageSize, px: Point): Point => ({
  x: view.centre.x + (pl.sx * (px.x - page.width / 2)) / view.scale,
  y: view.centre.y - (pl.sy * (px.y - page.height / 2)) / view.scale,
});

/** Frame view to pixels from the page's upper left corner. */
export const toPage = (view: View, pl: Placement, page: PageSize, p: Point): Point => ({
  x: page.width / 2 + pl.sx * view.scale * (p.x - view.centre.x),
  y: page.height / 2 - pl.sy * view.scale * (p.y - view.centre.y),
});

/** Zooms by a factor while `about` (frame view) stays where it is on both pages. */
export function zoomView(view: View, factor: number, about: Point = view.centre): View {
  const scale = clampScale(view.scale * factor);
  const kept = view.scale / scale;
  return {
    scale,
    centre: { x: about.x + (view.centre.x - about.x) * kept, y: about.y + (view.centre.y - about.y) * kept },
  };
}

/** Moves the board by pixels on the page with this placement; on the other page it goes the mirrored way. */
export const panView = (view: View, pl: Placement, dx: number, dy: number): View => ({
  scale: view.scale,
  centre: { x: view.centre.x - (pl.sx * dx) / view.scale, y: view.centre.y + (pl.sy * dy) / view.scale },
});

/** From lengths on the board to pixels of a page, which runs down: x' = sx·x + dx, y' = sy·y + dy. */
export interface PageMap {
  readonly sx: number;
  readonly sy: number;
  readonly dx: number;
  readonly dy: number;
}

/** From a setup's coordinates to the page. */
export const setupMap = (view: View, pl: Placement, page: PageSize): PageMap => ({
  sx: view.scale,
  sy: -view.scale,
  dx: page.width / 2 - view.scale * (pl.sx * view.centre.x + pl.dx),
  dy: page.height / 2 + view.scale * (pl.sy * view.centre.y + pl.dy),
});

/** From frame view to the page. */
export function frameMap(view: View, pl: Placement, page: PageSize): PageMap {
  const { x, y } = toPage(view, pl, page, { x: 0, y: 0 });
  return { sx: pl.sx * view.scale, sy: -pl.sy * view.scale, dx: x, dy: y };
}

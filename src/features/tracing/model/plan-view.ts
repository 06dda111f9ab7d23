import type { Extents, Point } from '#shared/kernel/contour/contour.ts';

/** How the page looks at a drawing: Y runs up in the drawing and down on the page. */
export interface PlanView {
  /** Pixels a drawing unit. */
  readonly scale: number;
  /** The place of the drawing in the middle of the page. */
  readonly centre: Point;
}

export interface PlanSize {
  readonly width: number;
  readonly height: number;
}

/** Room about a fitted drawing for marks that stand out of it. */
const FIT_MARGIN_PX = 28;
/** Zoom of one key or button press. */
export const ZOOM_STEP = 1.25;
/** How far one may zoom out of and into a fitted drawing; further in, browsers draw lines out of place. */
const LEAST_ZOOM = 0.2;
const GREATEST_ZOOM = 20_000;

/** The view that shows a rectangle whole and as large as the page allows; a place without size is shown with `room` about it. */
export function fitPlan({ minX, minY, maxX, maxY }: Extents, page: PlanSize, room: number): PlanView {
  const across = Math.max(1, page.width - 2 * FIT_MARGIN_PX);
  const up = Math.max(1, page.height - 2 * FIT_MARGIN_PX);
  const scale = Math.min(across / Math.max(maxX - minX, room), up / Math.max(maxY - minY, room));
  return { scale, centre: { x: (minX + maxX) / 2, y: (minY + maxY) / 2 } };
}

/** A view within what can be drawn, against the fitted one; at the end of the zoom the drawing stays where it was in `before`. */
export function keepDrawable(next: PlanView, before: PlanView, fitted: PlanView): PlanView {
  const scale = Math.min(fitted.scale * GREATEST_ZOOM, Math.max(fitted.scale * LEAST_ZOOM, next.scale));
  return scale === next.scale ? next : { scale, centre: before.centre };
}

export const toPlan = (view: PlanView, page: PlanSize, px: Point): Point => ({
  x: view.centre.x + (px.x - page.width / 2) / view.scale,
  y: view.centre.y - (px.y - page.height / 2) / view.scale,
});

export const fromPlan = (view: PlanView, page: PlanSize, p: Point): Point => ({
  x: page.width / 2 + (p.x - view.centre.x) * view.scale,
  y: page.height / 2 - (p.y - view.centre.y) * view.scale,
});

/** Zooms by a factor while `about` stays where it is on the page. */
export function zoomPlan(view: PlanView, factor: number, about: Point = view.centre): PlanView {
  return {
    scale: view.scale * factor,
    centre: {
      x: about.x + (view.centre.x - about.x) / factor,
      y: about.y + (view.centre.y - about.y) / factor,
    },
  };
}

/** Moves the drawing by pixels. */
export const panPlan = (view: PlanView, dx: number, dy: number): PlanView => ({
  scale: view.scale,
  centre: { x: view.centre.x - dx / view.scale, y: view.centre.y + dy / view.scale },
});

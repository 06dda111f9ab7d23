import type { Point } from '#shared/kernel/contour/contour.ts';
import type { PageSize } from '../model/view.ts';

/** Pixels from the spread's upper left corner, Y down. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** Room between the panel and what it edits, and to the spread's edge. */
const ROOM_PX = 8;

const clamp = (v: number, min: number, max: number): number => Math.max(min, Math.min(max, v));

const isFree = (a: Box, b: Box): boolean =>
  a.left + a.width <= b.left || b.left + b.width <= a.left || a.top + a.height <= b.top || b.top + b.height <= a.top;

interface PanelPlacing {
  readonly spread: PageSize;
  readonly panel: PageSize;
  /** Where what is edited lies on the page it was picked on. */
  readonly own: Box;
  /** The same on the other page. */
  readonly other: Box;
  /** Where the panel is now: it stays while it covers nothing of `own`, so that it does not jump about while a size is typed. */
  readonly now: Point | null;
}

/**
 * Upper left corner of the panel, in pixels of the spread: beside what it edits, covering it on neither page if that can be,
 * else not on the page it was picked on. Where that fills its page and more, the corner furthest from it.
 */
export function placePanel({ spread, panel, own, other, now }: PanelPlacing): Point {
  const right = spread.width - panel.width - ROOM_PX;
  const low = spread.height - panel.height - ROOM_PX;
  const at = (x: number, y: number): Point => ({
    x: Math.round(clamp(x, ROOM_PX, Math.max(ROOM_PX, right))),
    y: Math.round(clamp(y, ROOM_PX, Math.max(ROOM_PX, low))),
  });
  const boxAt = (p: Point): Box => ({ left: p.x, top: p.y, ...panel });
  if (now && isFree(boxAt(now), own) && now.x === at(now.x, now.y).x && now.y === at(now.x, now.y).y) return now;

  const beside = (box: Box): Point[] => {
    const level = box.top + box.height / 2 - panel.height / 2;
    const upright = box.left + box.width / 2 - panel.width / 2;
    return [
      at(box.left + box.width + ROOM_PX, level),
      at(box.left - panel.width - ROOM_PX, level),
      at(upright, box.top + box.height + ROOM_PX),
      at(upright, box.top - panel.height - ROOM_PX),
    ];
  };
  const corners = [at(right, ROOM_PX), at(ROOM_PX, ROOM_PX), at(right, low), at(ROOM_PX, low)];
  const free = [...beside(own), ...beside(other), ...corners].filter((p) => isFree(boxAt(p), own));
  const best = free.find((p) => isFree(boxAt(p), other)) ?? free[0];
  if (best) return best;
  const away = (p: Point): number =>
    Math.hypot(p.x + panel.width / 2 - own.left - own.width / 2, p.y + panel.height / 2 - own.top - own.height / 2);
  return corners.reduce((a, b) => (away(b) > away(a) ? b : a));
}

import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Flip } from '#shared/kernel/particulars/particulars.ts';

/** A turn in space as a unit quaternion: x, y, z, w. */
export type Turn = readonly [number, number, number, number];

/** How the part is held: turned, drawn `zoom` times as large as fits, its middle moved by `pan` (lengths of the part, screen right and up). */
export interface Hold {
  readonly turn: Turn;
  readonly zoom: number;
  readonly pan: Point;
}

/** Closest and furthest. */
const ZOOMS = { least: 0.5, most: 200 };

export const NO_TURN: Turn = [0, 0, 0, 1];

const multiply = ([ax, ay, az, aw]: Turn, [bx, by, bz, bw]: Turn): Turn => [
  aw * bx + ax * bw + ay * bz - az * by,
  aw * by - ax * bz + ay * bw + az * bx,
  aw * bz + ax * by - ay * bx + az * bw,
  aw * bw - ax * bx - ay * by - az * bz,
];

function normal(turn: Turn): Turn {
  const length = Math.hypot(...turn);
  return turn.map((value) => value / length) as unknown as Turn;
}

/** A turn about one axis of the screen; radians, positive counter-clockwise seen from the axis' tip. */
export const about = (axis: 'right' | 'up', angle: number): Turn => {
  const [s, c] = [Math.sin(angle / 2), Math.cos(angle / 2)];
  return axis === 'right' ? [s, 0, 0, c] : [0, s, 0, c];
};

/** Turns the part on, as the screen sees it: about the screen's upright axis, then about its level one. */
export const turnOn = (hold: Hold, aroundUp: number, aroundRight: number): Hold => ({
  ...hold,
  turn: normal(multiply(about('right', aroundRight), multiply(about('up', aroundUp), hold.turn))),
});

export const panOn = (hold: Hold, right: number, up: number): Hold => ({
  ...hold,
  pan: { x: hold.pan.x + right, y: hold.pan.y + up },
});

/** Zooms so that the place of the part at `at` (lengths from the screen's middle, right and up) stays under it. */
export function zoomOn(hold: Hold, factor: number, at: Point = { x: 0, y: 0 }): Hold {
  const zoom = Math.min(ZOOMS.most, Math.max(ZOOMS.least, hold.zoom * factor));
  const share = hold.zoom / zoom;
  return { ...hold, zoom, pan: { x: hold.pan.x - at.x * (1 - share), y: hold.pan.y - at.y * (1 - share) } };
}

/** A little from the upper right, so that depths show. */
const LEAN_UP = -0.45;
const LEAN_RIGHT = 0.5;

const leaning = (turn: Turn): Hold => turnOn({ turn, zoom: 1, pan: { x: 0, y: 0 } }, LEAN_UP, LEAN_RIGHT);

/** How a face is first held: the back as it comes up when the board is turned over about the fold; both flat, as in the spread. */
export function firstHold(shown: 'front' | 'back' | 'both', flip: Flip): Hold {
  if (shown === 'both') return { turn: NO_TURN, zoom: 1, pan: { x: 0, y: 0 } };
  if (shown === 'front') return leaning(NO_TURN);
  return leaning(about(flip === 'side-to-side' ? 'up' : 'right', Math.PI));
}

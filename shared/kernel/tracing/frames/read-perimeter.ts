import type { Contour } from '../../contour/contour.ts';
import { contourExtents } from '../../contour/contour-extents.ts';

export interface ReadPerimeter {
  readonly width: number;
  readonly height: number;
  /** Height of the notch between the feet, 0 when there is none; `left` and `right` are the feet's widths then. */
  readonly feet: number;
  readonly left: number;
  readonly right: number;
}

/** A rectangle from 0, 0, or one with a notch in the middle of its lower edge; undefined for anything else. */
export function readPerimeter(contour: Contour, within: number): ReadPerimeter | undefined {
  const { vertices } = contour;
  if (vertices.some((v) => v.bulge !== 0) || (vertices.length !== 4 && vertices.length !== 8)) return undefined;
  const { maxX: width, maxY: height } = contourExtents(contour);
  const near = (a: number, b: number) => Math.abs(a - b) <= within;
  const has = (x: number, y: number) => vertices.some((v) => near(v.x, x) && near(v.y, y));
  if (![0, width].every((x) => has(x, 0) && has(x, height))) return undefined;
  if (vertices.length === 4) return { width, height, feet: 0, left: 0, right: 0 };
  // The other four are the notch: two on the lower edge, two above them.
  const notch = vertices.filter((v) => !near(v.x, 0) && !near(v.x, width));
  const [left, right] = [Math.min(...notch.map((v) => v.x)), Math.max(...notch.map((v) => v.x))];
  const feet = Math.max(...notch.map((v) => v.y));
  const isNotch =
    notch.length === 4 &&
    feet < height &&
    [left, right].every((x) => has(x, 0) && has(x, feet)) &&
    right - left > within;
  // Walked round, a notch goes up where it is left: no vertex of it is at the top.
  return isNotch && feet > within ? { width, height, feet, left, right: width - right } : undefined;
}

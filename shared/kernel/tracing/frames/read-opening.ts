import type { Contour, Extents } from '../../contour/contour.ts';
import { contourExtents } from '../../contour/contour-extents.ts';
import { counterClockwise } from '../../contour/make-contour.ts';
import { HALF_CIRCLE } from './frames-tolerances.ts';

/** An opening as a layout tree has it: a rectangle, its head an arc of this rise or straight. */
export interface ReadOpening {
  readonly extents: Extents;
  readonly arch: number;
}

/** The rectangle, arched or not, that a contour is; undefined when it is none. */
export function readOpening(contour: Contour, within: number): ReadOpening | undefined {
  const { vertices } = counterClockwise(contour);
  if (vertices.length !== 4) return undefined;
  const extents = contourExtents(contour);
  const { minX, maxX, minY, maxY } = extents;
  const head = vertices.find((v) => v.bulge !== 0);
  const straight = vertices.filter((v) => v.bulge === 0).length;
  // The rise over a chord c is bulge · c/2; over half the width the widest place would lie above the springing.
  const arch = head ? (head.bulge * (maxX - minX)) / 2 : 0;
  if (straight < (head ? 3 : 4) || arch < 0 || (head && head.bulge > 1 + HALF_CIRCLE)) return undefined;
  const near = (a: number, b: number) => Math.abs(a - b) <= within;
  const springing = maxY - arch;
  const has = (x: number, y: number) => vertices.some((v) => near(v.x, x) && near(v.y, y));
  const corners = [minX, maxX].every((x) => has(x, minY) && has(x, springing));
  if (!corners || (head && !(near(head.x, maxX) && near(head.y, springing)))) return undefined;
  return { extents, arch };
}

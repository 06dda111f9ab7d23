import type { Contour } from '../../contour/contour.ts';
import { contourExtents } from '../../contour/contour-extents.ts';
import type { Dado } from '../../particulars/particulars.ts';
import type { Unit } from '../../units/unit.ts';
import { upright } from './frames-tolerances.ts';
import { tidyCoordinate } from './tidy-coordinate.ts';

/** What a rectangle in a drawing says of a dado, frame view. Panel, clearance, depth and ends it does not say. */
export interface TracedDado {
  readonly runs: Dado['runs'];
  /** Left side (vertical) or lower side (horizontal). */
  readonly at: number;
  readonly width: number;
  readonly from: number;
  readonly to: number;
}

/** A dado from an upright rectangle, along its longer side; a square runs vertically. Undefined for any other contour. */
export function readDado(contour: Contour, unit: Unit): TracedDado | undefined {
  const { vertices } = contour;
  if (vertices.length !== 4 || vertices.some((v) => v.bulge !== 0)) return undefined;
  const e = contourExtents(contour);
  const near = (a: number, b: number) => Math.abs(a - b) <= upright(unit);
  const isCorner = (x: number, y: number) => vertices.some((v) => near(v.x, x) && near(v.y, y));
  const corners = [e.minX, e.maxX].every((x) => [e.minY, e.maxY].every((y) => isCorner(x, y)));
  if (!corners) return undefined;
  const [minX, maxX, minY, maxY] = [e.minX, e.maxX, e.minY, e.maxY].map(tidyCoordinate) as [
    number,
    number,
    number,
    number,
  ];
  return maxY - minY >= maxX - minX
    ? { runs: 'vertical', at: minX, width: tidyCoordinate(maxX - minX), from: minY, to: maxY }
    : { runs: 'horizontal', at: minY, width: tidyCoordinate(maxY - minY), from: minX, to: maxX };
}

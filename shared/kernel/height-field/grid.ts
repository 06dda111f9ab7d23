import type { Extents } from '../contour/contour.ts';

/**
 * Places at which a height field is worked out: the middles of square cells, row by row from the lower left, in frame
 * view and the frame's unit. Sample (i, j) lies at index j · columns + i.
 */
export interface Grid {
  readonly minX: number;
  readonly minY: number;
  /** Side of a cell. */
  readonly cell: number;
  readonly columns: number;
  readonly rows: number;
}

/** More samples than this are refused: 4 bytes of depth and 1 of owner each. */
const MOST_SAMPLES = 64_000_000;

/**
 * The grid of cells that covers a region, its lower left corner on the region's. Throws for a cell that is not above 0, a
 * region without an inside, and for more samples than fit a page's memory.
 */
export function makeGrid({ minX, minY, maxX, maxY }: Extents, cell: number): Grid {
  if (!(cell > 0)) throw new RangeError(`cell: got ${cell}, takes a length above 0`);
  if (!(maxX > minX && maxY > minY))
    throw new RangeError(`region: got ${minX}, ${minY} to ${maxX}, ${maxY}, takes one with an inside`);
  // A hair off a whole number of cells does not call for one more.
  const count = (length: number) => Math.max(1, Math.ceil(length / cell - 1 / 1024));
  const grid = { minX, minY, cell, columns: count(maxX - minX), rows: count(maxY - minY) };
  if (grid.columns * grid.rows > MOST_SAMPLES)
    throw new RangeError(
      `cell: got ${cell}, which makes ${grid.columns} × ${grid.rows} samples; takes one that makes at most ${MOST_SAMPLES}`,
    );
  return grid;
}

export const sampleX = (grid: Grid, i: number): number => grid.minX + (i + 0.5) * grid.cell;
export const sampleY = (grid: Grid, j: number): number => grid.minY + (j + 0.5) * grid.cell;

/** First column whose sample is at or right of x, from 0 to the count of columns. */
export const firstColumn = (grid: Grid, x: number): number =>
  clamp(Math.ceil((x - grid.minX) / grid.cell - 0.5), grid.columns);
/** One past the last column whose sample is at or left of x. */
export const endColumn = (grid: Grid, x: number): number =>
  clamp(Math.floor((x - grid.minX) / grid.cell - 0.5) + 1, grid.columns);
export const firstRow = (grid: Grid, y: number): number =>
  clamp(Math.ceil((y - grid.minY) / grid.cell - 0.5), grid.rows);
export const endRow = (grid: Grid, y: number): number =>
  clamp(Math.floor((y - grid.minY) / grid.cell - 0.5) + 1, grid.rows);

const clamp = (value: number, most: number): number => (value < 0 ? 0 : value > most ? most : value);

/** The extents of all cells. */
export const gridExtents = ({ minX, minY, cell, columns, rows }: Grid): Extents => ({
  minX,
  minY,
  maxX: minX + columns * cell,
  maxY: minY + rows * cell,
});

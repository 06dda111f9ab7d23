import type { Grid } from './grid.ts';

/** What has been cut from one face of a board: depth below that face at each sample of a grid, 0 where it is untouched. */
export interface HeightField {
  readonly grid: Grid;
  /** No depth is greater: there the cut goes through. */
  readonly thickness: number;
  readonly depth: Float32Array;
  /** Which layer went deepest: its place in the face's cutting order, from 1; the first one where several are as deep. 0: none. */
  readonly by: Uint8Array;
}

/** A field of an untouched board. */
export const uncut = (grid: Grid, thickness: number): HeightField => ({
  grid,
  thickness,
  depth: new Float32Array(grid.columns * grid.rows),
  by: new Uint8Array(grid.columns * grid.rows),
});

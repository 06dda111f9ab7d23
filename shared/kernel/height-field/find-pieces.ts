import type { Grid } from './grid.ts';

/** Which piece each sample belongs to, from 1; 0 where there is nothing. */
export interface Pieces {
  readonly pieces: Int32Array;
  readonly count: number;
}

/** Pieces of a raster of 1 and 0 that touch by side or corner: runs of each row are joined to those of the row below. */
export function findPieces(filled: Uint8Array, { columns, rows }: Grid): Pieces {
  const pieces = new Int32Array(filled.length);
  // Union–find over runs; a run's number is its index here.
  const joined: number[] = [0];
  const root = (run: number): number => {
    let at = run;
    while (joined[at] !== at) {
      joined[at] = joined[joined[at]!]!;
      at = joined[at]!;
    }
    return at;
  };
  for (let j = 0; j < rows; j++) {
    const start = j * columns;
    for (let i = 0; i < columns; i++) {
      if (filled[start + i] === 0) continue;
      const from = i;
      while (i < columns && filled[start + i] !== 0) i++;
      const run = joined.length;
      joined.push(run);
      pieces.fill(run, start + from, start + i);
      if (j === 0) continue;
      const last = Math.min(columns - 1, i);
      for (let k = Math.max(0, from - 1); k <= last; k++) {
        const below = pieces[start - columns + k]!;
        if (below !== 0) joined[root(run)] = root(below);
      }
    }
  }
  const numbers = new Int32Array(joined.length);
  let count = 0;
  for (let run = 1; run < joined.length; run++) if (root(run) === run) numbers[run] = ++count;
  for (let at = 0; at < pieces.length; at++) if (pieces[at] !== 0) pieces[at] = numbers[root(pieces[at]!)]!;
  return { pieces, count };
}

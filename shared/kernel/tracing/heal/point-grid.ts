/**
 * A hashed grid of numbered points, for finding those near a place in about constant time. Points are added by number; their
 * coordinates are read from `x` and `y`, which may be filled in as points are added, but must not change afterwards.
 */
export interface PointGrid {
  readonly add: (index: number) => void;
  /** Calls `visit` for each point at most `reach` away, in no order. `visit` answers true to stop. */
  readonly eachNear: (px: number, py: number, reach: number, visit: (index: number) => boolean | void) => void;
}

/** Throws for a cell that is no positive length. */
export function makePointGrid(x: Float64Array, y: Float64Array, cell: number): PointGrid {
  if (!(cell > 0)) throw new RangeError(`cell: got ${cell}, takes a length above 0`);
  // Few slots, that they stay in the processor's cache: about one or two points to a slot when there are as many points as may be.
  let bits = 4;
  while (1 << bits < x.length / 2) bits++;
  const first = new Int32Array(1 << bits).fill(-1);
  const next = new Int32Array(x.length);
  // Two odd multipliers mix column and row; the upper bits of the product are the best mixed.
  const slot = (column: number, row: number) =>
    (Math.imul(column | 0, 0x9e3779b1) ^ Math.imul((row | 0) + 0x7f4a7c15, 0x85ebca6b)) >>> (32 - bits);
  return {
    add: (index) => {
      const at = slot(Math.floor(x[index]! / cell), Math.floor(y[index]! / cell));
      next[index] = first[at]!;
      first[at] = index;
    },
    eachNear: (px, py, reach, visit) => {
      const firstColumn = Math.floor((px - reach) / cell);
      const lastColumn = Math.floor((px + reach) / cell);
      const firstRow = Math.floor((py - reach) / cell);
      const lastRow = Math.floor((py + reach) / cell);
      for (let column = firstColumn; column <= lastColumn; column++)
        for (let row = firstRow; row <= lastRow; row++)
          for (let i = first[slot(column, row)]!; i >= 0; i = next[i]!) {
            const dx = x[i]! - px;
            const dy = y[i]! - py;
            // Different cells may share a slot: a point counts for its own cell only.
            if (dx * dx + dy * dy > reach * reach) continue;
            if (Math.floor(x[i]! / cell) !== column || Math.floor(y[i]! / cell) !== row) continue;
            if (visit(i)) return;
          }
    },
  };
}

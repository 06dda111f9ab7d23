import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findPieces } from '#shared/kernel/height-field/find-pieces.ts';

const columns = 12;
const rows = 9;
const grid = { minX: 0, minY: 0, cell: 1, columns, rows };

/** Another way to the same: paint from each sample to its eight neighbours. */
function flood(filled: Uint8Array): number[] {
  const piece = Array.from(filled, () => 0);
  let count = 0;
  for (let start = 0; start < filled.length; start++) {
    if (filled[start] === 0 || piece[start] !== 0) continue;
    const open = [start];
    piece[start] = ++count;
    while (open.length > 0) {
      const at = open.pop()!;
      const [x, y] = [at % columns, Math.floor(at / columns)];
      for (let dy = -1; dy <= 1; dy++)
        for (let dx = -1; dx <= 1; dx++) {
          const to = (y + dy) * columns + x + dx;
          if (x + dx < 0 || x + dx >= columns || y + dy < 0 || y + dy >= rows || filled[to] === 0 || piece[to] !== 0)
            continue;
          piece[to] = count;
          open.push(to);
        }
    }
  }
  return piece;
}

/** Pieces under names of their own: each by the first sample it has. */
const named = (pieces: ArrayLike<number>) =>
  Array.from(pieces, (piece) => (piece === 0 ? -1 : Array.prototype.indexOf.call(pieces, piece)));

describe('When the pieces of a raster are told apart', () => {
  test('then samples that touch by side or corner are one piece: random rasters against painting', () => {
    fc.assert(
      fc.property(fc.uint8Array({ minLength: columns * rows, maxLength: columns * rows, max: 1 }), (filled) => {
        const { pieces, count } = findPieces(filled, grid);
        const painted = flood(filled);
        expect(named(pieces)).toEqual(named(painted));
        expect(count).toBe(Math.max(0, ...painted));
      }),
    );
  });

  test('then an empty raster has none', () => {
    expect(findPieces(new Uint8Array(columns * rows), grid).count).toBe(0);
  });
});

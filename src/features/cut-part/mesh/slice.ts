import { GONE, LOOSE, type CutPart } from '#shared/kernel/height-field/cut-part.ts';
import { sampleX, sampleY } from '#shared/kernel/height-field/grid.ts';

/** The cut through a board at a plane: the board's inside as triangles, and its outline as pairs of points; frame view. */
export interface Slice {
  readonly positions: Float32Array;
  readonly index: Uint32Array;
  /** Where in `index` the loose pieces begin. */
  readonly looseFrom: number;
  readonly outline: Float32Array;
  /** How much of the outline, in numbers, belongs to the part; the rest to loose pieces. */
  readonly outlineLooseFrom: number;
}

/** A stretch of samples where board stands, all of one kind. */
interface Run {
  readonly from: number;
  /** One past its last sample. */
  readonly to: number;
  readonly isLoose: boolean;
}

function runsOf(standing: Uint8Array): Run[] {
  const runs: Run[] = [];
  for (let i = 0; i < standing.length;) {
    const kind = standing[i]!;
    const from = i;
    while (i < standing.length && standing[i] === kind) i++;
    if (kind !== GONE && i - from > 1) runs.push({ from, to: i, isLoose: kind === LOOSE });
  }
  return runs.sort((p, q) => Number(p.isLoose) - Number(q.isLoose));
}

/** The slice of a part that is one sample wide: a column of samples for an upright plane, a row for a level one. Throws for a wider one. */
export function makeSlice({ grid, thickness, front, back, standing }: CutPart): Slice {
  if (grid.columns !== 1 && grid.rows !== 1)
    throw new RangeError(`slice: got ${grid.columns} × ${grid.rows} samples, takes one row or column`);
  const isUpright = grid.columns === 1;
  const positions: number[] = [];
  const index: number[] = [];
  const outline: number[] = [];
  let [looseFrom, outlineLooseFrom] = [-1, -1];
  const point = (k: number, z: number): [number, number, number] =>
    isUpright ? [sampleX(grid, 0), sampleY(grid, k), z] : [sampleX(grid, k), sampleY(grid, 0), z];
  const top = (k: number) => point(k, -front.depth[k]!);
  const under = (k: number) => point(k, back.depth[k]! - thickness);

  for (const { from, to, isLoose } of runsOf(standing)) {
    if (isLoose && looseFrom < 0) [looseFrom, outlineLooseFrom] = [index.length, outline.length];
    const first = positions.length / 3;
    for (let k = from; k < to; k++) positions.push(...top(k), ...under(k));
    for (let k = from; k + 1 < to; k++) {
      const at = first + 2 * (k - from);
      index.push(at, at + 1, at + 2, at + 2, at + 1, at + 3);
      outline.push(...top(k), ...top(k + 1), ...under(k), ...under(k + 1));
    }
    outline.push(...top(from), ...under(from), ...top(to - 1), ...under(to - 1));
  }
  return {
    positions: Float32Array.from(positions),
    index: Uint32Array.from(index),
    looseFrom: looseFrom < 0 ? index.length : looseFrom,
    outline: Float32Array.from(outline),
    outlineLooseFrom: outlineLooseFrom < 0 ? outline.length : outlineLooseFrom,
  };
}

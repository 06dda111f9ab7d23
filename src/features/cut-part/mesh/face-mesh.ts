import { GONE, LOOSE, type CutPart } from '#shared/kernel/height-field/cut-part.ts';
import { sampleX, sampleY } from '#shared/kernel/height-field/grid.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { rightTriangles, type Raster } from './right-triangles.ts';

/** One surface of a cut board as triangles; frame view, z = 0 on the front face and negative below it. */
export interface FaceMesh {
  /** x, y, z of each corner. */
  readonly positions: Float32Array;
  /** Which of the face's layers cut there, from 1 in cutting order; 0: none. */
  readonly by: Uint8Array;
  /** Triangles, outer side counter-clockwise: those of the part first, then those of pieces that have come free. */
  readonly index: Uint32Array;
  /** Where in `index` the loose pieces begin. */
  readonly looseFrom: number;
}

/** Room about the samples for the board's own edges. */
const RING = 1;

/** The raster's side for a grid: a power of two and one more, with a ring of nothing about the samples. */
export function rasterSide(columns: number, rows: number): number {
  let span = 2;
  while (span + 1 < Math.max(columns, rows) + 2 * RING) span *= 2;
  return span + 1;
}

/**
 * Heights of one surface. Where nothing is left the walls run down to the other surface, so that both close the board
 * between them; beside the board they meet at the back.
 */
function makeRaster({ grid, thickness, front, back, standing }: CutPart, face: Face): Raster {
  const side = rasterSide(grid.columns, grid.rows);
  const height = new Float32Array(side * side).fill(-thickness);
  const kind = new Uint16Array(side * side);
  const by = face === 'front' ? front.by : back.by;
  for (let j = 0; j < grid.rows; j++) {
    for (let i = 0; i < grid.columns; i++) {
      const at = j * grid.columns + i;
      const to = (j + RING) * side + i + RING;
      const under = thickness - back.depth[at]!;
      height[to] = face === 'back' ? -under : -Math.min(front.depth[at]!, under);
      if (standing[at] !== GONE) kind[to] = standing[at]! * 256 + by[at]!;
    }
  }
  return { side, height, kind };
}

/** The surface of a cut board seen from `face`, flat stretches merged as far as `tolerance` allows; see right-triangles.ts. */
export function faceMesh(part: CutPart, face: Face, tolerance: number): FaceMesh {
  const { grid } = part;
  const raster = makeRaster(part, face);
  const { side, kind, height } = raster;
  const walk = rightTriangles(raster, tolerance);
  const isLoose = (a: number, b: number, c: number) => kind[a]! >> 8 === LOOSE || kind[b]! >> 8 === LOOSE || kind[c]! >> 8 === LOOSE;

  const numbers = new Uint32Array(side * side);
  let corners = 0;
  let [partCount, looseCount] = [0, 0];
  walk((a, b, c) => {
    if (isLoose(a, b, c)) looseCount++;
    else partCount++;
    for (const at of [a, b, c]) if (numbers[at] === 0) numbers[at] = ++corners;
  });

  const index = new Uint32Array(3 * (partCount + looseCount));
  let [partAt, looseAt] = [0, 3 * partCount];
  walk((a, b, c) => {
    const at = isLoose(a, b, c) ? (looseAt += 3) - 3 : (partAt += 3) - 3;
    index[at] = numbers[a]! - 1;
    index[at + 1] = numbers[face === 'front' ? b : c]! - 1;
    index[at + 2] = numbers[face === 'front' ? c : b]! - 1;
  });

  const positions = new Float32Array(3 * corners);
  const by = new Uint8Array(corners);
  const owners = face === 'front' ? part.front.by : part.back.by;
  for (let at = 0; at < numbers.length; at++) {
    if (numbers[at] === 0) continue;
    const k = numbers[at]! - 1;
    const [i, j] = [(at % side) - RING, Math.floor(at / side) - RING];
    positions[3 * k] = sampleX(grid, i);
    positions[3 * k + 1] = sampleY(grid, j);
    positions[3 * k + 2] = height[at]!;
    if (i >= 0 && j >= 0 && i < grid.columns && j < grid.rows) by[k] = owners[j * grid.columns + i]!;
  }
  return { positions, by, index, looseFrom: 3 * partCount };
}

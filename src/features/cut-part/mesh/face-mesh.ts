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

/** Room about the samples for the board's own edges, and the mark of it: there is no layer of this number. */
const RING = 1;
const OUTSIDE = 255;

/** A raster that also knows which layer cut where. */
interface OwnedRaster extends Raster {
  readonly by: Uint8Array;
}

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
function makeRaster({ grid, thickness, front, back, standing }: CutPart, face: Face): OwnedRaster {
  const side = rasterSide(grid.columns, grid.rows);
  const height = new Float32Array(side * side).fill(-thickness);
  const kind = new Uint16Array(side * side);
  const owners = face === 'front' ? front.by : back.by;
  const by = new Uint8Array(side * side).fill(OUTSIDE);
  for (let j = 0; j < grid.rows; j++) {
    for (let i = 0; i < grid.columns; i++) {
      const at = j * grid.columns + i;
      const to = (j + RING) * side + i + RING;
      const under = thickness - back.depth[at]!;
      height[to] = face === 'back' ? -under : -Math.min(front.depth[at]!, under);
      by[to] = owners[at]!;
      if (standing[at] !== GONE) kind[to] = standing[at]! * 256 + owners[at]!;
    }
  }
  return { side, height, kind, by };
}

/** Corners and triangles as they are found, in arrays of the right size. */
class MeshBuilder {
  readonly positions: Float32Array;
  readonly by: Uint8Array;
  readonly index: Uint32Array;
  private corners = 0;

  constructor(corners: number, triangles: number) {
    this.positions = new Float32Array(3 * corners);
    this.by = new Uint8Array(corners);
    this.index = new Uint32Array(3 * triangles);
  }

  corner(x: number, y: number, z: number, by: number): number {
    const at = this.corners++;
    this.positions[3 * at] = x;
    this.positions[3 * at + 1] = y;
    this.positions[3 * at + 2] = z;
    this.by[at] = by;
    return at;
  }
}

/**
 * The surface of a cut board seen from `face`, flat stretches merged as far as `tolerance` allows; see right-triangles.ts.
 * A triangle is of one colour: one between surfaces of several layers has corners of its own, which belong to the layer
 * that cut its deepest corner, or to none at the edge of the board or region.
 */
export function faceMesh(part: CutPart, face: Face, tolerance: number): FaceMesh {
  const { grid } = part;
  const { side, height, kind, by } = makeRaster(part, face);
  const walk = rightTriangles({ side, height, kind }, tolerance);
  const isLoose = (a: number, b: number, c: number) =>
    kind[a]! >> 8 === LOOSE || kind[b]! >> 8 === LOOSE || kind[c]! >> 8 === LOOSE;
  const isEven = (a: number, b: number, c: number) => by[a] === by[b] && by[a] === by[c];
  const isOutside = (at: number) => by[at] === OUTSIDE;
  const deepest = (a: number, b: number): number => (height[a]! < height[b]! === (face === 'front') ? a : b);
  const layerOf = (a: number, b: number, c: number): number =>
    isOutside(a) || isOutside(b) || isOutside(c) ? 0 : by[deepest(deepest(a, b), c)]!;

  const numbers = new Int32Array(side * side);
  let corners = 0;
  let [partCount, looseCount] = [0, 0];
  walk((a, b, c) => {
    if (isLoose(a, b, c)) looseCount++;
    else partCount++;
    if (!isEven(a, b, c)) corners += 3;
    else for (const at of [a, b, c]) if (numbers[at] === 0) numbers[at] = ++corners;
  });

  const mesh = new MeshBuilder(corners, partCount + looseCount);
  const place = (at: number, layer: number) =>
    mesh.corner(sampleX(grid, (at % side) - RING), sampleY(grid, Math.floor(at / side) - RING), height[at]!, layer);
  const shared = numbers.fill(-1);
  const share = (at: number): number => (shared[at] === -1 ? (shared[at] = place(at, by[at]!)) : shared[at]!);
  let [partAt, looseAt] = [0, 3 * partCount];
  walk((a, b, c) => {
    const at = isLoose(a, b, c) ? (looseAt += 3) - 3 : (partAt += 3) - 3;
    const layer = isEven(a, b, c) ? -1 : layerOf(a, b, c);
    const [p, q, r] = layer < 0 ? [share(a), share(b), share(c)] : [place(a, layer), place(b, layer), place(c, layer)];
    mesh.index[at] = p;
    mesh.index[at + 1] = face === 'front' ? q : r;
    mesh.index[at + 2] = face === 'front' ? r : q;
  });
  return { positions: mesh.positions, by: mesh.by, index: mesh.index, looseFrom: 3 * partCount };
}

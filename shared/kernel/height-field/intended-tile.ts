import { sampleX, sampleY, type Grid } from './grid.ts';
import type { IntendedFeature } from './intended-features.ts';

/** Side of a tile, in samples. */
export const TILE = 32;

/** A square of samples: columns from `left` to `right`, rows from `bottom` to `top`, the ends not among them. */
export interface Tile {
  readonly left: number;
  readonly right: number;
  readonly bottom: number;
  readonly top: number;
}

/** Intended depths of a tile's samples and which feature is the deepest there, row by row, TILE to a row; -1 for none. */
export interface TileDepths {
  readonly depth: Float64Array;
  readonly of: Int16Array;
}

export const makeTileDepths = (): TileDepths => ({
  depth: new Float64Array(TILE * TILE),
  of: new Int16Array(TILE * TILE),
});

/** Segments of a feature that may be the nearest to a sample of the tile within the feature's reach. */
function segmentsNear({ distance, reach }: IntendedFeature, grid: Grid, tile: Tile): number[] {
  const [minX, maxX] = [sampleX(grid, tile.left) - reach, sampleX(grid, tile.right - 1) + reach];
  const [minY, maxY] = [sampleY(grid, tile.bottom) - reach, sampleY(grid, tile.top - 1) + reach];
  const near: number[] = [];
  distance.boxes.forEach((box, i) => {
    if (box.minX <= maxX && box.maxX >= minX && box.minY <= maxY && box.maxY >= minY) near.push(i);
  });
  return near;
}

function raise(out: TileDepths, at: number, depth: number, feature: number): void {
  if (depth <= out.depth[at]!) return;
  out.depth[at] = depth;
  out.of[at] = feature;
}

function fillEvenly(out: TileDepths, depth: number, feature: number): void {
  if (depth > 0) for (let at = 0; at < TILE * TILE; at++) raise(out, at, depth, feature);
}

const isInside = (crossings: readonly number[], x: number): boolean => {
  let crossed = 0;
  while (crossed < crossings.length && crossings[crossed]! <= x) crossed++;
  return crossed % 2 === 1;
};

/** Works out the intended depths of a tile: at each sample the deepest of all features. */
export function fillTile(out: TileDepths, features: readonly IntendedFeature[], grid: Grid, tile: Tile): void {
  out.depth.fill(0);
  out.of.fill(-1);
  features.forEach((feature, number) => {
    const { section, distance, inside, reach } = feature;
    const deepIn = section.depthAt(-Infinity);
    const farOut = section.depthAt(Infinity);
    const near = segmentsNear(feature, grid, tile);
    if (near.length === 0) {
      const lies = isInside(inside.crossings(sampleY(grid, tile.bottom)), sampleX(grid, tile.left));
      return fillEvenly(out, lies ? deepIn : farOut, number);
    }
    for (let j = tile.bottom; j < tile.top; j++) {
      const y = sampleY(grid, j);
      const crossings = inside.crossings(y);
      for (let i = tile.left; i < tile.right; i++) {
        const x = sampleX(grid, i);
        const s = distance.at({ x, y }, near, reach);
        const depth = s === undefined ? (isInside(crossings, x) ? deepIn : farOut) : section.depthAt(s);
        raise(out, (j - tile.bottom) * TILE + i - tile.left, depth, number);
      }
    }
  });
}

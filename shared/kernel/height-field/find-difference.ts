import type { FeatureId } from '../frame/members.ts';
import type { Face } from '../line-sets/line-set.ts';
import { PROOF } from '../tolerances.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import { PART, type CutPart } from './cut-part.ts';
import { sampleX, sampleY } from './grid.ts';
import { intendedFeatures, type IntendedFeature } from './intended-features.ts';
import { fillTile, makeTileDepths, TILE, type Tile } from './intended-tile.ts';

/** A place where the cut face is not as it is meant to be; frame view, depths below the face in question. */
export interface Difference {
  readonly face: Face;
  /** 'left': board stands where none is meant to be. 'cut': board is gone that was meant to stay. */
  readonly kind: 'left' | 'cut';
  /** How far the cut surface is from the intended one: the lesser of straight down and sideways. */
  readonly off: number;
  readonly x: number;
  readonly y: number;
  /** Depth of the cut, and the depth meant; the thickness where nothing is left. */
  readonly depth: number;
  readonly intended: number;
  /** The opening, dado or perimeter in question. */
  readonly of: FeatureId | null;
}

/** The largest of each kind; null where there is none beyond what the decimals of a file round away. */
export interface LargestDifference {
  readonly left: Difference | null;
  readonly cut: Difference | null;
}

/** Sideways distance from a place to where a feature's surface is meant to pass depth z; Infinity when it does not. */
function sideways({ section, distance }: IntendedFeature, x: number, y: number, z: number): number {
  const s = distance.at({ x, y })!;
  return section.wallsAt(z).reduce((least, wall) => Math.min(least, Math.abs(s - wall)), Infinity);
}

/**
 * Board left standing at a place must go by every feature that is meant to be deeper there: the furthest of their walls
 * counts. Board cut away is missed by none of them: the nearest counts.
 */
function offBy(features: readonly IntendedFeature[], x: number, y: number, depth: number, intended: number): number {
  const isLeft = depth < intended;
  let aside = isLeft ? 0 : Infinity;
  for (const feature of features) {
    if (!isLeft) aside = Math.min(aside, sideways(feature, x, y, depth));
    else if (feature.section.depthAt(feature.distance.at({ x, y })!) > depth)
      aside = Math.max(aside, sideways(feature, x, y, depth));
  }
  return Math.min(Math.abs(intended - depth), aside);
}

/**
 * Holds one face of a cut part against what is meant: at every sample the depth cut (pieces that have come free are gone)
 * and the depth that the particulars ask for. It says how far the cut surface lies from the intended one, as the lesser of
 * two ways to get there: straight down, and sideways to where the intended surface has the depth that was cut. Both are
 * worked out exactly at the samples, so that upright walls count as what they are off sideways, not as the board's whole
 * thickness. Never less than the true distance; at most √2 of it where the intended surface is plane. Where several dados
 * overlap, what is left in their common corner may be told smaller than it is. Between samples it may be larger by what
 * the surface changes within half a cell's diagonal. The back is not looked at where an opening or the outside is meant to be.
 *
 * Yields the share done after each row of tiles; it tells the largest of what is left and of what is cut too much.
 */
export function* findDifference(
  worked: DrawnFrame,
  part: CutPart,
  face: Face,
): Generator<number, LargestDifference, void> {
  const { grid, thickness, standing } = part;
  const { depth: depths } = part[face];
  const features = intendedFeatures(worked, face);
  const through = face === 'back' ? intendedFeatures(worked, 'front') : null;
  const meant = makeTileDepths();
  const gone = makeTileDepths();
  const largest: { left: Difference | null; cut: Difference | null } = { left: null, cut: null };

  const look = (i: number, j: number, at: number): void => {
    const index = j * grid.columns + i;
    const isPart = standing[index] === PART;
    if (through && (!isPart || gone.depth[at]! >= thickness)) return;
    const depth = isPart ? depths[index]! : thickness;
    const intended = meant.depth[at]!;
    const kind = depth < intended ? 'left' : 'cut';
    const most = largest[kind]?.off ?? PROOF;
    if (Math.abs(depth - intended) <= most) return;
    const [x, y] = [sampleX(grid, i), sampleY(grid, j)];
    const off = offBy(features, x, y, depth, intended);
    if (off > most) largest[kind] = { face, kind, off, x, y, depth, intended, of: features[meant.of[at]!]?.id ?? null };
  };

  for (let bottom = 0; bottom < grid.rows; bottom += TILE) {
    const top = Math.min(grid.rows, bottom + TILE);
    for (let left = 0; left < grid.columns; left += TILE) {
      const tile: Tile = { left, right: Math.min(grid.columns, left + TILE), bottom, top };
      fillTile(meant, features, grid, tile);
      if (through) fillTile(gone, through, grid, tile);
      for (let j = bottom; j < top; j++)
        for (let i = left; i < tile.right; i++) look(i, j, (j - bottom) * TILE + i - left);
    }
    yield top / grid.rows;
  }
  return largest;
}

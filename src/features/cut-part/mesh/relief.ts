import { PART, type CutPart } from '#shared/kernel/height-field/cut-part.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { Flip } from '#shared/kernel/particulars/particulars.ts';
import type { Rgb } from '../sweeping/picture.ts';

/** Direction of the light, from the upper left above the face that lies up; unit length. */
const LIGHT = [-0.4, 0.5, 0.768] as const;
/** Share of the colour that shows where no light falls. */
const SHADE = 0.45;

/** Pixels of one face, RGBA, top row first; what is gone stays clear. Colours by who cut there, light by the slope. */
export function shadeRelief(
  part: CutPart,
  face: Face,
  flip: Flip,
  palette: readonly Rgb[],
): Uint8ClampedArray<ArrayBuffer> {
  const { grid, standing } = part;
  const { columns, rows, cell } = grid;
  const { depth, by } = part[face];
  const pixels = new Uint8ClampedArray(4 * columns * rows);
  // The back is seen as it lies once the board is turned about the fold.
  const mirrorsX = face === 'back' && flip === 'side-to-side';
  const mirrorsY = face === 'back' && flip === 'end-over-end';
  for (let row = 0; row < rows; row++) {
    const j = mirrorsY ? row : rows - 1 - row;
    for (let column = 0; column < columns; column++) {
      const i = mirrorsX ? columns - 1 - column : column;
      const at = j * columns + i;
      if (standing[at] !== PART) continue;
      const sunk = (di: number, dj: number): number => {
        const [p, q] = [i + di, j + dj];
        return p < 0 || q < 0 || p >= columns || q >= rows ? depth[at]! : depth[q * columns + p]!;
      };
      const right = mirrorsX ? -1 : 1;
      const up = mirrorsY ? -1 : 1;
      const slopeX = (sunk(right, 0) - sunk(-right, 0)) / (2 * cell);
      const slopeY = (sunk(0, up) - sunk(0, -up)) / (2 * cell);
      const facing = (slopeX * LIGHT[0] + slopeY * LIGHT[1] + LIGHT[2]) / Math.hypot(slopeX, slopeY, 1);
      const light = SHADE + (1 - SHADE) * Math.min(1, Math.max(0, facing) / LIGHT[2]);
      const colour = palette[by[at]!] ?? palette[0]!;
      const to = 4 * (row * columns + column);
      for (let channel = 0; channel < 3; channel++) pixels[to + channel] = colour[channel]! * light;
      pixels[to + 3] = 255;
    }
  }
  return pixels;
}

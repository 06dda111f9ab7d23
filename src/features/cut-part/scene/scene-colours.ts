import { Color, SRGBColorSpace } from 'three';
import type { Rgb } from '../work/picture.ts';

/** A colour of the style sheet, as light. */
export const colourOf = ([r, g, b]: Rgb): Color => new Color().setRGB(r / 255, g / 255, b / 255, SRGBColorSpace);

/** Writes the colour of each corner, by the layer that cut there. */
export function colourCorners(out: Float32Array, by: Uint8Array, palette: readonly Rgb[]): void {
  const colours = palette.flatMap((rgb) => colourOf(rgb).toArray());
  for (let i = 0; i < by.length; i++) {
    const from = 3 * by[i]!;
    out[3 * i] = colours[from]!;
    out[3 * i + 1] = colours[from + 1]!;
    out[3 * i + 2] = colours[from + 2]!;
  }
}

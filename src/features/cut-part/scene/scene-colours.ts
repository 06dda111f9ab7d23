import { Color, DataTexture, NearestFilter, SRGBColorSpace } from 'three';
import type { Rgb } from '../sweeping/picture.ts';

/** A layer's number is a byte: 0 for none, then layers from 1. */
const LAYERS = 256;

/** A colour of the style sheet, as light. */
export const colourOf = ([r, g, b]: Rgb): Color => new Color().setRGB(r / 255, g / 255, b / 255, SRGBColorSpace);

/** Colours by the number of a layer, as a picture one row high: corners carry the number, so that other colours cost nothing. */
export function makePalette(): DataTexture {
  const texture = new DataTexture(new Uint8Array(4 * LAYERS), LAYERS, 1);
  texture.colorSpace = SRGBColorSpace;
  texture.magFilter = NearestFilter;
  texture.minFilter = NearestFilter;
  return texture;
}

/** Writes colours into a palette: of no layer first. Numbers without a colour get that one. */
export function paintPalette(texture: DataTexture, colours: readonly Rgb[]): void {
  const data = texture.image.data as Uint8Array;
  for (let i = 0; i < LAYERS; i++) data.set([...(colours[i] ?? colours[0]!), 255], 4 * i);
  texture.needsUpdate = true;
}

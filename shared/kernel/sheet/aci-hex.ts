/** Plain colours of the AutoCAD Color Index, 1 to 9; 7 is white on dark ground and black on paper. */
const PLAIN = ['#FF0000', '#FFFF00', '#00FF00', '#00FFFF', '#0000FF', '#FF00FF', '#000000', '#414141', '#808080'];
const GREYS = ['#333333', '#505050', '#696969', '#828282', '#BEBEBE', '#FFFFFF'];
/** Brightness of the five pairs in each ten. */
const BRIGHTNESS = [255, 189, 129, 104, 79];

const hex = (value: number) => Math.round(value).toString(16).toUpperCase().padStart(2, '0');

/**
 * How CAD programs show an AutoCAD Color Index on paper: tens from 10 to 240 turn the hue by 15°, pairs within a ten
 * darken, odd numbers are a third as strong. Throws for anything but a whole number from 1 to 255.
 */
export function aciHex(index: number): string {
  if (!Number.isInteger(index) || index < 1 || index > 255)
    throw new RangeError(`colour index: got ${index}, takes 1 to 255`);
  if (index < 10) return PLAIN[index - 1]!;
  if (index >= 250) return GREYS[index - 250]!;
  const hue = (Math.floor(index / 10) - 1) * 15;
  const value = BRIGHTNESS[Math.floor((index % 10) / 2)]!;
  const low = index % 2 === 1 ? (value * 2) / 3 : 0;
  const sector = Math.floor(hue / 60);
  const part = (hue % 60) / 60;
  const rising = low + (value - low) * part;
  const falling = value - (value - low) * part;
  const [r, g, b] = [
    [value, rising, low],
    [falling, value, low],
    [low, value, rising],
    [low, falling, value],
    [rising, low, value],
    [value, low, falling],
  ][sector] as [number, number, number];
  return `#${hex(r)}${hex(g)}${hex(b)}`;
}

import type { Particulars } from '../particulars/particulars.ts';
import type { EdgePreset } from './edge-preset.ts';

/**
 * A frame with another edge around its openings, and the cutters for it. Openings that keep a square edge of their own
 * keep it. Throws when the preset is in another unit than the frame: lengths are never converted on the quiet.
 */
export function applyEdgePreset(particulars: Particulars, { unit, edge, cutters }: EdgePreset): Particulars {
  if (unit !== particulars.unit)
    throw new RangeError(`edge preset: got one in ${unit}, takes one in ${particulars.unit}`);
  return { ...particulars, edge, cutters: { ...particulars.cutters, ...cutters } };
}

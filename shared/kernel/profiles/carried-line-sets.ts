import type { Face, LineSet } from '../line-sets/line-set.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import type { FileProfile } from './file-profile.ts';

/** Line sets of one face that a profile's file holds, in cutting order: those with lines, less the opening layer it does not want. */
export function carriedLineSets(worked: DrawnFrame, face: Face, profile: FileProfile): readonly LineSet[] {
  return worked[face].lineSets.filter(({ set, shapes }) => {
    if (shapes.length === 0) return false;
    if (set === 'OPENING') return profile.openingLines !== 'axis';
    if (set === 'OPENING_AXIS') return profile.openingLines !== 'entered';
    return true;
  });
}

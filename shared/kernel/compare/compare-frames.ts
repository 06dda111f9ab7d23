import type { DrawnFrame } from '../worked-frame.ts';
import { compareDados, compareMembers, compareOpenings, comparePerimeters } from './compare-features.ts';
import { comparedState } from './compared-state.ts';
import { compareSettings } from './compare-settings.ts';
import type { Comparison } from './comparison.ts';
import { listSettings } from './list-settings.ts';
import { sameLength } from './compare-tolerances.ts';

/**
 * Two states of a frame, held against each other by their geometry: what moved and by how much, what came, what went, and
 * the settings that differ. Lengths are compared and told in the newer state's unit; another unit alone changes nothing.
 */
export function compareFrames(before: DrawnFrame, after: DrawnFrame): Comparison {
  const { unit } = after.particulars;
  const within = sameLength(unit);
  const [was, is] = [comparedState(before, unit), comparedState(after, unit)];
  return {
    unit,
    unitWas: before.particulars.unit === unit ? null : before.particulars.unit,
    before: was,
    after: is,
    features: [
      ...comparePerimeters(was, is, within),
      ...compareOpenings(was, is, within),
      ...compareDados(was, is, within),
      ...compareMembers(was, is, within),
    ],
    settings: compareSettings(listSettings(before, unit), listSettings(after, unit), within),
  };
}

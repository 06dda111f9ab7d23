import type { Unit } from './unit.ts';

/** Significant digits that a float holds whatever the number: rounding to them takes out what the conversion's own arithmetic added. */
const SURE_DIGITS = 15;

/**
 * Converts a length; the same unit gives the very same number back. An inch is 25.4 mm exactly (MM_PER_INCH), so a length
 * that is a short decimal in the other unit comes out as just that: 30.5 in is 774.7 mm, 44.45 mm is 1.75 in.
 */
export function convertLength(value: number, from: Unit, to: Unit): number {
  if (from === to) return value;
  return Number((from === 'in' ? (value * 254) / 10 : (value * 10) / 254).toPrecision(SURE_DIGITS));
}

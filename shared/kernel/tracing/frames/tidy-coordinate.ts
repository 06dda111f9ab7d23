import { TIDY, TIDY_DIGITS } from './frames-tolerances.ts';

/** A coordinate as it was meant: a number of six decimals when that is next to it, else as it is. Never −0. */
export function tidyCoordinate(value: number): number {
  const round = Number(value.toFixed(TIDY_DIGITS)) + 0;
  return Math.abs(round - value) <= TIDY ? round : value;
}

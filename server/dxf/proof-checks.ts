import type { ProofCheck } from '#shared/kernel/sheet/proof.ts';

/** A check of words or numbers that must be the same. */
export const sameCheck = (name: string, got: string, wanted: string): ProofCheck => ({
  name,
  ok: got === wanted,
  got,
  wanted,
});

/** A check of lists whose members must be the same, one by one; says how many are not. */
export function otherwiseCheck(name: string, got: readonly string[], wanted: readonly string[]): ProofCheck {
  const count = Math.max(got.length, wanted.length);
  const otherwise = Array.from({ length: count }, (_, i) => got[i] !== wanted[i]).filter(Boolean).length;
  return {
    name,
    ok: otherwise === 0,
    got: `${otherwise} of ${count} otherwise`,
    wanted: `0 of ${wanted.length} otherwise`,
  };
}

/** A number of a check, short enough to read on the sheet. */
const shortNumber = (value: number): string =>
  Number.isFinite(value) ? String(Number(value.toPrecision(3))) : String(value);

/** A check of differences: the largest may not pass `most`. Something that is not a number, or could not be compared, fails. */
export function withinCheck(name: string, differences: Iterable<number>, most: number): ProofCheck {
  let largest = 0;
  let count = 0;
  for (const difference of differences) {
    count++;
    // Written so that NaN stays.
    if (!(Math.abs(difference) <= largest)) largest = Math.abs(difference);
    if (Number.isNaN(largest)) break;
  }
  return {
    name,
    ok: largest <= most,
    got: `${count} compared, largest difference ${shortNumber(largest)}`,
    wanted: `at most ${shortNumber(most)}`,
  };
}

import { SAME } from '../tolerances.ts';

/** Tip depths of the passes to `depth`: full steps of `maxPass`, then the rest. One pass when maxPass is absent; none for depth 0. */
export function passDepths(depth: number, maxPass: number | undefined): number[] {
  if (depth <= 0) return [];
  if (maxPass === undefined) return [depth];
  if (!(maxPass > 0)) throw new RangeError(`max pass: got ${maxPass}, takes a length above 0`);
  const full = Math.ceil(depth / maxPass - SAME) - 1;
  return [...Array.from({ length: Math.max(0, full) }, (_, i) => (i + 1) * maxPass), depth];
}

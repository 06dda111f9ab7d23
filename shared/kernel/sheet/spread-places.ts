/**
 * Moves places along a line apart until neighbours are at least `pitch` from each other, each as little as can be
 * (least squares, by pooling neighbours that push each other), order kept, all within `low` … `high`.
 * `wanted` must rise. Returns undefined when the line is too short for them; [] for none.
 */
export function spreadPlaces(
  wanted: readonly number[],
  pitch: number,
  low: number,
  high: number,
): number[] | undefined {
  if (wanted.length === 0) return [];
  if ((wanted.length - 1) * pitch > high - low) return undefined;
  // Taking i·pitch off each place turns "apart by pitch" into "not falling": a pooled running mean solves it.
  const pools: { sum: number; count: number }[] = [];
  wanted.forEach((place, i) => {
    pools.push({ sum: place - i * pitch, count: 1 });
    while (pools.length > 1) {
      const last = pools[pools.length - 1]!;
      const before = pools[pools.length - 2]!;
      if (before.sum / before.count <= last.sum / last.count) break;
      pools.splice(-2, 2, { sum: before.sum + last.sum, count: before.count + last.count });
    }
  });
  const highest = high - (wanted.length - 1) * pitch;
  return pools
    .flatMap((pool) =>
      Array.from({ length: pool.count }, () => Math.min(highest, Math.max(low, pool.sum / pool.count))),
    )
    .map((place, i) => place + i * pitch);
}

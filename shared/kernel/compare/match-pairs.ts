import type { Extents } from '../contour/contour.ts';

/** How much two extents overlap, as a share of what they cover together: 0 apart, 1 the same. */
export function overlapShare(a: Extents, b: Extents): number {
  const x = Math.min(a.maxX, b.maxX) - Math.max(a.minX, b.minX);
  const y = Math.min(a.maxY, b.maxY) - Math.max(a.minY, b.minY);
  if (x <= 0 || y <= 0) return 0;
  const area = (e: Extents) => (e.maxX - e.minX) * (e.maxY - e.minY);
  return (x * y) / (area(a) + area(b) - x * y);
}

export interface Matched<T> {
  readonly pairs: readonly (readonly [T, T])[];
  readonly gone: readonly T[];
  readonly came: readonly T[];
}

/**
 * Pairs things of two states, best first. Each rule of `rules` gives a pair's worth, undefined where it is none; the rules
 * take turns over what is left. Equal worth goes by place in the lists, so that both directions make the same pairs.
 */
export function matchPairs<T>(
  before: readonly T[],
  after: readonly T[],
  rules: readonly ((a: T, b: T) => number | undefined)[],
): Matched<T> {
  const pairOf = new Map<number, number>();
  const taken = new Set<number>();
  for (const rule of rules) {
    const found: { i: number; j: number; worth: number }[] = [];
    before.forEach((a, i) => {
      if (pairOf.has(i)) return;
      after.forEach((b, j) => {
        const worth = taken.has(j) ? undefined : rule(a, b);
        if (worth !== undefined) found.push({ i, j, worth });
      });
    });
    found.sort((p, q) => q.worth - p.worth || p.i + p.j - q.i - q.j || Math.abs(p.i - p.j) - Math.abs(q.i - q.j));
    for (const { i, j } of found) {
      if (pairOf.has(i) || taken.has(j)) continue;
      pairOf.set(i, j);
      taken.add(j);
    }
  }
  return {
    pairs: [...pairOf].sort(([, j], [, l]) => j - l).map(([i, j]) => [before[i]!, after[j]!] as const),
    gone: before.filter((_, i) => !pairOf.has(i)),
    came: after.filter((_, j) => !taken.has(j)),
  };
}

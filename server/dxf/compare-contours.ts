import type { Vertex } from '#shared/kernel/contour/contour.ts';

type Loop = readonly Vertex[];

/** Largest difference of two closed loops when the second starts at its vertex `from`. */
function differenceFrom(a: Loop, b: Loop, from: number): number {
  let largest = 0;
  for (const [i, p] of a.entries()) {
    const q = b[(i + from) % b.length]!;
    largest = Math.max(largest, Math.abs(p.x - q.x), Math.abs(p.y - q.y), Math.abs(p.bulge - q.bulge));
  }
  return largest;
}

/** Largest difference of two closed loops, wherever each starts; Infinity when they have not the same number of vertices. */
function differenceOf(a: Loop, b: Loop): number {
  const first = a[0];
  if (first === undefined || a.length !== b.length) return Infinity;
  const distances = b.map((q) => Math.hypot(q.x - first.x, q.y - first.y));
  return differenceFrom(a, b, distances.indexOf(Math.min(...distances)));
}

/** Loops against the wanted ones, in order: largest difference of each pair, Infinity for one too many or too few. */
export function compareContours(got: readonly Loop[], wanted: readonly Loop[]): number[] {
  return Array.from({ length: Math.max(got.length, wanted.length) }, (_, i) =>
    differenceOf(got[i] ?? [], wanted[i] ?? []),
  );
}

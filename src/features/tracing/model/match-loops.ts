import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { contourOfVertices } from '#shared/kernel/tracing/contour-of-vertices.ts';
import type { TracedDrawing } from '#shared/kernel/tracing/traced-drawing.ts';

/** Two loops are the same when no side of their extents is further apart than this share of the larger size: gaps and arcs move lines a little. */
const SAME_SHARE = 0.01;

/** The sides of a loop's extents in the drawing's own coordinates: left, bottom, right, top. */
function sidesOf({ loops, origin: [x, y] }: TracedDrawing, i: number): readonly [number, number, number, number] {
  const { minX, minY, maxX, maxY } = contourExtents(contourOfVertices(loops[i]!.vertices));
  return [minX + x, minY + y, maxX + x, maxY + y];
}

/**
 * For each of these loops of one reading the loop of another reading of the same file that lies where it lay; those without
 * one are left out, and no loop is taken twice.
 */
export function matchLoops(
  from: TracedDrawing,
  wanted: readonly number[],
  to: TracedDrawing,
): ReadonlyMap<number, number> {
  const found = new Map<number, number>();
  if (wanted.length === 0) return found;
  const there = to.loops.map((_, i) => ({ i, sides: sidesOf(to, i) })).sort((a, b) => a.sides[0] - b.sides[0]);
  const taken = new Set<number>();
  for (const i of wanted) {
    const sides = sidesOf(from, i);
    const within = SAME_SHARE * Math.max(sides[2] - sides[0], sides[3] - sides[1]);
    let best: { readonly i: number; readonly apart: number } | undefined;
    for (let at = firstFrom(there, sides[0] - within); at < there.length; at++) {
      const other = there[at]!;
      if (other.sides[0] > sides[0] + within) break;
      const apart = Math.max(...sides.map((side, k) => Math.abs(side - other.sides[k]!)));
      if (apart <= within && !taken.has(other.i) && (best === undefined || apart < best.apart))
        best = { i: other.i, apart };
    }
    if (best === undefined) continue;
    taken.add(best.i);
    found.set(i, best.i);
  }
  return found;
}

/** Place of the first whose left side is not left of `x`, in a list sorted by left sides. */
function firstFrom(sorted: readonly { readonly sides: readonly number[] }[], x: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (sorted[middle]!.sides[0]! < x) low = middle + 1;
    else high = middle;
  }
  return low;
}

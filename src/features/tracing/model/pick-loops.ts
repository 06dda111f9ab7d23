import { containsPoint } from '#shared/kernel/contour/contains-point.ts';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { sizeOf, type DrawnLoop } from './loop-contours.ts';

/** The loops that hold a place, the smallest first. */
export function pickLoops(loops: readonly DrawnLoop[], p: Point): number[] {
  const area = (i: number): number => {
    const { width, height } = sizeOf(loops[i]!.extents);
    return width * height;
  };
  return loops
    .flatMap(({ contour, extents: e }, i) =>
      p.x >= e.minX && p.x <= e.maxX && p.y >= e.minY && p.y <= e.maxY && containsPoint(contour, p) ? [i] : [],
    )
    .sort((a, b) => area(a) - area(b));
}

/** Which of the loops at a place a click means: the smallest, or on another click there the next larger one. */
export function nextPick(held: readonly number[], chosen: ReadonlySet<number>): number | undefined {
  const at = chosen.size === 1 ? held.findIndex((i) => chosen.has(i)) : -1;
  return held[(at + 1) % Math.max(1, held.length)];
}

import type { Contour, Extents, Point } from '../../contour/contour.ts';
import { containsPoint } from '../../contour/contains-point.ts';
import { contourArea } from '../../contour/contour-area.ts';
import { contourExtents } from '../../contour/contour-extents.ts';
import { insidePoint } from './inside-point.ts';

interface Entry {
  readonly index: number;
  readonly contour: Contour;
  readonly box: Extents;
  readonly area: number;
  readonly inside: Point;
}

/**
 * For each closed contour the smallest of the others that holds it, as its place in the list; −1 where there is none. Only those
 * of which `mayHold` says so count as holders. Contours should not cross.
 */
export function findParents(
  contours: readonly Contour[],
  mayHold: (index: number) => boolean = () => true,
): Int32Array {
  const parents = new Int32Array(contours.length).fill(-1);
  const entries = contours
    .map((contour, index): Entry => ({
      index,
      contour,
      box: contourExtents(contour),
      area: Math.abs(contourArea(contour)),
      inside: insidePoint(contour),
    }))
    .sort((p, q) => p.inside.x - q.inside.x);
  const holders = entries.filter(({ index }) => mayHold(index)).sort((p, q) => p.box.minX - q.box.minX);
  // Sweep over X: `open` has those that begin at or before the place and, but for some, have not ended.
  let open: Entry[] = [];
  let room = 64;
  let begun = 0;
  for (const entry of entries) {
    const { x, y } = entry.inside;
    for (; begun < holders.length && holders[begun]!.box.minX <= x; begun++) open.push(holders[begun]!);
    // Those that have ended are swept out only when there are many.
    if (open.length > room) {
      open = open.filter((other) => other.box.maxX >= x);
      room = 2 * open.length + 64;
    }
    let parent: Entry | undefined;
    for (const other of open) {
      if (other.area <= entry.area || (parent && other.area >= parent.area)) continue;
      if (other.box.maxX < x || other.box.minY > y || other.box.maxY < y) continue;
      if (containsPoint(other.contour, entry.inside)) parent = other;
    }
    if (parent) parents[entry.index] = parent.index;
  }
  return parents;
}

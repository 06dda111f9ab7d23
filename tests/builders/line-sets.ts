import type { Contour, Extents, Point, Point3 } from '#shared/kernel/contour/contour.ts';
import type { LineSet, SetName } from '#shared/kernel/line-sets/line-set.ts';
import type { FaceWork } from '#shared/kernel/worked-frame.ts';

/** The line sets of one name on a face; throws when there is none, so that a check cannot pass on nothing. */
export function lineSets(work: FaceWork, set: SetName): LineSet[] {
  const found = work.lineSets.filter((lineSet) => lineSet.set === set);
  if (found.length === 0)
    throw new Error(`no ${set} on the ${work.face}; there are ${work.lineSets.map((s) => s.set).join(', ')}`);
  return found;
}

/** The one line set of a name; throws when there are none or several. */
export function lineSet(work: FaceWork, set: SetName): LineSet {
  const found = lineSets(work, set);
  if (found.length !== 1) throw new Error(`${found.length} line sets ${set} on the ${work.face}`);
  return found[0]!;
}

export const contoursIn = (sets: readonly LineSet[]): Contour[] =>
  sets.flatMap((set) => set.shapes.flatMap((shape) => (shape.kind === 'contour' ? [shape.contour] : [])));

export const climbsIn = (sets: readonly LineSet[]): (readonly Point3[])[] =>
  sets.flatMap((set) => set.shapes.flatMap((shape) => (shape.kind === 'climb' ? [shape.points] : [])));

/** Smallest rectangle around the vertices; true extents only where no arc reaches beyond its ends. */
export function vertexExtents(points: readonly Point[]): Extents {
  const xs = points.map((p) => p.x);
  const ys = points.map((p) => p.y);
  return { minX: Math.min(...xs), minY: Math.min(...ys), maxX: Math.max(...xs), maxY: Math.max(...ys) };
}

import type { Extents } from '../../contour/contour.ts';
import type { Unit } from '../../units/unit.ts';
import { sameRow } from './frames-tolerances.ts';

/** Things in reading order: rows from the top, each from the left. Those whose tops are nearly level with the row's highest are one row. */
export function inReadingOrder<T>(things: readonly T[], extentsOf: (thing: T) => Extents, unit: Unit): T[] {
  const left = things
    .map((thing) => ({ thing, box: extentsOf(thing) }))
    .sort((p, q) => q.box.maxY - p.box.maxY || p.box.minX - q.box.minX);
  const rows: (typeof left)[] = [];
  for (const entry of left) {
    const row = rows.at(-1);
    if (row && row[0]!.box.maxY - entry.box.maxY <= sameRow(unit)) row.push(entry);
    else rows.push([entry]);
  }
  return rows.flatMap((row) => row.sort((p, q) => p.box.minX - q.box.minX).map(({ thing }) => thing));
}

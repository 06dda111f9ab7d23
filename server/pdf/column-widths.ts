import type { SheetTable } from '#shared/kernel/sheet/sheet-model.ts';
import { cellWidth } from './table-measures.ts';

/** A column is never narrower than this many millimetres, or its widest word if that is less. */
const LEAST = 14;

/**
 * Widths in millimetres that add up, with gutters, to `width`: as wide as the longest cell, the widest columns narrowed
 * until all fit, what is left over shared out evenly.
 */
export function columnWidths(table: SheetTable, width: number, gutter: number): number[] {
  const wanted = table.columns.map((column, i) =>
    Math.max(cellWidth({ text: column.heading }), ...table.rows.map((r) => (r[i] ? cellWidth(r[i]) : 0))),
  );
  const free = width - gutter * (wanted.length - 1);
  const total = wanted.reduce((a, b) => a + b, 0);
  if (total <= free) return spareTo(wanted, free - total);
  const cap = levelOff(wanted, free);
  return wanted.map((w) => Math.min(w, cap));
}

/** The width that, as an upper bound for each column, makes them fill `free`. */
function levelOff(wanted: readonly number[], free: number): number {
  const rising = [...wanted].sort((a, b) => a - b);
  let left = free;
  for (const [i, w] of rising.entries()) {
    const share = left / (rising.length - i);
    if (w > share) return Math.max(share, Math.min(LEAST, free / rising.length));
    left -= w;
  }
  return rising[rising.length - 1] ?? free;
}

/** Spreads spare room so that the table spans the page, but not so far that rows are hard to follow. */
function spareTo(wanted: readonly number[], spare: number): number[] {
  const each = Math.min(spare / wanted.length, 9);
  return wanted.map((w) => w + each);
}

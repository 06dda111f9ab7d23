import type { SheetSwatch } from '#shared/kernel/sheet/sheet-model.ts';
import { textWidth } from './pen.ts';

/** Height of a table's words, in millimetres. */
export const TABLE_SIZE = 2.45;
/** A swatch and the space after it. */
export const SWATCH = 5;

/** Width that a cell's words want in one line, in millimetres. */
export const cellWidth = (cell: { readonly text: string; readonly swatch?: SheetSwatch }): number =>
  textWidth(cell.text, TABLE_SIZE) + (cell.swatch ? SWATCH : 0);

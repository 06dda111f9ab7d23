import { SAME } from '#shared/kernel/tolerances.ts';
import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetCell, SheetSwatch, SheetTable } from '#shared/kernel/sheet/sheet-model.ts';
import { wrapText } from '#shared/kernel/sheet/wrap-text.ts';
import { columnWidths } from './column-widths.ts';
import { rule } from './page-frame.ts';
import { drawText, type Pen } from './pen.ts';
import type { Piece } from './piece.ts';
import { SWATCH, TABLE_SIZE } from './table-measures.ts';

const LINE = TABLE_SIZE * 1.25;
const GUTTER = 2.4;

const columnsIn = (width: number) => (width + SAME) / (CHARACTER_WIDTH * TABLE_SIZE);

/** A table's head and rows as pieces, columns as wide as their words need, wrapped where the page is too narrow. */
export function placeTable(table: SheetTable, width: number, padding: number): { head?: Piece; pieces: Piece[] } {
  if (table.rows.length === 0)
    return {
      pieces:
        table.whenEmpty === ''
          ? []
          : [row([{ text: table.whenEmpty }], { widths: [width], aligns: ['left'], padding, heavy: false })],
    };
  const widths = columnWidths(table, width, GUTTER);
  const aligns = table.columns.map((c) => c.align);
  const heading = table.columns.map((c): SheetCell => ({ text: c.heading, colour: 'pencil' }));
  const look = { widths, aligns, padding };
  return {
    head: row(heading, { ...look, heavy: true }),
    pieces: table.rows.map((cells) => row(cells, { ...look, heavy: false })),
  };
}

interface RowLook {
  readonly widths: readonly number[];
  readonly aligns: readonly ('left' | 'right')[];
  readonly padding: number;
  /** Ruled off strongly: a head. */
  readonly heavy: boolean;
}

function row(cells: readonly SheetCell[], { widths, aligns, padding, heavy }: RowLook): Piece {
  const lines = cells.map((cell, i) => wrapText(cell.text, columnsIn(widths[i]! - (cell.swatch ? SWATCH : 0))));
  const height = Math.max(...lines.map((l) => l.length)) * LINE + 2 * padding;
  const total = widths.reduce((a, b) => a + b, 0) + GUTTER * (widths.length - 1);
  const draw = (pen: Pen, x: number, y: number) => {
    let left = x;
    cells.forEach((cell, i) => {
      if (cell.swatch) drawSwatch(pen, cell.swatch, left, y + padding);
      const start = aligns[i] === 'right' ? left + widths[i]! : left + (cell.swatch ? SWATCH : 0);
      lines[i]!.forEach((line, n) =>
        drawText(pen, line, start, y + padding + TABLE_SIZE * 0.95 + n * LINE, {
          size: TABLE_SIZE,
          bold: cell.bold,
          colour: cell.colour ?? 'ink',
          anchor: aligns[i] === 'right' ? 'end' : 'start',
        }),
      );
      left += widths[i]! + GUTTER;
    });
    rule(pen, x, y + height, x + total, y + height, heavy ? 'ink' : 'pencil', heavy ? 'thin' : 'hairline');
  };
  return { height, draw };
}

function drawSwatch({ doc }: Pen, swatch: SheetSwatch, x: number, y: number): void {
  if (swatch.kind === 'layer') {
    doc
      .undash()
      .lineWidth(0.13)
      .rect(x, y, SWATCH - 1.4, TABLE_SIZE)
      .fillAndStroke(swatch.hex, SHEET_COLOURS.ink);
    return;
  }
  if (swatch.dashed) doc.dash(1, { space: 0.6 });
  else doc.undash();
  doc
    .lineWidth(0.7)
    .moveTo(x, y + TABLE_SIZE / 2)
    .lineTo(x + SWATCH - 1.4, y + TABLE_SIZE / 2)
    .stroke(SHEET_COLOURS[swatch.colour]);
  doc.undash();
}

import type { SignOffBox } from '#shared/kernel/sheet/sheet-model.ts';
import { LINE_WEIGHT } from '#shared/kernel/sheet/paper-picture.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import { fitText, LINE_HEIGHT } from './fit-text.ts';
import { rule } from './page-frame.ts';
import { drawText, type Pen } from './pen.ts';
import type { Piece } from './piece.ts';

const HEIGHT = 16;

/** Boxes to sign in, side by side: what was done, name, date. */
export function placeSignOff(boxes: readonly SignOffBox[], width: number): Piece {
  const each = width / boxes.length;
  return {
    height: HEIGHT + 1,
    draw: (pen, x, y) => boxes.forEach((box, i) => drawBox(pen, box, x + i * each, y, each)),
  };
}

function drawBox(pen: Pen, { what, name, date }: SignOffBox, x: number, y: number, width: number): void {
  pen.doc.undash().lineWidth(LINE_WEIGHT.thin).rect(x, y, width, HEIGHT).stroke(SHEET_COLOURS.ink);
  drawText(pen, what, x + 1.5, y + 4, { size: 2.8, bold: true, colour: 'ink' });
  rule(pen, x, y + 5, x + width, y + 5);
  rule(pen, x, y + 10.5, x + width, y + 10.5);
  field(pen, 'Name', name, x, y + 5, width);
  field(pen, 'Date', date, x, y + 10.5, width);
}

function field(pen: Pen, label: string, value: string, x: number, y: number, width: number): void {
  drawText(pen, label, x + 1.5, y + 3.6, { size: 1.9, colour: 'pencil' });
  if (value === '') return;
  const { lines, size } = fitText(value, width - 9, 5.4, [2.6, 2.2, 1.9, 1.6]);
  lines.forEach((line, i) => drawText(pen, line, x + 8, y + 1 + size * (1 + i * LINE_HEIGHT), { size, colour: 'ink' }));
}

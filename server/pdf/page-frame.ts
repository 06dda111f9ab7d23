import { LINE_WEIGHT } from '#shared/kernel/sheet/paper-picture.ts';
import { SHEET_COLOURS, type SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetTitleBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { fitText, LINE_HEIGHT } from './fit-text.ts';
import { PAPER_SIZE, type Paper } from './pdf-document.ts';
import { drawText, type Pen } from './pen.ts';

const OUTER = 6;
const INNER = 8;
const PADDING = 4;
const ROW = 11.5;
export const HEADER = 15;

/** Where blocks may stand on a page, in millimetres. */
export interface PageRoom {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly bottom: number;
}

export function pageRoom(paper: Paper): PageRoom {
  const { width, height } = PAPER_SIZE[paper];
  return {
    left: INNER + PADDING,
    top: INNER + HEADER + 2,
    width: width - 2 * (INNER + PADDING),
    bottom: height - INNER - 2 * ROW - 2,
  };
}

export function rule(
  { doc }: Pen,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  colour: SheetColour = 'ink',
  weight: keyof typeof LINE_WEIGHT = 'hairline',
): void {
  doc.undash().lineWidth(LINE_WEIGHT[weight]).moveTo(x1, y1).lineTo(x2, y2).stroke(SHEET_COLOURS[colour]);
}

/** Double border, heading in the page's colour, and the one sentence under it. */
export function drawPageHead(
  pen: Pen,
  paper: Paper,
  head: { readonly title: string; readonly lead: string; readonly colour: SheetColour },
): void {
  const { width, height } = PAPER_SIZE[paper];
  const { doc } = pen;
  doc
    .undash()
    .lineWidth(LINE_WEIGHT.hairline)
    .rect(OUTER, OUTER, width - 2 * OUTER, height - 2 * OUTER)
    .stroke(SHEET_COLOURS.ink);
  doc
    .lineWidth(LINE_WEIGHT.thick)
    .rect(INNER, INNER, width - 2 * INNER, height - 2 * INNER)
    .stroke(SHEET_COLOURS.ink);
  const left = INNER + PADDING;
  // The right end is kept for the mark of a draft.
  const title = fitText(head.title, width - 2 * left - 48, 6, [5.6, 4.6, 3.8, 3.1, 2.5]);
  drawText(pen, title.lines[0]!, left, INNER + 7.2, { size: title.size, bold: true, colour: head.colour });
  const lead = fitText(head.lead, width - 2 * left, 6, [2.8, 2.5, 2.2, 1.8]);
  lead.lines.forEach((line, i) =>
    drawText(pen, line, left, INNER + 11.8 + i * lead.size * LINE_HEIGHT, { size: lead.size, colour: 'ink' }),
  );
  rule(pen, INNER, INNER + HEADER, width - INNER, INNER + HEADER, head.colour, 'thick');
}

interface Cell {
  readonly label: string;
  readonly value: string;
  readonly share: number;
  readonly bold?: boolean;
  readonly colour?: SheetColour;
  readonly sizes?: readonly number[];
}

/** The least ones are for names as long as a form takes. */
const SIZES = [2.9, 2.6, 2.3, 2, 1.75, 1.5, 1.35];

/** Two rows of fields along the bottom border, after ISO 7200. */
export function drawTitleBlock(
  pen: Pen,
  paper: Paper,
  block: SheetTitleBlock,
  sheet: string,
  colour: SheetColour,
): void {
  const { width, height } = PAPER_SIZE[paper];
  const rows: Cell[][] = [
    [
      { label: 'Legal owner', value: block.legalOwner, share: 54 },
      { label: 'Title', value: block.title, share: 88, bold: true, colour, sizes: [4.2, 3.6, ...SIZES] },
      { label: 'Revision', value: block.revision, share: 27, bold: true, sizes: [4.2, 3.6] },
      { label: 'Sheet', value: sheet, share: 25, bold: true, sizes: [3.6, 3] },
    ],
    [
      { label: 'Identification number', value: block.identification, share: 76 },
      { label: 'Created by', value: block.createdBy, share: 36 },
      { label: 'Approved by', value: block.approvedBy, share: 30 },
      { label: 'Date of issue', value: block.dateOfIssue, share: 27 },
      { label: 'Document type', value: block.documentType, share: 25 },
    ],
  ];
  rows.forEach((cells, r) => {
    const top = height - INNER - ROW * (rows.length - r);
    rule(pen, INNER, top, width - INNER, top, 'ink', r === 0 ? 'thick' : 'hairline');
    const total = cells.reduce((sum, c) => sum + c.share, 0);
    let x = INNER;
    cells.forEach((cell, i) => {
      const cellWidth = ((width - 2 * INNER) * cell.share) / total;
      if (i > 0) rule(pen, x, top, x, top + ROW);
      drawCell(pen, cell, x, top, cellWidth);
      x += cellWidth;
    });
  });
}

function drawCell(pen: Pen, cell: Cell, x: number, top: number, width: number): void {
  drawText(pen, cell.label, x + 1.5, top + 2.6, { size: 1.9, colour: 'pencil' });
  if (cell.value === '') return;
  const { lines, size } = fitText(cell.value, width - 3, ROW - 4, cell.sizes ?? SIZES);
  lines.forEach((line, i) =>
    drawText(pen, line, x + 1.5, top + 3.4 + size * (0.95 + i * LINE_HEIGHT), {
      size,
      bold: cell.bold,
      colour: cell.colour ?? 'ink',
    }),
  );
}

const DRAFT_WORDS = 'draft, not for cutting';

/** Across the whole page, over everything, light enough to read through; and in full strength in the heading. */
export function drawDraftMark(pen: Pen, paper: Paper): void {
  const { width, height } = PAPER_SIZE[paper];
  const { doc } = pen;
  const angle = (-Math.atan2(height, width) * 180) / Math.PI;
  doc
    .save()
    .fillOpacity(0.16)
    .rotate(angle, { origin: [width / 2, height / 2] });
  drawText(pen, DRAFT_WORDS, width / 2, height / 2 + 8, { size: 22, bold: true, anchor: 'middle', colour: 'stop' });
  doc.restore();
  const look = { size: 3.2, bold: true, anchor: 'end', colour: 'stop' } as const;
  drawText(pen, DRAFT_WORDS, width - INNER - PADDING, INNER + 6, look);
}

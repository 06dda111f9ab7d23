import { layOutDrawing, type LaidOutDrawing } from '#shared/kernel/sheet/lay-out-drawing.ts';
import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import { wrapText } from '#shared/kernel/sheet/wrap-text.ts';
import { drawPicture } from './draw-picture.ts';
import { TITLE, TITLE_SIZE } from './flow-blocks.ts';
import { drawText } from './pen.ts';
import type { Piece, PlacedBlock } from './piece.ts';
import { placeList } from './place-list.ts';

export type DrawingBlock = Extract<SheetBlock, { kind: 'drawing' }>;
export type ListBlock = Extract<SheetBlock, { kind: 'list' }>;

/** A drawing takes what the rest of its page leaves, within these heights in millimetres. */
const LEAST = 96;
const MOST = 175;
/** Widths tried for a list beside the drawing, and the space between. */
const COLUMNS = [72, 64, 56, 50, 44];
const BETWEEN = 4;

interface ListLook {
  readonly colour: SheetColour;
  /** Pitch of its lines, as a share of their height. */
  readonly line: number;
}

interface Placed {
  readonly block: PlacedBlock;
  readonly holdsList: boolean;
}

/**
 * A drawing as one piece, `free` being what the other blocks leave of its page. A list that would take `height` below goes
 * beside the drawing when the drawing gets a larger scale by it.
 */
export function placeDrawing(
  { title, drawing }: DrawingBlock,
  below: { readonly list: ListBlock; readonly height: number } | undefined,
  free: { readonly width: number; readonly height: number },
  look: ListLook,
): Placed {
  const heightOf = (spare: number) => Math.min(MOST, Math.max(LEAST, spare));
  const alone = layOutDrawing(drawing, { width: free.width, height: heightOf(free.height) });
  let best: { laid: LaidOutDrawing; list?: Piece } = { laid: alone };
  for (const column of below && free.height + below.height >= LEAST ? COLUMNS : []) {
    const laid = layOutDrawing(drawing, {
      width: free.width - column - BETWEEN,
      height: heightOf(free.height + below!.height),
    });
    const list = listPiece(below!.list, column, look);
    if (laid.denominator < best.laid.denominator && list.height <= laid.picture.height) best = { laid, list };
  }
  const { laid, list } = best;
  const draw: Piece['draw'] = (pen, x, y) => {
    drawPicture(pen, laid.picture, x, y);
    list?.draw(pen, x + laid.picture.width + BETWEEN, y);
  };
  return { block: { title, pieces: [{ height: laid.picture.height, draw }] }, holdsList: list !== undefined };
}

function listPiece({ title, items, ordered }: ListBlock, width: number, { colour, line }: ListLook): Piece {
  const pieces = placeList(items, ordered, width, line);
  const titleLines = wrapText(title, width / (CHARACTER_WIDTH * TITLE_SIZE));
  const pitch = TITLE_SIZE * 1.2;
  const head = TITLE + (titleLines.length - 1) * pitch;
  const draw: Piece['draw'] = (pen, x, y) => {
    titleLines.forEach((words, i) =>
      drawText(pen, words, x, y + 4 + i * pitch, { size: TITLE_SIZE, bold: true, colour }),
    );
    let at = y + head;
    for (const piece of pieces) {
      piece.draw(pen, x, at);
      at += piece.height;
    }
  };
  return { height: head + pieces.reduce((sum, p) => sum + p.height, 0), draw };
}

import { layOutDrawing, type LaidOutDrawing } from '#shared/kernel/sheet/lay-out-drawing.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { drawPicture } from './draw-picture.ts';
import type { Piece, PlacedBlock } from './piece.ts';
import { placeTitledList, type ListBlock, type ListLook } from './place-titled-list.ts';

export type DrawingBlock = Extract<SheetBlock, { kind: 'drawing' }>;

/** A drawing takes what the rest of its page leaves, within these heights in millimetres. */
const LEAST = 96;
const MOST = 175;
/** Widths tried for a list beside the drawing, and the space between. */
const COLUMNS = [72, 64, 56, 50, 44];
const BETWEEN = 4;

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
    const list = placeTitledList(below!.list, column, look);
    if (laid.denominator < best.laid.denominator && list.height <= laid.picture.height) best = { laid, list };
  }
  const { laid, list } = best;
  const draw: Piece['draw'] = (pen, x, y) => {
    drawPicture(pen, laid.picture, x, y);
    list?.draw(pen, x + laid.picture.width + BETWEEN, y);
  };
  return { block: { title, pieces: [{ height: laid.picture.height, draw }] }, holdsList: list !== undefined };
}

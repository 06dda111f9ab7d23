import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { wrapText } from '#shared/kernel/sheet/wrap-text.ts';
import { TITLE, TITLE_SIZE } from './flow-blocks.ts';
import { drawText } from './pen.ts';
import type { Piece } from './piece.ts';
import { placeList } from './place-list.ts';

export type ListBlock = Extract<SheetBlock, { kind: 'list' }>;

export interface ListLook {
  readonly colour: SheetColour;
  /** Pitch of its lines, as a share of their height. */
  readonly line: number;
}

/** A list with its title as one piece, to stand beside something. */
export function placeTitledList(
  { title, items, ordered }: ListBlock,
  width: number,
  { colour, line }: ListLook,
): Piece {
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

import { SAME } from '#shared/kernel/tolerances.ts';
import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { PageRoom } from './page-frame.ts';
import { drawText, type Pen } from './pen.ts';
import type { PlacedBlock } from './piece.ts';

export const TITLE_SIZE = 3;
export const TITLE = 5.6;

export const blockHeight = (block: PlacedBlock, gap: number): number =>
  gap +
  (block.title === '' ? 0 : TITLE) +
  (block.head?.height ?? 0) +
  block.pieces.reduce((sum, p) => sum + p.height, 0);

/**
 * Places blocks one under the other and goes on to a new page where they do not fit: a block begins only where its title,
 * head and first piece fit together, and says its title and head again overleaf. Nothing is clipped: a piece higher than a
 * page stands alone on one. `newPage` begins a page; one is begun before the first block.
 */
export function flowBlocks(
  pen: Pen,
  blocks: readonly PlacedBlock[],
  room: PageRoom,
  { colour, gap }: { readonly colour: SheetColour; readonly gap: number },
  newPage: (first: boolean) => void,
): void {
  newPage(true);
  let y = room.top;
  const over = (height: number) => y > room.top && y + height > room.bottom + SAME;
  const begin = (block: PlacedBlock, again: boolean) => {
    if (block.title !== '') {
      drawText(pen, again ? `${block.title}, continued` : block.title, room.left, y + 4, {
        size: TITLE_SIZE,
        bold: true,
        colour,
      });
      y += TITLE;
    }
    block.head?.draw(pen, room.left, y);
    y += block.head?.height ?? 0;
  };
  for (const block of blocks) {
    const first = (block.title === '' ? 0 : TITLE) + (block.head?.height ?? 0) + (block.pieces[0]?.height ?? 0);
    if (over(gap + first)) {
      newPage(false);
      y = room.top;
    } else if (y > room.top) y += gap;
    begin(block, false);
    for (const piece of block.pieces) {
      if (over(piece.height)) {
        newPage(false);
        y = room.top;
        begin(block, true);
      }
      piece.draw(pen, room.left, y);
      y += piece.height;
    }
  }
}

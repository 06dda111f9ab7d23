import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { blockHeight } from './flow-blocks.ts';
import type { PageRoom } from './page-frame.ts';
import type { Piece, PlacedBlock } from './piece.ts';
import { placeDrawing, type ListBlock } from './place-drawing.ts';
import { placeList } from './place-list.ts';
import { placePictures } from './place-pictures.ts';
import { placeSignOff } from './place-sign-off.ts';
import { EASY, TIGHT, type Spacing } from './spacing.ts';
import { placeTable } from './place-table.ts';

/** Between a table and what is said under it. */
const SPACE: Piece = { height: 0.9, draw: () => undefined };

function placeBlock(
  block: Exclude<SheetBlock, { kind: 'drawing' }>,
  width: number,
  { row, line }: Spacing,
): PlacedBlock {
  const { title } = block;
  switch (block.kind) {
    case 'table': {
      const { head, pieces } = placeTable(block.table, width, row);
      const after = placeList(
        block.after.map((text) => ({ text })),
        false,
        width,
        line,
      );
      return { title, head, pieces: after.length === 0 ? pieces : [...pieces, SPACE, ...after] };
    }
    case 'list':
      return { title, pieces: placeList(block.items, block.ordered, width, line) };
    case 'pictures':
      return { title, pieces: placePictures(block.pictures, width) };
    case 'sign-off':
      return { title, pieces: [placeSignOff(block.boxes, width)] };
  }
}

export const blocksHeight = (blocks: Iterable<PlacedBlock>, gap: number): number =>
  [...blocks].reduce((sum, b) => sum + (b.pieces.length > 0 ? blockHeight(b, gap) : 0), 0);

export interface PlacedPage {
  readonly blocks: readonly PlacedBlock[];
  readonly gap: number;
}

/** A page's blocks as pieces of known height, closer together where that saves a second sheet. Empty ones are left out. */
export function placePage(blocks: readonly SheetBlock[], room: PageRoom, colour: SheetColour): PlacedPage {
  const [easy, tight] = [EASY, TIGHT].map((spacing) => ({
    gap: spacing.gap,
    blocks: placeBlocks(blocks, room, colour, spacing),
  }));
  const fits = (page: PlacedPage) => blocksHeight(page.blocks, page.gap) <= room.bottom - room.top;
  return !fits(easy!) && fits(tight!) ? tight! : easy!;
}

/** The drawing is made as large as the others allow, with a list beside it where that lets it be larger. */
function placeBlocks(
  blocks: readonly SheetBlock[],
  room: PageRoom,
  colour: SheetColour,
  spacing: Spacing,
): PlacedBlock[] {
  const placed = new Map(
    blocks.flatMap((b) => (b.kind === 'drawing' ? [] : [[b, placeBlock(b, room.width, spacing)] as const])),
  );
  const drawing = blocks.find((b) => b.kind === 'drawing');
  if (!drawing) return [...placed.values()].filter((b) => b.pieces.length > 0);
  const list = blocks.find((b): b is ListBlock => b.kind === 'list' && b.beside === true);
  const below = list && { list, height: blockHeight(placed.get(list)!, spacing.gap) };
  const free = room.bottom - room.top - spacing.gap - blocksHeight(placed.values(), spacing.gap);
  const drawn = placeDrawing(drawing, below, { width: room.width, height: free }, { colour, line: spacing.line });
  return blocks
    .filter((b) => !(drawn.holdsList && b === list))
    .map((b) => (b.kind === 'drawing' ? drawn.block : placed.get(b)!))
    .filter((b) => b.pieces.length > 0);
}

import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { blockHeight } from './flow-blocks.ts';
import type { PageRoom } from './page-frame.ts';
import type { Piece, PlacedBlock } from './piece.ts';
import { placeDrawing } from './place-drawing.ts';
import { placeList } from './place-list.ts';
import { placePicturesBeside } from './place-pictures-beside.ts';
import { placePictures } from './place-pictures.ts';
import { placeSignOff } from './place-sign-off.ts';
import { EASY, TIGHT, type Spacing } from './spacing.ts';
import { placeTable } from './place-table.ts';
import type { ListBlock } from './place-titled-list.ts';

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

const blocksHeight = (blocks: Iterable<PlacedBlock>, gap: number): number =>
  [...blocks].reduce((sum, b) => sum + (b.pieces.length > 0 ? blockHeight(b, gap) : 0), 0);

interface PlacedPage {
  readonly blocks: readonly PlacedBlock[];
  readonly gap: number;
}

/** A page's blocks as pieces of known height, closer together where that saves a second sheet. Empty ones are left out. */
export function placePage(blocks: readonly SheetBlock[], room: PageRoom, colour: SheetColour): PlacedPage {
  const place = (spacing: Spacing): PlacedPage => ({
    gap: spacing.gap,
    blocks: placeBlocks(blocks, room, colour, spacing),
  });
  const fits = (page: PlacedPage) => blocksHeight(page.blocks, page.gap) <= room.bottom - room.top;
  const easy = place(EASY);
  if (fits(easy)) return easy;
  const tight = place(TIGHT);
  return fits(tight) ? tight : easy;
}

/**
 * The drawing is made as large as the others allow, with a list beside it where that lets it be larger. On a page without
 * one, the list stands beside the first pictures where there is room.
 */
function placeBlocks(
  blocks: readonly SheetBlock[],
  room: PageRoom,
  colour: SheetColour,
  spacing: Spacing,
): PlacedBlock[] {
  const look = { colour, line: spacing.line };
  const placed = new Map<SheetBlock, PlacedBlock>();
  for (const b of blocks) if (b.kind !== 'drawing') placed.set(b, placeBlock(b, room.width, spacing));
  const list = blocks.find((b): b is ListBlock => b.kind === 'list' && b.beside === true);
  const drawing = blocks.find((b) => b.kind === 'drawing');
  const pictures = blocks.find((b) => b.kind === 'pictures');
  if (drawing) {
    const below = list && { list, height: blockHeight(placed.get(list)!, spacing.gap) };
    const free = room.bottom - room.top - spacing.gap - blocksHeight(placed.values(), spacing.gap);
    const { block, holdsList } = placeDrawing(drawing, below, { width: room.width, height: free }, look);
    placed.set(drawing, block);
    if (holdsList) placed.delete(list!);
  } else if (pictures && list) {
    const both = placePicturesBeside(pictures, list, room.width, look);
    if (both) {
      placed.set(pictures, both);
      placed.delete(list);
    }
  }
  return blocks.flatMap((b) => placed.get(b) ?? []).filter((b) => b.pieces.length > 0);
}

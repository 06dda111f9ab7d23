import type { SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { blockHeight } from './flow-blocks.ts';
import type { PageRoom } from './page-frame.ts';
import type { PlacedBlock } from './piece.ts';
import { placeDrawing, type ListBlock } from './place-drawing.ts';
import { placeList } from './place-list.ts';
import { placePictures } from './place-pictures.ts';
import { placeSignOff } from './place-sign-off.ts';
import { placeTable } from './place-table.ts';

function placeBlock(block: Exclude<SheetBlock, { kind: 'drawing' }>, width: number): PlacedBlock {
  const { title } = block;
  switch (block.kind) {
    case 'table': {
      const { head, pieces } = placeTable(block.table, width);
      return { title, head, pieces: [...pieces, ...placeList(block.after.map((text) => ({ text })), false, width)] };
    }
    case 'list':
      return { title, pieces: placeList(block.items, block.ordered, width) };
    case 'pictures':
      return { title, pieces: placePictures(block.pictures, width) };
    case 'sign-off':
      return { title, pieces: [placeSignOff(block.boxes, width)] };
  }
}

const height = (blocks: Iterable<PlacedBlock>): number => [...blocks].reduce((sum, b) => sum + (b.pieces.length > 0 ? blockHeight(b) : 0), 0);

/**
 * A page's blocks as pieces of known height; empty ones are left out. The drawing is made as large as the others allow,
 * with a list beside it where that lets it be larger.
 */
export function placeBlocks(blocks: readonly SheetBlock[], room: PageRoom, colour: SheetColour): PlacedBlock[] {
  const placed = new Map(blocks.flatMap((b) => (b.kind === 'drawing' ? [] : [[b, placeBlock(b, room.width)] as const])));
  const drawing = blocks.find((b) => b.kind === 'drawing');
  if (!drawing) return [...placed.values()].filter((b) => b.pieces.length > 0);
  const list = blocks.find((b): b is ListBlock => b.kind === 'list' && b.beside === true);
  const free = room.bottom - room.top - height(placed.values());
  const drawn = placeDrawing(drawing, list && { list, height: blockHeight(placed.get(list)!) }, { width: room.width, height: free }, colour);
  return blocks
    .filter((b) => !(drawn.holdsList && b === list))
    .map((b) => (b.kind === 'drawing' ? drawn.block : placed.get(b)!))
    .filter((b) => b.pieces.length > 0);
}

import { layOutDrawing } from '#shared/kernel/sheet/lay-out-drawing.ts';
import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import { drawPicture } from './draw-picture.ts';
import { blockHeight } from './flow-blocks.ts';
import type { PageRoom } from './page-frame.ts';
import type { PlacedBlock } from './piece.ts';
import { placeList } from './place-list.ts';
import { placePictures } from './place-pictures.ts';
import { placeSignOff } from './place-sign-off.ts';
import { placeTable } from './place-table.ts';

/** A drawing takes what the rest of its page leaves, within these heights in millimetres. */
const LEAST_DRAWING = 96;
const MOST_DRAWING = 165;

type Drawing = Extract<SheetBlock, { kind: 'drawing' }>;
type Other = Exclude<SheetBlock, Drawing>;

function placeOther(block: Other, width: number): PlacedBlock {
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

function placeDrawing(block: Drawing, width: number, height: number): PlacedBlock {
  const { picture } = layOutDrawing(block.drawing, { width, height });
  return { title: block.title, pieces: [{ height: picture.height, draw: (pen, x, y) => drawPicture(pen, picture, x, y) }] };
}

/** A page's blocks as pieces of known height; empty ones are left out. Its drawing is made as large as the others allow. */
export function placeBlocks(blocks: readonly SheetBlock[], room: PageRoom): PlacedBlock[] {
  const others = new Map(blocks.flatMap((b) => (b.kind === 'drawing' ? [] : [[b, placeOther(b, room.width)] as const])));
  const taken = [...others.values()].reduce((sum, b) => sum + blockHeight(b), 0);
  const free = Math.min(MOST_DRAWING, Math.max(LEAST_DRAWING, room.bottom - room.top - taken));
  return blocks
    .map((b) => (b.kind === 'drawing' ? placeDrawing(b, room.width, free) : others.get(b)!))
    .filter((b) => b.pieces.length > 0);
}

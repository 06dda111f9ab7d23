import type { SheetBlock } from '#shared/kernel/sheet/sheet-model.ts';
import type { PlacedBlock } from './piece.ts';
import { placePictures } from './place-pictures.ts';
import { placeTitledList, type ListBlock, type ListLook } from './place-titled-list.ts';

/** A list narrower than this is hard to read, in millimetres. */
const LEAST_LIST = 60;
const BETWEEN = 6;

/** Pictures in one row with a list at their right, as one piece; undefined when there is no room for it. */
export function placePicturesBeside(
  { title, pictures }: Extract<SheetBlock, { kind: 'pictures' }>,
  list: ListBlock,
  width: number,
  look: ListLook,
): PlacedBlock | undefined {
  const row = pictures.reduce((sum, p) => sum + p.picture.width, 0);
  const listWidth = width - row - BETWEEN;
  if (listWidth < LEAST_LIST) return undefined;
  const [shown] = placePictures(pictures, row);
  const words = placeTitledList(list, listWidth, look);
  if (!shown || words.height > shown.height) return undefined;
  const draw: typeof shown.draw = (pen, x, y) => {
    shown.draw(pen, x, y);
    words.draw(pen, x + row + BETWEEN, y);
  };
  return { title, pieces: [{ height: shown.height, draw }] };
}

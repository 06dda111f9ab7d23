import { CHARACTER_WIDTH, type PaperPicture } from '#shared/kernel/sheet/paper-picture.ts';
import { wrapText } from '#shared/kernel/sheet/wrap-text.ts';
import { drawPicture } from './draw-picture.ts';
import { drawText } from './pen.ts';
import type { Piece } from './piece.ts';

const CAPTION = 2.3;
const LINE = CAPTION * 1.3;

interface Captioned {
  readonly caption: string;
  readonly picture: PaperPicture;
}

/** Pictures in rows as they fit, each true to its millimetres but for one wider than the page, with its caption below. */
export function placePictures(pictures: readonly Captioned[], width: number): Piece[] {
  const rows: Captioned[][] = [];
  let used = Infinity;
  for (const one of pictures) {
    if (used + one.picture.width > width) {
      rows.push([]);
      used = 0;
    }
    rows[rows.length - 1]!.push(one);
    used += one.picture.width;
  }
  return rows.map((row) => placeRow(row, width, pictures.length === 1));
}

function placeRow(row: readonly Captioned[], width: number, alone: boolean): Piece {
  const scaled = row.map((one) => {
    const scale = Math.min(1, width / one.picture.width);
    const caption =
      one.caption === ''
        ? []
        : wrapText(one.caption, (alone ? width : one.picture.width) / (CHARACTER_WIDTH * CAPTION));
    return { ...one, scale, caption, height: one.picture.height * scale };
  });
  const pictureHeight = Math.max(...scaled.map((s) => s.height));
  const height = pictureHeight + Math.max(...scaled.map((s) => s.caption.length)) * LINE + 1.5;
  const draw: Piece['draw'] = (pen, x, y) => {
    let left = alone ? x + (width - row[0]!.picture.width * scaled[0]!.scale) / 2 : x;
    for (const { picture, scale, caption, height } of scaled) {
      drawPicture(pen, picture, left, y + (pictureHeight - height) / 2, scale);
      caption.forEach((line, i) =>
        drawText(pen, line, alone ? x : left, y + pictureHeight + CAPTION + i * LINE, {
          size: CAPTION,
          colour: 'pencil',
        }),
      );
      left += picture.width * scale;
    }
  };
  return { height, draw };
}

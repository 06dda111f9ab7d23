import type { Placement } from '#shared/kernel/placing/placement.ts';
import { toPage, type PageSize, type View } from '../model/view.ts';
import type { Label } from './labels.ts';
import type { PaintedWords } from './painted.ts';

/** Width of a character of the 11 px type, and a little on either side of the words. */
const CHARACTER_PX = 6.6;
const SPARE_PX = 6;
const LINE_PX = 16;

const COLOURS: Record<Label['colour'], string> = {
  back: 'fill-back',
  front: 'fill-front',
  ink: 'fill-ink',
  pencil: 'fill-pencil',
};

/**
 * Words of a page at a size that does not grow with the board; left out where they would not fit, and with the line set that
 * they belong to.
 */
export function paintWords(
  labels: readonly Label[],
  view: View,
  placement: Placement,
  page: PageSize,
  hiddenSets: ReadonlySet<string>,
): PaintedWords[] {
  return labels.flatMap((label): PaintedWords[] => {
    const length = label.text.length * CHARACTER_PX + SPARE_PX;
    const fits = length <= label.room * view.scale;
    const fitsTurned = !fits && length + LINE_PX <= label.turnedRoom * view.scale;
    if ((!fits && !fitsTurned) || hiddenSets.has(label.hiddenWith)) return [];
    const { x, y } = toPage(view, placement, page, label.at);
    // Turned words stand below what is written above them. Whole pixels keep the type sharp, and unchanged words unchanged.
    const down = fitsTurned ? length / 2 : label.dy;
    return [
      {
        kind: 'words',
        key: label.key,
        text: label.text,
        x: Math.round(x + label.dx),
        y: Math.round(y + down),
        turned: label.turned || fitsTurned,
        look: COLOURS[label.colour],
        ground: label.onBoard ? length : 0,
      },
    ];
  });
}

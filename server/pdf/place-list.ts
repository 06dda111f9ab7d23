import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import type { SheetLine } from '#shared/kernel/sheet/sheet-model.ts';
import { countCharacters, wrapText } from '#shared/kernel/sheet/wrap-text.ts';
import { drawText, textWidth } from './pen.ts';
import type { Piece } from './piece.ts';

export const LIST_SIZE = 2.6;

/** Lines of text, numbered or not, the first word bold; one piece a printed line, so that long lists break anywhere. */
export function placeList(items: readonly SheetLine[], ordered: boolean, width: number, linePitch: number): Piece[] {
  const indent = ordered ? textWidth(`${items.length} `, LIST_SIZE) : 0;
  return items.flatMap((item, i) => {
    const word = item.word ?? '';
    const lines = wrapText(
      word === '' ? item.text : `${word} ${item.text}`,
      (width - indent) / (CHARACTER_WIDTH * LIST_SIZE),
    );
    // A lead word that the line break cuts through is set plain: the break has moved it.
    const leads = word !== '' && lines[0]!.startsWith(word);
    return lines.map((line, n): Piece => {
      const first = n === 0;
      const height = linePitch * LIST_SIZE + (n === lines.length - 1 ? 0.6 : 0);
      const draw: Piece['draw'] = (pen, x, y) => {
        const base = y + LIST_SIZE;
        if (ordered && first) drawText(pen, String(i + 1), x, base, { size: LIST_SIZE, bold: true, colour: 'ink' });
        const bold = first && leads ? word : '';
        if (bold !== '')
          drawText(pen, bold, x + indent, base, { size: LIST_SIZE, bold: true, colour: item.colour ?? 'ink' });
        const rest = Array.from(line).slice(countCharacters(bold)).join('');
        drawText(pen, rest, x + indent + textWidth(bold, LIST_SIZE), base, { size: LIST_SIZE, colour: 'ink' });
      };
      return { height, draw };
    });
  });
}

import type { Unit } from '../units/unit.ts';
import { formatWithUnit } from '../units/format-length.ts';
import { millimetresPerUnit, scaleText } from './drawing-scale.ts';
import type { PaperShape } from './paper-picture.ts';
import { stroke } from './paper-shapes.ts';

const LONGEST = 40;

/** The longest of 1, 2, 5, 10 … units that is at most LONGEST millimetres of paper long. */
function barLength(scale: number): number {
  const decade = 10 ** Math.floor(Math.log10(LONGEST / scale));
  return [5, 2, 1].map((n) => n * decade).find((n) => n * scale <= LONGEST)!;
}

/** The scale in words and a bar to lay a rule on, for paper that a printer may have shrunk. `left`, `top` in millimetres; 5 high. */
export function scaleBar(denominator: number, unit: Unit, left: number, top: number): PaperShape[] {
  const scale = millimetresPerUnit(unit) / denominator;
  const length = barLength(scale);
  const line = { colour: 'ink', weight: 'thin' } as const;
  const words = `Scale ${scaleText(denominator)}`;
  const start = left + words.length * 0.6 * 2.6 + 4;
  const end = start + length * scale;
  const base = top + 3;
  const text = (x: number, content: string, bold: boolean): PaperShape => ({
    kind: 'text',
    text: content,
    x,
    y: base,
    size: 2.6,
    anchor: 'start',
    bold,
    colour: 'ink',
  });
  return [
    text(left, words, true),
    stroke(
      [
        { x: start, y: base - 2 },
        { x: start, y: base },
        { x: end, y: base },
        { x: end, y: base - 2 },
      ],
      line,
    ),
    text(end + 2, formatWithUnit(length, unit), false),
  ];
}

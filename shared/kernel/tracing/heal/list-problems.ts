import { convertLength } from '../../units/convert-length.ts';
import { formatLength } from '../../units/format-length.ts';
import type { Unit } from '../../units/unit.ts';
import type { HealProblem, HealProblemCode } from './healed-drawing.ts';

type Message = (size: string) => string;

const MESSAGES: Record<HealProblemCode, Message> = {
  'gap-closed': (size) => `A gap of ${size} was closed here.`,
  'gap-ambiguous': (size) =>
    `An end here could be joined to more than one other, the nearest ${size} away. It was left open: join it in the drawing.`,
  'crosses-itself': () => 'Two lines cross here without a corner. They were left as they are: cut them in the drawing.',
  'crossings-not-listed': () => 'There are more crossings than are listed. Look for a hatch among the lines.',
  'left-open': (size) => `A line does not close: its ends are ${size} apart.`,
  'loop-too-thin': (size) => `A loop here is only ${size} wide and was left out: two lines lie nearly on one another.`,
};

/** A problem with its sentence. Sizes are said in millimetres whatever the unit, as the gap is. */
export function healProblem(code: HealProblemCode, x: number, y: number, size: number, unit: Unit): HealProblem {
  return {
    code,
    message: MESSAGES[code](`${formatLength(convertLength(size, unit, 'mm'), 'mm')} mm`),
    at: [x, y],
    size,
  };
}

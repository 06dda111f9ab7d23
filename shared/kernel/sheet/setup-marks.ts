import type { Point } from '../contour/contour.ts';
import type { PaperShape } from './paper-picture.ts';
import { arcPath, disc, stroke } from './paper-shapes.ts';
import type { SheetColour } from './sheet-colours.ts';

const PIN_RADIUS = 1.6;
const PIN_LINE = { colour: 'ink', weight: 'thick' } as const;

/** A locating pin that touches the board at a place on paper, from the left or from below. */
export function pinMark(touches: Point, side: 'left' | 'below'): PaperShape[] {
  const centre =
    side === 'left' ? { x: touches.x - PIN_RADIUS, y: touches.y } : { x: touches.x, y: touches.y + PIN_RADIUS };
  return [disc(centre, PIN_RADIUS, { line: PIN_LINE, fill: 'white' }), disc(centre, 0.4, { fill: 'ink' })];
}

/** The zero that places are measured from: a ring with a cross through it. */
export function originMark(at: Point): PaperShape[] {
  const line = { colour: 'ink', weight: 'thin' } as const;
  return [
    disc(at, 1.1, { line }),
    stroke(
      [
        { x: at.x - 2, y: at.y },
        { x: at.x + 2, y: at.y },
      ],
      line,
    ),
    stroke(
      [
        { x: at.x, y: at.y - 2 },
        { x: at.x, y: at.y + 2 },
      ],
      line,
    ),
  ];
}

/** A filled quarter disc in a corner of the board; `inward` points into it, Y up. */
export function cornerMark(
  at: Point,
  inward: { readonly x: 1 | -1; readonly y: 1 | -1 },
  colour: SheetColour,
  radius: number,
): PaperShape {
  const along = { x: at.x + inward.x * radius, y: at.y };
  const up = { x: at.x, y: at.y - inward.y * radius };
  const sweep = inward.x * inward.y > 0 ? 0 : 1;
  return { kind: 'path', d: `${arcPath(along, up, radius, sweep)}L${at.x} ${at.y}Z`, fill: colour };
}

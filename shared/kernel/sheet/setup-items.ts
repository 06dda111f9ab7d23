import type { Extents } from '../contour/contour.ts';
import { joinExtents, contourExtents, pointExtents } from '../contour/contour-extents.ts';
import { rectangle } from '../contour/make-contour.ts';
import type { DrawingLayer } from '../drawing/drawing.ts';
import { lineSetKey, type LineSet } from '../line-sets/line-set.ts';
import type { BlankPlan } from '../placing/blank-plan.ts';
import type { FaceWork } from '../worked-frame.ts';
import { formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import { lineLook } from './line-look.ts';
import type { DrawingItem, PinDimension } from './sheet-drawing.ts';

/** The board as it lies on the pins: two below it, one at its left (3-2-1 locating; where they stand is the machine's). */
export function boardItems(board: Extents): DrawingItem[] {
  const at = (x: number, y: number) => ({
    x: board.minX + x * (board.maxX - board.minX),
    y: board.minY + y * (board.maxY - board.minY),
  });
  return [
    {
      kind: 'contour',
      contour: rectangle(board),
      line: { colour: 'pencil', weight: 'thin' },
      fill: 'board',
      of: ['blank'],
      set: '',
    },
    { kind: 'pin', at: at(0.12, 0), side: 'below' },
    { kind: 'pin', at: at(0.7, 0), side: 'below' },
    { kind: 'pin', at: at(0, 0.3), side: 'left' },
    { kind: 'origin', at: { x: board.minX, y: board.minY } },
  ];
}

/** The lines of the sets that the files hold, but for the blank, which is the board itself. */
export function lineSetItems(work: FaceWork, layers: ReadonlyMap<string, DrawingLayer>): DrawingItem[] {
  return work.lineSets
    .filter((s) => s.set !== 'BLANK' && layers.has(lineSetKey(s)))
    .flatMap((set) => set.shapes.map((shape) => shapeItem(set, shape)));
}

function shapeItem(set: LineSet, shape: LineSet['shapes'][number]): DrawingItem {
  const contour =
    shape.kind === 'contour'
      ? shape.contour
      : { closed: false, vertices: shape.points.map(({ x, y }) => ({ x, y, bulge: 0 })) };
  return { kind: 'contour', contour, line: lineLook(set.set), of: shape.of, set: lineSetKey(set) };
}

/** Around the board and every line on it. */
export const workExtents = (work: FaceWork): Extents =>
  work.lineSets
    .flatMap((s) =>
      s.shapes.map((shape) => (shape.kind === 'contour' ? contourExtents(shape.contour) : pointExtents(shape.points))),
    )
    .reduce((a, b) => joinExtents(a, b), work.board);

/** Where the squaring lines run in the back setup; edges that are not squared are the board's own. */
export function squaredOnBack({ flip, squaredCorner: { x, y }, squared }: BlankPlan): Extents {
  return flip === 'side-to-side'
    ? { minX: x - squared.maxX, maxX: x, minY: y, maxY: y + squared.maxY }
    : { minX: x, maxX: x + squared.maxX, minY: y - squared.maxY, maxY: y };
}

/** A place's dimension from the pins, with the length as people read it. */
export const dimensionAt = (
  at: number,
  from: number,
  unit: Unit,
  rest: Pick<PinDimension, 'colour' | 'of' | 'always'>,
): PinDimension => ({
  at,
  from,
  text: formatLength(at, unit),
  ...rest,
});

/** The board's own size, measured from the pins. */
export const boardDimensions = (board: Extents, unit: Unit) => ({
  across: [dimensionAt(board.minX, board.minY, unit, keep), dimensionAt(board.maxX, board.minY, unit, keep)],
  up: [dimensionAt(board.minY, board.minX, unit, keep), dimensionAt(board.maxY, board.minX, unit, keep)],
});

const keep = { colour: 'pencil', of: ['blank'], always: true } as const;

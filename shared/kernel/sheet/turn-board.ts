import type { Extents } from '../contour/contour.ts';
import { placeExtents } from '../placing/place.ts';
import type { Placement } from '../placing/placement.ts';
import { SAME } from '../tolerances.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { PaperShape } from './paper-picture.ts';
import { box, disc, stroke } from './paper-shapes.ts';
import { squaredOnBack } from './setup-items.ts';
import { cornerMark, originMark, pinMark } from './setup-marks.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';
import { turnedEdges, type EdgeSide } from './turn-edges.ts';

/** A board in the picture: where it stands on paper and how the setup's lengths are laid on it. Not to scale. */
export interface Board {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** How much of the board the strip beyond a squared edge is shown as, for it to be seen at all. */
const STRIP = 4;

interface Look {
  readonly line?: LineLook;
  readonly fill?: SheetColour;
}

const sideMiddle = (b: Board, side: EdgeSide, out: number) =>
  ({
    left: { x: b.x - out, y: b.y + b.height / 2 },
    right: { x: b.x + b.width + out, y: b.y + b.height / 2 },
    top: { x: b.x + b.width / 2, y: b.y - out },
    bottom: { x: b.x + b.width / 2, y: b.y + b.height + out },
  })[side];

/** An edge's letter in a disc, black for an edge that goes to the pins. */
export function letterMark(at: { x: number; y: number }, letter: string, squared: boolean): PaperShape[] {
  return [
    disc(at, 2.6, { fill: squared ? 'ink' : 'white', line: { colour: 'ink', weight: 'thin' } }),
    {
      kind: 'text',
      text: letter,
      x: at.x,
      y: at.y + 1.25,
      size: 3.4,
      anchor: 'middle',
      bold: true,
      colour: squared ? 'white' : 'ink',
    },
  ];
}

/** The line of one side, `inset` within the board, over its whole length. */
function sideLine(b: Board, side: EdgeSide, inset: number, colour: SheetColour): PaperShape {
  const { x, y, width, height } = b;
  const points = {
    left: [
      { x: x + inset, y },
      { x: x + inset, y: y + height },
    ],
    right: [
      { x: x + width - inset, y },
      { x: x + width - inset, y: y + height },
    ],
    top: [
      { x, y: y + inset },
      { x: x + width, y: y + inset },
    ],
    bottom: [
      { x, y: y + height - inset },
      { x: x + width, y: y + height - inset },
    ],
  }[side];
  return stroke(points, { colour, weight: 'heavy' });
}

/** Extents in a setup as a box in the picture. */
function laid(b: Board, board: Extents, e: Extents): [number, number, number, number] {
  // A board that is given too small, a stop, may have no width at all.
  const sx = b.width / Math.max(board.maxX - board.minX, SAME);
  const sy = b.height / Math.max(board.maxY - board.minY, SAME);
  const clip = {
    minX: Math.max(e.minX, board.minX),
    maxX: Math.min(e.maxX, board.maxX),
    minY: Math.max(e.minY, board.minY),
    maxY: Math.min(e.maxY, board.maxY),
  };
  return [
    b.x + (clip.minX - board.minX) * sx,
    b.y + (board.maxY - clip.maxY) * sy,
    Math.max(0, clip.maxX - clip.minX) * sx,
    Math.max(0, clip.maxY - clip.minY) * sy,
  ];
}

export const words = (
  text: string,
  x: number,
  y: number,
  size: number,
  colour: SheetColour,
  bold = false,
): PaperShape => ({
  kind: 'text',
  text,
  x,
  y,
  size,
  anchor: 'middle',
  bold,
  colour,
});

const pins = (b: Board): PaperShape[] => [
  ...pinMark({ x: b.x + 0.14 * b.width, y: b.y + b.height }, 'below'),
  ...pinMark({ x: b.x + 0.74 * b.width, y: b.y + b.height }, 'below'),
  ...pinMark({ x: b.x, y: b.y + 0.74 * b.height }, 'left'),
];

function features(
  worked: WorkedFrame,
  b: Board,
  board: Extents,
  placement: Placement,
  up: 'back' | 'front',
): PaperShape[] {
  const frame = placeExtents(placement, {
    minX: 0,
    minY: 0,
    maxX: worked.contours.width,
    maxY: worked.contours.height,
  });
  const hidden = { colour: 'pencil', weight: 'hairline', dash: 'dashed' } as const;
  const dado: Look =
    up === 'back'
      ? { fill: 'back light', line: { colour: 'back', weight: 'thin' } }
      : { line: { colour: 'back', weight: 'hairline', dash: 'dotted' } };
  const opening: Look =
    up === 'front' ? { fill: 'white', line: { colour: 'front', weight: 'thin' } } : { line: hidden };
  return [
    box(...laid(b, board, frame), { line: hidden, fill: 'board light' }),
    ...worked.contours.openings.map((o) => box(...laid(b, board, placeExtents(placement, o.extents)), opening)),
    ...worked.dados.map((d) => box(...laid(b, board, placeExtents(placement, d.extents)), dado)),
  ];
}

/** The board within its squared edges: strips are drawn wider than they are, so what lies inside has to make room for them. */
function withinStrips(b: Board, squared: readonly EdgeSide[]): Board {
  const strip = (side: EdgeSide) => (squared.includes(side) ? STRIP : 0);
  return {
    x: b.x + strip('left'),
    y: b.y + strip('top'),
    width: b.width - strip('left') - strip('right'),
    height: b.height - strip('top') - strip('bottom'),
  };
}

/** The board with its back up: dados, squared edges, letters, pins. */
export function beforeBoard(worked: WorkedFrame, b: Board): PaperShape[] {
  const { blank, back } = worked;
  const all = worked.particulars.setup.squaring === 'all-edges';
  const squared: readonly EdgeSide[] = all ? ['left', 'top', 'right', 'bottom'] : blank.squaredEdges;
  const sideToSide = blank.flip === 'side-to-side';
  const corner = sideToSide
    ? { x: b.x + b.width - STRIP, y: b.y + b.height - STRIP }
    : { x: b.x + STRIP, y: b.y + STRIP };
  return [
    box(b.x, b.y, b.width, b.height, { fill: 'board', line: { colour: 'pencil', weight: 'thin' } }),
    ...features(worked, withinStrips(b, squared), squaredOnBack(blank), back.placement, 'back'),
    ...squared.map((side) => sideLine(b, side, STRIP, 'back')),
    cornerMark(corner, sideToSide ? { x: -1, y: 1 } : { x: 1, y: -1 }, 'back', 9),
    ...pins(b),
    words('BACK', b.x + b.width / 2, b.y + b.height / 2 + 3, 9, 'back', true),
    ...turnedEdges(blank.flip, blank.squaredEdges).flatMap((e) =>
      letterMark(sideMiddle(b, e.before, 5.5), e.letter, e.squared),
    ),
  ];
}

/** The board with its front up, squared edges on the pins. */
export function afterBoard(worked: WorkedFrame, b: Board): PaperShape[] {
  const { blank, front } = worked;
  return [
    box(b.x, b.y, b.width, b.height, { fill: 'board', line: { colour: 'pencil', weight: 'thin' } }),
    ...features(worked, b, front.board, front.placement, 'front'),
    sideLine(b, 'left', 0, 'back'),
    sideLine(b, 'bottom', 0, 'back'),
    cornerMark({ x: b.x, y: b.y + b.height }, { x: 1, y: 1 }, 'back', 9),
    ...pins(b),
    ...originMark({ x: b.x, y: b.y + b.height }),
    words('FRONT', b.x + b.width / 2, b.y + b.height / 2 + 3, 9, 'front', true),
    ...turnedEdges(blank.flip, blank.squaredEdges).flatMap((e) =>
      letterMark(sideMiddle(b, e.after, 5.5), e.letter, e.squared),
    ),
  ];
}

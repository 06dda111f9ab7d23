import type { Extents } from '../contour/contour.ts';
import { placeExtents } from '../placing/place.ts';
import type { Placement } from '../placing/placement.ts';
import { SAME } from '../tolerances.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { arcPath, arrowHead, box, disc, stroke } from './paper-shapes.ts';
import { squaredOnBack } from './setup-items.ts';
import { cornerMark, originMark, pinMark } from './setup-marks.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { LineLook } from './sheet-drawing.ts';
import { squaredCornerPlaces, turnedEdges, type EdgeSide } from './turn-edges.ts';

/** A board in the picture: where it stands on paper and how the setup's lengths are laid on it. Not to scale. */
interface Board {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** Room around a board for letters and pins; strip between the two boards for the fold. */
const AROUND = 9;
const FOLD = 9;
const HEAD = 16;
/** How much of the board the strip beyond a squared edge is shown as, for it to be seen at all. */
const STRIP = 4;

interface Look {
  readonly line?: LineLook;
  readonly fill?: SheetColour;
}

const limit = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** The board's shape within `room`, neither so long nor so slim that letters would not stand. */
function boardSize(board: Extents, room: { width: number; height: number }): { width: number; height: number } {
  const ratio = limit((board.maxX - board.minX) / Math.max(board.maxY - board.minY, SAME), 0.55, 1.9);
  return ratio > room.width / room.height ? { width: room.width, height: room.width / ratio } : { width: room.height * ratio, height: room.height };
}

const sideMiddle = (b: Board, side: EdgeSide, out: number) =>
  ({
    left: { x: b.x - out, y: b.y + b.height / 2 },
    right: { x: b.x + b.width + out, y: b.y + b.height / 2 },
    top: { x: b.x + b.width / 2, y: b.y - out },
    bottom: { x: b.x + b.width / 2, y: b.y + b.height + out },
  })[side];

export function letterMark(at: { x: number; y: number }, letter: string, squared: boolean): PaperShape[] {
  return [
    disc(at, 2.6, { fill: squared ? 'ink' : 'white', line: { colour: 'ink', weight: 'thin' } }),
    { kind: 'text', text: letter, x: at.x, y: at.y + 1.25, size: 3.4, anchor: 'middle', bold: true, colour: squared ? 'white' : 'ink' },
  ];
}

/** The line of one side, `inset` within the board, over its whole length. */
function sideLine(b: Board, side: EdgeSide, inset: number, colour: SheetColour): PaperShape {
  const { x, y, width, height } = b;
  const points = {
    left: [{ x: x + inset, y }, { x: x + inset, y: y + height }],
    right: [{ x: x + width - inset, y }, { x: x + width - inset, y: y + height }],
    top: [{ x, y: y + inset }, { x: x + width, y: y + inset }],
    bottom: [{ x, y: y + height - inset }, { x: x + width, y: y + height - inset }],
  }[side];
  return stroke(points, { colour, weight: 'heavy' });
}

/** Extents in a setup as a box in the picture. */
function laid(b: Board, board: Extents, e: Extents): [number, number, number, number] {
  const sx = b.width / (board.maxX - board.minX);
  const sy = b.height / (board.maxY - board.minY);
  const clip = { minX: Math.max(e.minX, board.minX), maxX: Math.min(e.maxX, board.maxX), minY: Math.max(e.minY, board.minY), maxY: Math.min(e.maxY, board.maxY) };
  return [b.x + (clip.minX - board.minX) * sx, b.y + (board.maxY - clip.maxY) * sy, Math.max(0, clip.maxX - clip.minX) * sx, Math.max(0, clip.maxY - clip.minY) * sy];
}

const words = (text: string, x: number, y: number, size: number, colour: SheetColour, bold = false): PaperShape => ({ kind: 'text', text, x, y, size, anchor: 'middle', bold, colour });

const pins = (b: Board): PaperShape[] => [
  ...pinMark({ x: b.x + 0.14 * b.width, y: b.y + b.height }, 'below'),
  ...pinMark({ x: b.x + 0.74 * b.width, y: b.y + b.height }, 'below'),
  ...pinMark({ x: b.x, y: b.y + 0.74 * b.height }, 'left'),
];

function features(worked: WorkedFrame, b: Board, board: Extents, placement: Placement, up: 'back' | 'front'): PaperShape[] {
  const frame = placeExtents(placement, { minX: 0, minY: 0, maxX: worked.contours.width, maxY: worked.contours.height });
  const hidden = { colour: 'pencil', weight: 'hairline', dash: 'dashed' } as const;
  const dado: Look = up === 'back' ? { fill: 'back light', line: { colour: 'back', weight: 'thin' } } : { line: { colour: 'back', weight: 'hairline', dash: 'dotted' } };
  const opening: Look = up === 'front' ? { fill: 'white', line: { colour: 'front', weight: 'thin' } } : { line: hidden };
  return [
    box(...laid(b, board, frame), { line: hidden, fill: 'board light' }),
    ...worked.contours.openings.map((o) => box(...laid(b, board, placeExtents(placement, o.extents)), opening)),
    ...worked.dados.map((d) => box(...laid(b, board, placeExtents(placement, d.extents)), dado)),
  ];
}

/** The board within its squared edges: strips are drawn wider than they are, so what lies inside has to make room for them. */
function withinStrips(b: Board, squared: readonly EdgeSide[]): Board {
  const strip = (side: EdgeSide) => (squared.includes(side) ? STRIP : 0);
  return { x: b.x + strip('left'), y: b.y + strip('top'), width: b.width - strip('left') - strip('right'), height: b.height - strip('top') - strip('bottom') };
}

function beforeBoard(worked: WorkedFrame, b: Board): PaperShape[] {
  const { blank, back } = worked;
  const all = worked.particulars.setup.squaring === 'all-edges';
  const squared: readonly EdgeSide[] = all ? ['left', 'top', 'right', 'bottom'] : blank.squaredEdges;
  const sideToSide = blank.flip === 'side-to-side';
  const corner = sideToSide ? { x: b.x + b.width - STRIP, y: b.y + b.height - STRIP } : { x: b.x + STRIP, y: b.y + STRIP };
  return [
    box(b.x, b.y, b.width, b.height, { fill: 'board', line: { colour: 'pencil', weight: 'thin' } }),
    ...features(worked, withinStrips(b, squared), squaredOnBack(blank), back.placement, 'back'),
    ...squared.map((side) => sideLine(b, side, STRIP, 'back')),
    cornerMark(corner, sideToSide ? { x: -1, y: 1 } : { x: 1, y: -1 }, 'back', 9),
    ...pins(b),
    words('BACK', b.x + b.width / 2, b.y + b.height / 2 + 3, 9, 'back', true),
    ...turnedEdges(blank.flip, blank.squaredEdges).flatMap((e) => letterMark(sideMiddle(b, e.before, 5.5), e.letter, e.squared)),
  ];
}

function afterBoard(worked: WorkedFrame, b: Board): PaperShape[] {
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
    ...turnedEdges(blank.flip, blank.squaredEdges).flatMap((e) => letterMark(sideMiddle(b, e.after, 5.5), e.letter, e.squared)),
  ];
}

/** The fold with its word, and an arrow over it from one board to the other. */
function foldAndArrow(before: Board, after: Board, sideToSide: boolean, width: number, height: number): PaperShape[] {
  const fold = { colour: 'ink', weight: 'thin', dash: 'chain' } as const;
  const arrow = { colour: 'ink', weight: 'thick' } as const;
  if (sideToSide) {
    const x = (before.x + before.width + after.x) / 2;
    const from = { x: before.x + before.width * 0.5, y: before.y - 9 };
    const to = { x: after.x + after.width * 0.5, y: after.y - 9 };
    const radius = (to.x - from.x) * 1.1;
    return [
      stroke([{ x, y: before.y - 16 }, { x, y: height }], fold),
      { kind: 'path', d: arcPath(from, to, radius, 1), line: arrow },
      arrowHead(to, 0.48, 5, 'ink'),
      words('fold', x + 5, before.y + before.height * 0.16, 2.8, 'ink'),
    ];
  }
  const y = (before.y + before.height + after.y) / 2;
  const from = { x: before.x + before.width + 9, y: before.y + before.height * 0.5 };
  const to = { x: after.x + after.width + 9, y: after.y + after.height * 0.5 };
  const radius = (to.y - from.y) * 1.1;
  return [
    stroke([{ x: 0, y }, { x: width, y }], fold),
    { kind: 'path', d: arcPath(from, to, radius, 1), line: arrow },
    arrowHead(to, Math.PI / 2 + 0.48, 5, 'ink'),
    words('fold', 4, y - 1.2, 2.8, 'ink'),
  ];
}

/** Both faces as two pages of an open book about the fold, edges lettered, squared edges heavy, the squared corner filled. Not to scale. */
export function turnPicture(worked: WorkedFrame): PaperPicture {
  const sideToSide = worked.blank.flip === 'side-to-side';
  const { before: cornerBefore, after: cornerAfter } = squaredCornerPlaces(worked.blank.flip);
  const description =
    `The board before and after the turn. Back up: the squared corner is ${cornerBefore}. Front up: it is ${cornerAfter}, at the pins. ` +
    turnedEdges(worked.blank.flip, worked.blank.squaredEdges).map((e) => `Edge ${e.letter}: ${e.before}, then ${e.after}.`).join(' ');
  if (sideToSide) {
    const room = { width: 70, height: 60 };
    const size = boardSize(worked.back.board, room);
    const y = HEAD + AROUND;
    const before = { x: AROUND + room.width - size.width, y, ...size };
    const after = { x: AROUND + room.width + 2 * AROUND + FOLD, y, ...size };
    const width = 4 * AROUND + FOLD + 2 * room.width;
    const height = y + size.height + AROUND;
    return { width, height, description, shapes: [...foldAndArrow(before, after, true, width, height), ...beforeBoard(worked, before), ...afterBoard(worked, after)] };
  }
  const room = { width: 62, height: 52 };
  const size = boardSize(worked.back.board, room);
  const width = 104;
  const before = { x: AROUND + (room.width - size.width) / 2, y: AROUND, ...size };
  const after = { ...before, y: before.y + size.height + 2 * AROUND + FOLD };
  const height = after.y + size.height + AROUND;
  return { width, height, description, shapes: [...foldAndArrow(before, after, false, width, height), ...beforeBoard(worked, before), ...afterBoard(worked, after)] };
}

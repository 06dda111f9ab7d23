import type { Extents } from '../contour/contour.ts';
import { SAME } from '../tolerances.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { arcPath, arrowHead, stroke } from './paper-shapes.ts';
import { afterBoard, beforeBoard, words, type Board } from './turn-board.ts';
import { squaredCornerPlaces, turnedEdges } from './turn-edges.ts';

/** Room around a board for letters and pins; strip between the two boards for the fold; room above for the arrow. */
const AROUND = 9;
const FOLD = 9;
const HEAD = 16;

const limit = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** The board's shape within `room`, neither so long nor so slim that letters would not stand. */
function boardSize(board: Extents, room: { width: number; height: number }): { width: number; height: number } {
  const ratio = limit((board.maxX - board.minX) / Math.max(board.maxY - board.minY, SAME), 0.55, 1.9);
  return ratio > room.width / room.height
    ? { width: room.width, height: room.width / ratio }
    : { width: room.height * ratio, height: room.height };
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
      stroke(
        [
          { x, y: before.y - 16 },
          { x, y: height },
        ],
        fold,
      ),
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
    stroke(
      [
        { x: 0, y },
        { x: width, y },
      ],
      fold,
    ),
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
    turnedEdges(worked.blank.flip, worked.blank.squaredEdges)
      .map((e) => `Edge ${e.letter}: ${e.before}, then ${e.after}.`)
      .join(' ');
  if (sideToSide) {
    const room = { width: 70, height: 60 };
    const size = boardSize(worked.back.board, room);
    const y = HEAD + AROUND;
    const before = { x: AROUND + room.width - size.width, y, ...size };
    const after = { x: AROUND + room.width + 2 * AROUND + FOLD, y, ...size };
    const width = 4 * AROUND + FOLD + 2 * room.width;
    const height = y + size.height + AROUND;
    return {
      width,
      height,
      description,
      shapes: [
        ...foldAndArrow(before, after, true, width, height),
        ...beforeBoard(worked, before),
        ...afterBoard(worked, after),
      ],
    };
  }
  const room = { width: 62, height: 52 };
  const size = boardSize(worked.back.board, room);
  const width = 104;
  const before = { x: AROUND + (room.width - size.width) / 2, y: AROUND, ...size };
  const after = { ...before, y: before.y + size.height + 2 * AROUND + FOLD };
  const height = after.y + size.height + AROUND;
  return {
    width,
    height,
    description,
    shapes: [
      ...foldAndArrow(before, after, false, width, height),
      ...beforeBoard(worked, before),
      ...afterBoard(worked, after),
    ],
  };
}

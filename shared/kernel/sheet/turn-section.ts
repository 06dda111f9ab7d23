import type { Flip } from '../particulars/particulars.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { arcPath, arrowHead, linePath, stroke } from './paper-shapes.ts';
import { movingEdge, turnedEdges } from './turn-edges.ts';
import { letterMark } from './turn-picture.ts';

const REACH = 52;
const THICK = 3;
const PIVOT = { x: 80, y: 50 };

/** The board on its way, at an angle from lying flat at the left (0) to lying flat at the right (π), about its pivot edge. */
function boardOnTheWay(angle: number): PaperShape {
  const along = { x: -Math.cos(angle), y: -Math.sin(angle) };
  const across = { x: -along.y * (THICK / 2), y: along.x * (THICK / 2) };
  const corner = (a: number, b: number) => ({ x: PIVOT.x + along.x * a + across.x * b, y: PIVOT.y + along.y * a + across.y * b });
  const d = linePath([corner(4, 1), corner(REACH - 6, 1), corner(REACH - 6, -1), corner(4, -1)], true);
  return { kind: 'path', d, line: { colour: 'pencil', weight: 'hairline', dash: 'dashed' } };
}

/** The turn seen along the fold: which edge is lifted, over which edge it goes, and where it comes down. Not to scale. */
export function turnSection(flip: Flip): PaperPicture {
  const edges = turnedEdges(flip, []);
  const { lifted, pivot } = movingEdge(flip);
  const letter = (side: string) => edges.find((e) => e.before === side)!.letter;
  return { width: 160, height: 60, description: `Edge ${letter(lifted)} is lifted and carried over edge ${letter(pivot)}.`, shapes: sectionShapes(letter(lifted), letter(pivot)) };
}

function sectionShapes(lifted: string, pivot: string): PaperShape[] {
  const arc = REACH - 12;
  const start = { x: PIVOT.x - arc * Math.cos(0.3), y: PIVOT.y - arc * Math.sin(0.3) };
  const end = { x: PIVOT.x + arc * Math.cos(0.3), y: start.y };
  const text = (content: string, x: number, colour: 'back' | 'front'): PaperShape => ({ kind: 'text', text: content, x, y: PIVOT.y - THICK - 2, size: 3, anchor: 'middle', bold: true, colour });
  return [
    stroke([{ x: 6, y: PIVOT.y }, { x: 154, y: PIVOT.y }], { colour: 'ink', weight: 'thick' }),
    ...[Math.PI / 4, Math.PI / 2, (3 * Math.PI) / 4].map((a) => boardOnTheWay(a)),
    boardLying(-1),
    boardLying(1),
    { kind: 'path', d: arcPath(start, end, arc, 1), line: { colour: 'ink', weight: 'thick' } },
    arrowHead(end, Math.PI / 2 - 0.25, 5, 'ink'),
    ...letterMark({ x: PIVOT.x - REACH - 5, y: PIVOT.y - 5 }, lifted, false),
    ...letterMark({ x: PIVOT.x + REACH + 5, y: PIVOT.y - 5 }, lifted, false),
    ...letterMark({ x: PIVOT.x, y: PIVOT.y + 5 }, pivot, false),
    text('back up', PIVOT.x - 26, 'back'),
    text('front up', PIVOT.x + 26, 'front'),
    { kind: 'text', text: 'machine bed', x: 6, y: PIVOT.y + 4, size: 2.4, anchor: 'start', colour: 'pencil' },
  ];
}

/** Flat on the bed, at the left (-1) or at the right (1) of the pivot. */
function boardLying(side: 1 | -1): PaperShape {
  const [near, far] = [PIVOT.x + side, PIVOT.x + side * REACH];
  const [bed, top] = [PIVOT.y, PIVOT.y - THICK];
  const d = linePath([{ x: near, y: bed }, { x: far, y: bed }, { x: far, y: top }, { x: near, y: top }], true);
  return { kind: 'path', d, fill: 'board', line: { colour: 'ink', weight: 'thin' } };
}

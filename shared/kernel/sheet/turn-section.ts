import type { Point } from '../contour/contour.ts';
import type { Flip } from '../particulars/particulars.ts';
import type { PaperPicture, PaperShape } from './paper-picture.ts';
import { arcPath, arrowHead, linePath, stroke } from './paper-shapes.ts';
import { movingEdge, turnedEdges } from './turn-edges.ts';
import { letterMark } from './turn-board.ts';

const THICK = 3;
/** Room beside and below for letters and the machine's bed. */
const BESIDE = 12;
const BELOW = 9;

/** Where the pivot edge stands on paper, and how far the board reaches from it. */
interface Stand {
  readonly pivot: Point;
  readonly reach: number;
}

/** The board on its way, at an angle from lying flat at the left (0) to lying flat at the right (π), about its pivot edge. */
function boardOnTheWay({ pivot, reach }: Stand, angle: number): PaperShape {
  const along = { x: -Math.cos(angle), y: -Math.sin(angle) };
  const across = { x: -along.y * (THICK / 2), y: along.x * (THICK / 2) };
  const corner = (a: number, b: number) => ({
    x: pivot.x + along.x * a + across.x * b,
    y: pivot.y + along.y * a + across.y * b,
  });
  const d = linePath([corner(4, 1), corner(reach - 4, 1), corner(reach - 4, -1), corner(4, -1)], true);
  return { kind: 'path', d, line: { colour: 'pencil', weight: 'hairline', dash: 'dashed' } };
}

/** Flat on the bed, at the left (-1) or at the right (1) of the pivot. */
function boardLying({ pivot, reach }: Stand, side: 1 | -1): PaperShape {
  const [near, far] = [pivot.x + side, pivot.x + side * reach];
  const [bed, top] = [pivot.y, pivot.y - THICK];
  const d = linePath(
    [
      { x: near, y: bed },
      { x: far, y: bed },
      { x: far, y: top },
      { x: near, y: top },
    ],
    true,
  );
  return { kind: 'path', d, fill: 'board', line: { colour: 'ink', weight: 'thin' } };
}

function arrowOver({ pivot, reach }: Stand): PaperShape[] {
  const arc = reach * 0.78;
  const start = { x: pivot.x - arc * Math.cos(0.35), y: pivot.y - arc * Math.sin(0.35) };
  const end = { x: pivot.x + arc * Math.cos(0.35), y: start.y };
  return [
    { kind: 'path', d: arcPath(start, end, arc, 1), line: { colour: 'ink', weight: 'thick' } },
    arrowHead(end, Math.PI / 2 + 0.2, 4.5, 'ink'),
  ];
}

function sectionShapes(stand: Stand, width: number, lifted: string, pivotLetter: string): PaperShape[] {
  const { pivot, reach } = stand;
  const text = (content: string, x: number, colour: 'back' | 'front'): PaperShape => ({
    kind: 'text',
    text: content,
    x,
    y: pivot.y - THICK - 1.6,
    size: 2.6,
    anchor: 'middle',
    bold: true,
    colour,
  });
  return [
    stroke(
      [
        { x: 2, y: pivot.y },
        { x: width - 2, y: pivot.y },
      ],
      { colour: 'ink', weight: 'thick' },
    ),
    ...[Math.PI / 4, Math.PI / 2, (3 * Math.PI) / 4].map((angle) => boardOnTheWay(stand, angle)),
    boardLying(stand, -1),
    boardLying(stand, 1),
    ...arrowOver(stand),
    ...letterMark({ x: pivot.x - reach - 5, y: pivot.y - 4 }, lifted, false),
    ...letterMark({ x: pivot.x + reach + 5, y: pivot.y - 4 }, lifted, false),
    ...letterMark({ x: pivot.x, y: pivot.y + 5 }, pivotLetter, false),
    text('back up', pivot.x - reach * 0.62, 'back'),
    text('front up', pivot.x + reach * 0.62, 'front'),
    { kind: 'text', text: 'machine bed', x: 2, y: pivot.y + 3.6, size: 2.2, anchor: 'start', colour: 'pencil' },
  ];
}

/** The turn seen along the fold: which edge is lifted, over which edge it goes, and where it comes down. `reach` in millimetres; not to scale. */
export function turnSection(flip: Flip, reach: number): PaperPicture {
  const edges = turnedEdges(flip, []);
  const { lifted, pivot } = movingEdge(flip);
  const letter = (side: string) => edges.find((e) => e.before === side)!.letter;
  const width = 2 * (reach + BESIDE);
  const stand = { pivot: { x: width / 2, y: reach + 1 }, reach };
  return {
    width,
    height: stand.pivot.y + BELOW,
    description: `Edge ${letter(lifted)} is lifted and carried over edge ${letter(pivot)}.`,
    shapes: sectionShapes(stand, width, letter(lifted), letter(pivot)),
  };
}

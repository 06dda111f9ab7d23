import type { Contour, Extents } from '../contour/contour.ts';
import { segmentsOf } from '../contour/segments.ts';
import { DistanceBand } from './distance-band.ts';
import type { FaceCut } from './face-cut.ts';
import { findPieces } from './find-pieces.ts';
import { endColumn, endRow, firstColumn, firstRow, gridExtents, sampleX, sampleY, type Grid } from './grid.ts';
import type { HeightField } from './height-field.ts';
import { InsideRows } from './inside-rows.ts';

/** What stands at a sample: nothing, the part, or a piece that has come free of it. */
export const GONE = 0;
export const PART = 1;
export const LOOSE = 2;

/** A board cut from both faces, seen in frame view: the front's field from above and the back's from below, on one grid. */
export interface CutPart {
  readonly grid: Grid;
  readonly thickness: number;
  readonly front: HeightField;
  readonly back: HeightField;
  /** GONE, PART or LOOSE. */
  readonly standing: Uint8Array;
  /** How many pieces have come free. */
  readonly loosePieces: number;
}

/** What is thinner than this share of the board is no board: depths are 32-bit numbers. */
const LEAST_SHARE = 1 / 2 ** 20;

/** The closed lines that a cutter passes outside of, cut or not yet: along their inside runs the part. */
const keptWithin = ({ front, back }: Stage): Contour[] =>
  [...back.layers, ...front.layers].flatMap((l) => (l.side === 'outside' ? l.contours.filter((c) => c.closed) : []));

/** 1 at samples where board is left between both fields and within the board's own edges. */
function boardLeft({ grid, depth: front, thickness }: HeightField, back: Float32Array, board: Extents): Uint8Array {
  const left = new Uint8Array(grid.columns * grid.rows);
  const most = thickness * (1 - LEAST_SHARE);
  const [from, to] = [firstColumn(grid, board.minX), endColumn(grid, board.maxX)];
  for (let j = firstRow(grid, board.minY); j < endRow(grid, board.maxY); j++) {
    const end = j * grid.columns + to;
    for (let at = j * grid.columns + from; at < end; at++) if (front[at]! + back[at]! < most) left[at] = 1;
  }
  return left;
}

/** Writes 1 for each sample of a row that belongs to the part, 0 for the others. */
type MarkRow = (row: number, marks: Uint8Array) => unknown;

/** Counts, for each piece, its samples that are marked. */
function countMarked(pieces: Int32Array, count: number, { columns, rows }: Grid, mark: MarkRow): Float64Array {
  const found = new Float64Array(count + 1);
  const marks = new Uint8Array(columns);
  for (let j = 0; j < rows; j++) {
    mark(j, marks);
    for (let i = 0, at = j * columns; i < columns; i++, at++) found[pieces[at]!]! += marks[i]!;
  }
  return found;
}

/** How many cells inside a line still count as beside it. */
const BESIDE_CELLS = 3;

/** The part is what lies along the inside of the lines that are cut on their outside; of offcuts nothing does. Everything, when there are none. */
function insideLines(grid: Grid, lines: readonly Contour[]): MarkRow {
  const inside = new InsideRows(lines);
  const band = new DistanceBand(grid, 1);
  const segments = lines.flatMap(segmentsOf);
  return (row, marks) => {
    if (lines.length === 0) return marks.fill(1);
    band.begin(row, row + 1);
    for (const segment of segments) band.spread(segment, BESIDE_CELLS * grid.cell);
    marks.fill(0);
    const xs = inside.crossings(sampleY(grid, row));
    for (let c = 0; c + 1 < xs.length; c += 2)
      for (let i = firstColumn(grid, xs[c]!), to = endColumn(grid, xs[c + 1]!); i < to; i++)
        if (band.square[i]! < Infinity) marks[i] = 1;
  };
}

/** In a region of a board that has been looked at as a whole, what was the part there is the part here. */
function partOfWhole(grid: Grid, whole: CutPart): MarkRow {
  const at = (value: number, min: number, count: number) =>
    Math.min(count - 1, Math.max(0, Math.floor((value - min) / whole.grid.cell)));
  return (row, marks) => {
    const start = at(sampleY(grid, row), whole.grid.minY, whole.grid.rows) * whole.grid.columns;
    for (let i = 0; i < marks.length; i++)
      marks[i] = whole.standing[start + at(sampleX(grid, i), whole.grid.minX, whole.grid.columns)] === PART ? 1 : 0;
  };
}

/** Which pieces are the part: the one with most along the lines, or of a region those of which most was the part. */
function choosePart(
  pieces: Int32Array,
  count: number,
  grid: Grid,
  lines: readonly Contour[],
  whole: CutPart | undefined,
): Uint8Array {
  const isPart = new Uint8Array(count + 1);
  if (count === 0) return isPart;
  const found = countMarked(pieces, count, grid, whole ? partOfWhole(grid, whole) : insideLines(grid, lines));
  if (whole) {
    const sizes = countMarked(pieces, count, grid, (_, marks) => marks.fill(1));
    for (let piece = 1; piece <= count; piece++) if (found[piece]! * 2 > sizes[piece]!) isPart[piece] = 1;
  } else {
    let most = 1;
    for (let piece = 2; piece <= count; piece++) if (found[piece]! > found[most]!) most = piece;
    isPart[most] = 1;
  }
  return isPart;
}

/** How far a board has been cut: the lines of each face, and how many of its layers are done. */
export interface Stage {
  readonly front: FaceCut;
  readonly back: FaceCut;
  readonly frontLayers: number;
  readonly backLayers: number;
}

/**
 * Puts both faces together and tells the part from what has come free: offcuts of openings, waste beside the perimeter and
 * the squaring edge. Pieces hang together where samples touch, corners too. Of a region, `whole` (the entire board at the
 * same stage) says which pieces are the part. Throws for fields on different grids.
 */
export function combineFaces(front: HeightField, back: HeightField, stage: Stage, whole?: CutPart): CutPart {
  const { grid, thickness } = front;
  if (
    back.depth.length !== front.depth.length ||
    back.grid.minX !== grid.minX ||
    back.grid.minY !== grid.minY ||
    back.grid.cell !== grid.cell
  )
    throw new RangeError('front and back: got fields on two grids, takes one grid');
  const board = stage.back.board ?? stage.front.board ?? gridExtents(grid);
  const { pieces, count } = findPieces(boardLeft(front, back.depth, board), grid);
  const isPart = choosePart(pieces, count, grid, keptWithin(stage), whole);
  const standing = new Uint8Array(pieces.length);
  for (let at = 0; at < pieces.length; at++)
    standing[at] = pieces[at] === 0 ? GONE : isPart[pieces[at]!] === 1 ? PART : LOOSE;
  let loosePieces = 0;
  for (let piece = 1; piece <= count; piece++) loosePieces += 1 - isPart[piece]!;
  return { grid, thickness, front, back, standing, loosePieces };
}

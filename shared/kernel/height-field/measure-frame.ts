import type { FileProfile } from '../profiles/file-profile.ts';
import type { Face } from '../line-sets/line-set.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import { boardExtents, cutBoard, finishedStage, shareOf } from './cut-board.ts';
import type { CutPart, Stage } from './cut-part.ts';
import { findDifference, type Difference, type LargestDifference } from './find-difference.ts';
import { makeGrid } from './grid.ts';

/** What a frame's files leave, held against what is meant; see find-difference.ts for what the numbers say. */
export interface Measured {
  /** Cell that the whole board was looked at with, and the one about the places found. */
  readonly cell: number;
  readonly fineCell: number;
  readonly front: LargestDifference;
  readonly back: LargestDifference;
}

/** Cells about a place that are looked at again, to each side, and how much finer. */
const AGAIN_CELLS = 3;
const FINER = 16;

function* again(
  worked: DrawnFrame,
  stage: Stage,
  whole: CutPart,
  found: Difference | null,
): Generator<number, Difference | null, void> {
  if (!found) return null;
  const { cell } = whole.grid;
  const margin = AGAIN_CELLS * cell;
  const grid = makeGrid(
    { minX: found.x - margin, maxX: found.x + margin, minY: found.y - margin, maxY: found.y + margin },
    cell / FINER,
  );
  const part = yield* shareOf(cutBoard(stage, grid, whole), 0, 0.5);
  const finer = (yield* shareOf(findDifference(worked, part, found.face), 0.5, 1))[found.kind];
  return finer && finer.off > found.off ? finer : found;
}

function* measureFace(
  worked: DrawnFrame,
  stage: Stage,
  whole: CutPart,
  face: Face,
): Generator<number, LargestDifference, void> {
  const { left, cut } = yield* shareOf(findDifference(worked, whole, face), 0, 0.9);
  return {
    left: yield* shareOf(again(worked, stage, whole, left), 0.9, 0.95),
    cut: yield* shareOf(again(worked, stage, whole, cut), 0.95, 1),
  };
}

/**
 * The largest differences between the face that the files cut and the one that is meant, on both faces: the whole board at
 * `cell`, then the surroundings of each place found sixteen times finer. Yields the share done. Throws DrawingRefused for a
 * frame that cannot be drawn.
 */
export function* measureFrame(
  worked: DrawnFrame,
  profile: FileProfile,
  cell: number,
): Generator<number, Measured, void> {
  const stage = finishedStage(worked, profile);
  const whole = yield* shareOf(cutBoard(stage, makeGrid(boardExtents(worked, stage), cell)), 0, 0.4);
  const front = yield* shareOf(measureFace(worked, stage, whole, 'front'), 0.4, 0.7);
  const back = yield* shareOf(measureFace(worked, stage, whole, 'back'), 0.7, 1);
  return { cell, fineCell: cell / FINER, front, back };
}

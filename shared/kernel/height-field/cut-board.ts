import type { Extents } from '../contour/contour.ts';
import { joinExtents } from '../contour/contour-extents.ts';
import { placeExtents, unplace } from '../placing/place.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import { combineFaces, type CutPart, type Stage } from './cut-part.ts';
import { faceLines } from './face-lines.ts';
import type { Grid } from './grid.ts';
import { sweepFace } from './sweep-face.ts';

/** The lines of both faces' drawings with everything cut. Throws DrawingRefused for a frame that cannot be drawn. */
export function finishedStage(worked: DrawnFrame, profile: FileProfile): Stage {
  const front = faceLines(worked, 'front', profile);
  const back = faceLines(worked, 'back', profile);
  return { front, back, frontLayers: front.layers.length, backLayers: back.layers.length };
}

/** The same board with only the first `steps` layers cut, those of the back first. */
export function stageAfter({ front, back }: Stage, steps: number): Stage {
  const backLayers = Math.min(steps, back.layers.length);
  return { front, back, backLayers, frontLayers: Math.min(steps - backLayers, front.layers.length) };
}

/** How many layers are cut of both faces together. */
export const stepsOf = ({ front, back }: Stage): number => back.layers.length + front.layers.length;

/** The board as loaded, in frame view. */
export const boardExtents = (worked: DrawnFrame, { back, front }: Stage): Extents => {
  const boards = [back.board, front.board].filter((b) => b !== null);
  const [first, ...rest] = boards;
  return first ? joinExtents(first, ...rest) : placeExtents(unplace(worked.blank.back), worked.blank.rough);
};

/** Share of the whole work that each face's sweep is taken for; the rest puts them together. */
const FACE_SHARE = 0.45;

/**
 * Cuts a board, or a region of it, from both faces on one grid. Yields the share done, from 0 to 1. For a region give `whole`,
 * the entire board at the same stage, so that the part can be told from offcuts.
 */
export function* cutBoard(stage: Stage, grid: Grid, whole?: CutPart): Generator<number, CutPart, void> {
  const back = yield* shareOf(sweepFace(stage.back, grid, stage.backLayers), 0, FACE_SHARE);
  const front = yield* shareOf(sweepFace(stage.front, grid, stage.frontLayers), FACE_SHARE, 2 * FACE_SHARE);
  const part = combineFaces(front, back, stage, whole);
  yield 1;
  return part;
}

/** A piece of work as the stretch from `from` to `to` of a greater one. */
export function* shareOf<T>(work: Generator<number, T, void>, from: number, to: number): Generator<number, T, void> {
  for (;;) {
    const step = work.next();
    if (step.done) return step.value;
    yield from + step.value * (to - from);
  }
}

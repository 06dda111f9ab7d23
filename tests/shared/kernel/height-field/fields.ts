import type { Contour, Extents, Point3 } from '#shared/kernel/contour/contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { boardExtents, cutBoard, finishedStage, stageAfter, stepsOf } from '#shared/kernel/height-field/cut-board.ts';
import type { CutPart } from '#shared/kernel/height-field/cut-part.ts';
import type { FaceCut, LayerLines } from '#shared/kernel/height-field/face-cut.ts';
import { makeGrid } from '#shared/kernel/height-field/grid.ts';
import type { HeightField } from '#shared/kernel/height-field/height-field.ts';
import { runThrough, sweepFace } from '#shared/kernel/height-field/sweep-face.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

export const asDrawn: FileProfile = BUILTIN_PROFILES[0]!.profile;

/** A layer with one cutter; lines and climbs as given. */
export const layer = (cutter: Cutter, depth: number, changes: Partial<LayerLines> = {}): LayerLines => ({
  key: 'front/QUIRK',
  layer: 'FRONT_QUIRK',
  set: 'QUIRK',
  order: 0,
  cutter,
  side: 'on',
  depth,
  beside: 0,
  pocket: false,
  contours: [],
  climbs: [],
  ...changes,
});

/** A face of a board 0.75 thick with these layers. */
export const faceWith = (...layers: LayerLines[]): FaceCut => ({
  face: 'front',
  thickness: 0.75,
  board: null,
  layers: layers.map((l, order) => ({ ...l, order })),
});

export const sweep = (cut: FaceCut, region: Extents, cell: number): HeightField =>
  runThrough(sweepFace(cut, makeGrid(region, cell)));

export const openLine = (...points: [number, number, number?][]): Contour => ({
  closed: false,
  vertices: points.map(([x, y, bulge = 0]) => ({ x, y, bulge })),
});
export const closedLine = (...points: [number, number, number?][]): Contour => ({
  ...openLine(...points),
  closed: true,
});
export const path = (...points: [number, number, number][]): Point3[] => points.map(([x, y, z]) => ({ x, y, z }));

/** Depth at the sample nearest to a place; throws for one that no cell holds, so that a check cannot pass on nothing. */
export function depthAt({ grid, depth }: HeightField, x: number, y: number): number {
  const i = Math.floor((x - grid.minX) / grid.cell);
  const j = Math.floor((y - grid.minY) / grid.cell);
  if (i < 0 || j < 0 || i >= grid.columns || j >= grid.rows) throw new Error(`${x}, ${y} is beside the grid`);
  return depth[j * grid.columns + i]!;
}

export const deepest = ({ depth }: HeightField): number => depth.reduce((most, d) => Math.max(most, d), 0);

/** Every sample of a field: place, depth, and the number of the layer that cut it. */
export function* samples({
  grid,
  depth,
  by,
}: HeightField): Generator<{ x: number; y: number; depth: number; by: number }> {
  for (let j = 0; j < grid.rows; j++)
    for (let i = 0; i < grid.columns; i++) {
      const at = j * grid.columns + i;
      yield {
        x: grid.minX + (i + 0.5) * grid.cell,
        y: grid.minY + (j + 0.5) * grid.cell,
        depth: depth[at]!,
        by: by[at]!,
      };
    }
}

/** A frame's board after some steps (all, when left out), or a region of it. */
export function cutFrame(
  particulars: Particulars,
  { cell, region, steps, profile = asDrawn }: { cell: number; region?: Extents; steps?: number; profile?: FileProfile },
): CutPart {
  const worked = workFrame(particulars);
  const finished = finishedStage(worked, profile);
  const stage = stageAfter(finished, steps ?? stepsOf(finished));
  const whole = region && runThrough(cutBoard(stage, makeGrid(boardExtents(worked, stage), 0.06)));
  return runThrough(cutBoard(stage, makeGrid(region ?? boardExtents(worked, stage), cell), whole));
}

/** The greatest of some errors with where it was, so that a whole field is held against a formula in one check. */
export class Worst {
  error = 0;
  where = 'nowhere';
  count = 0;

  take(error: number, where: () => string): void {
    this.count++;
    if (!(error <= this.error)) [this.error, this.where] = [error, where()];
  }
}

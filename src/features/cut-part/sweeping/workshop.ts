import type { Extents } from '#shared/kernel/contour/contour.ts';
import { boardExtents, cutBoard, finishedStage, shareOf, stageAfter } from '#shared/kernel/height-field/cut-board.ts';
import { PART, type CutPart, type Stage } from '#shared/kernel/height-field/cut-part.ts';
import { makeGrid, type Grid } from '#shared/kernel/height-field/grid.ts';
import { measureFrame, type Measured } from '#shared/kernel/height-field/measure-frame.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { convertLength } from '#shared/kernel/units/convert-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { faceMesh } from '../mesh/face-mesh.ts';
import { shadeRelief } from '../mesh/relief.ts';
import { makeSlice, type Slice } from '../mesh/slice.ts';
import type { LookWish, Picture, PictureFacts, Relief, ReliefWish, SliceWish } from './picture.ts';

type Work<T> = Generator<number, T, void>;

/** Samples along the longer side of a picture: with a ring about them they fill a raster of 1025 (right-triangles.ts). */
const PICTURE_SAMPLES = 1023;
/** Finest cell of a picture, and the cell that the differences are looked for with. */
const FINEST_MM = 0.05;
const MEASURE_MM = 0.5;
/** A slice has this many samples along the board at most. */
const SLICE_SAMPLES = 4000;
/** How far merged triangles may be off, as a share of the cell. */
const MESH_SHARE = 0.05;

const longest = ({ minX, minY, maxX, maxY }: Extents) => Math.max(maxX - minX, maxY - minY);

/** All that is worked out about one frame for the page that shows it: pictures, slices, differences, each as work in pieces. */
export class Workshop {
  private readonly worked: DrawnFrame;
  private readonly profile: FileProfile;
  private readonly stage: Stage;
  private readonly board: Extents;
  private whole: { readonly steps: number; readonly part: CutPart } | null = null;

  /** Throws DrawingRefused for a frame that cannot be drawn. */
  constructor(worked: DrawnFrame, profile: FileProfile) {
    this.worked = worked;
    this.profile = profile;
    this.stage = finishedStage(worked, profile);
    this.board = boardExtents(worked, this.stage);
  }

  /** Both surfaces as triangles, after so many steps, of the whole board coarse or of a region fine. */
  *look({ steps, region }: LookWish): Work<Picture> {
    const part = yield* shareOf(this.cut(steps, region), 0, 0.6);
    const tolerance = MESH_SHARE * part.grid.cell;
    const front = faceMesh(part, 'front', tolerance);
    yield 0.8;
    const back = faceMesh(part, 'back', tolerance);
    yield 1;
    return {
      steps,
      region: region ?? this.board,
      thickness: part.thickness,
      cell: part.grid.cell,
      front,
      back,
      facts: factsOf(part, this.stage),
    };
  }

  /** The cut through the board at a plane, one sample wide and swept anew, so that it is as sharp as the region allows. */
  *slice({ steps, region, plane: { runs, at } }: SliceWish): Work<Slice> {
    const whole = yield* shareOf(this.wholeAfter(steps), 0, 0.8);
    const area = region ?? this.board;
    const cell = Math.max(this.length(FINEST_MM), longest(area) / SLICE_SAMPLES);
    const half = cell / 2;
    const strip =
      runs === 'upright'
        ? { ...area, minX: at - half, maxX: at + half }
        : { ...area, minY: at - half, maxY: at + half };
    return makeSlice(yield* shareOf(cutBoard(stageAfter(this.stage, steps), makeGrid(strip, cell), whole), 0.8, 1));
  }

  /** One face as a shaded picture, where triangles cannot be shown. */
  *relief({ steps, region, face, palette }: ReliefWish): Work<Relief> {
    const part = yield* shareOf(this.cut(steps, region), 0, 0.9);
    const pixels = shadeRelief(part, face, this.worked.blank.flip, palette);
    return { width: part.grid.columns, height: part.grid.rows, pixels, facts: factsOf(part, this.stage) };
  }

  /** The largest differences between the face that is meant and the one that the files cut. */
  measure(): Work<Measured> {
    return measureFrame(this.worked, this.profile, this.length(MEASURE_MM));
  }

  private length(mm: number): number {
    return convertLength(mm, 'mm', this.worked.particulars.unit);
  }

  private gridOf(area: Extents): Grid {
    return makeGrid(area, Math.max(this.length(FINEST_MM), longest(area) / PICTURE_SAMPLES));
  }

  private *wholeAfter(steps: number): Work<CutPart> {
    if (this.whole?.steps !== steps)
      this.whole = { steps, part: yield* cutBoard(stageAfter(this.stage, steps), this.gridOf(this.board)) };
    return this.whole.part;
  }

  private *cut(steps: number, region: Extents | null): Work<CutPart> {
    const whole = yield* shareOf(this.wholeAfter(steps), 0, region ? 0.6 : 1);
    if (!region) return whole;
    return yield* shareOf(cutBoard(stageAfter(this.stage, steps), this.gridOf(region), whole), 0.6, 1);
  }
}

function factsOf(part: CutPart, stage: Stage): PictureFacts {
  const areaOf = (face: Face): number[] => {
    const counts = new Float64Array(stage[face].layers.length + 1);
    const { by } = part[face];
    for (let at = 0; at < by.length; at++) if (part.standing[at] === PART) counts[by[at]!]! += 1;
    return [...counts.subarray(1)].map((count) => count * part.grid.cell ** 2);
  };
  return { loosePieces: part.loosePieces, marked: { front: areaOf('front'), back: areaOf('back') } };
}

import type { Extents } from '#shared/kernel/contour/contour.ts';
import type { Measured } from '#shared/kernel/height-field/measure-frame.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import type { FaceMesh } from '../mesh/face-mesh.ts';
import type { Slice } from '../mesh/slice.ts';

/** What has been cut of the board by now, in numbers to say in words. */
export interface PictureFacts {
  readonly loosePieces: number;
  /** Square of the unit that each layer has left its mark on, by place in its face's cutting order; what stands of the part only. */
  readonly marked: Readonly<Record<Face, readonly number[]>>;
}

/** A board, or a region of it, after some steps: both surfaces as triangles in frame view. */
export interface Picture {
  readonly steps: number;
  readonly region: Extents;
  readonly thickness: number;
  readonly cell: number;
  readonly front: FaceMesh;
  readonly back: FaceMesh;
  readonly facts: PictureFacts;
}

/** A plane across the board: upright ones stand at a place x, level ones at a place y. */
export interface Plane {
  readonly runs: 'upright' | 'level';
  readonly at: number;
}

/** One face as a shaded picture for a plain canvas, as it is seen when it lies up; RGBA, top row first. */
export interface Relief {
  readonly width: number;
  readonly height: number;
  readonly pixels: Uint8ClampedArray<ArrayBuffer>;
  readonly facts: PictureFacts;
}

/** Red, green and blue, 0 to 255. */
export type Rgb = readonly [number, number, number];

export interface LookWish {
  readonly kind: 'look';
  readonly steps: number;
  /** null: the whole board. */
  readonly region: Extents | null;
}
export interface SliceWish {
  readonly kind: 'slice';
  readonly steps: number;
  readonly region: Extents | null;
  readonly plane: Plane;
}
export interface ReliefWish {
  readonly kind: 'relief';
  readonly steps: number;
  readonly region: Extents | null;
  readonly face: Face;
  /** Colour of an untouched face first, then of each layer in the face's cutting order. */
  readonly palette: readonly Rgb[];
}
export interface MeasureWish {
  readonly kind: 'measure';
}

/** What a page may ask of the worker about a frame. */
export type Wish = LookWish | SliceWish | ReliefWish | MeasureWish;

/** What each wish is answered with. */
export interface Answers {
  readonly look: Picture;
  readonly slice: Slice;
  readonly relief: Relief;
  readonly measure: Measured;
}

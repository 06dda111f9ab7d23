import type { Contour, Extents } from '../contour/contour.ts';

/** A stable name for a thing on a frame: 'perimeter', 'blank', 'opening-0', 'dado-2', 'stile-left', 'between-0.1' … */
export type FeatureId = string;

/** Steps down the layout tree: index of the child at each level; [] is the root. */
export type LayoutPath = readonly number[];

/** A stile or rail of the frame, as the rectangle of board between openings; frame view. */
export interface Member {
  readonly id: FeatureId;
  readonly kind: 'stile' | 'rail' | 'mid-stile' | 'mid-rail';
  readonly label: string;
  readonly extents: Extents;
  /** Width across the grain of the word: a stile's width in X, a rail's in Y. */
  readonly width: number;
  readonly length: number;
  /** For mid-stiles and mid-rails: the layout part whose `between` it is. */
  readonly path?: LayoutPath;
}

/** An opening at its entered size; frame view, contour counter-clockwise. */
export interface Opening {
  readonly id: FeatureId;
  readonly label: string;
  readonly contour: Contour;
  readonly extents: Extents;
  readonly width: number;
  /** To the top of the arch, when there is one. */
  readonly height: number;
  readonly arch: number;
  /** Keeps a square edge even in a frame with beaded edges. */
  readonly square: boolean;
  /** For openings of a layout tree. */
  readonly path?: LayoutPath;
}

/** The lines of a frame before any cutter; frame view. */
export interface FrameContours {
  readonly width: number;
  readonly height: number;
  /** Counter-clockwise. */
  readonly perimeter: Contour;
  readonly openings: readonly Opening[];
  /** Empty for a traced outline. */
  readonly members: readonly Member[];
}

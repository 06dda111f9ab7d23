import type { Contour, Point } from '../../contour/contour.ts';
import type { Unit } from '../../units/unit.ts';

/**
 * Somebody's lines and arcs as loops. All places are in drawing units about `origin`: add it to get the drawing's own coordinates.
 * It is 0, 0 unless the drawing lies so far away that floats would be too coarse to work with there.
 */
export interface HealedDrawing {
  readonly unit: Unit;
  readonly origin: Point;
  readonly loops: readonly HealedLoop[];
  /** What does not close, to be drawn. */
  readonly open: readonly Contour[];
  readonly counts: HealCounts;
  readonly problems: readonly HealProblem[];
}

export interface HealedLoop {
  /** Closed, counter-clockwise; straight runs are one line, runs of one circle one arc. */
  readonly contour: Contour;
  /**
   * 'alone': touches no other loop. 'cell': one of several areas that share edges or corners. 'outline': the line round several
   * cells, offered as a perimeter beside them; there is none where it would be the line of one cell.
   */
  readonly kind: 'alone' | 'cell' | 'outline';
  /** Which segments of the found curves it is made of, rising. */
  readonly segments: readonly number[];
  /** Which entities of the drawing it is made of, rising. */
  readonly entities: readonly number[];
}

/**
 * How many. They add up: segments − slivers − duplicates + splits − overlaps = edges, and edges = inLoops + inOpen + leftOut.
 */
export interface HealCounts {
  readonly segments: number;
  /** Of no length, or hardly any, or pieces within the gap that were cut off an end. */
  readonly slivers: number;
  /** Second copies of a whole segment, run either way. */
  readonly duplicates: number;
  /** Times that a segment was cut in two: at junctions, where another begins to run along it, arcs over a half circle. */
  readonly splits: number;
  /** Pieces that ran along another. */
  readonly overlaps: number;
  /** Edges that are left. */
  readonly edges: number;
  readonly inLoops: number;
  readonly inOpen: number;
  /** Edges that bound only loops thinner than the gap. */
  readonly leftOut: number;
  /** Places where an end meets the inside of another segment. */
  readonly tJunctions: number;
  readonly gapsClosed: number;
  readonly gapsAmbiguous: number;
  readonly crossings: number;
  /** Vertices that went because what runs on both sides of them is one line or one arc. */
  readonly verticesMerged: number;
  readonly arcsRecognised: number;
}

export type HealProblemCode =
  /** Two ends were apart by `size`, or one ran past the other, and they are joined now. */
  | 'gap-closed'
  /** An end has more than one place to go to, the nearest `size` away: it stays open. */
  | 'gap-ambiguous'
  /** Two lines cross without a corner there; they stay as they are. */
  | 'crosses-itself'
  /** There are more crossings than are listed. */
  | 'crossings-not-listed'
  /** A chain whose ends are `size` apart does not close. */
  | 'left-open'
  /** A loop no wider than `size` is left out. */
  | 'loop-too-thin';

export interface HealProblem {
  readonly code: HealProblemCode;
  readonly message: string;
  readonly at: readonly [x: number, y: number];
  /** Drawing units. */
  readonly size: number;
}

import type { Contour, Extents, Point3 } from '../contour/contour.ts';
import type { Cutter } from '../cutters/cutter.ts';
import type { CutterSide, Face, SetName } from '../line-sets/line-set.ts';

/** What one layer of a drawing is cut with; lengths in the frame's unit. */
export interface LayerCut {
  /** The line set's key, 'front/OPENING_AXIS'. */
  readonly key: string;
  readonly layer: string;
  readonly set: SetName;
  /** Place in the cutting order of its face, from 0. */
  readonly order: number;
  readonly cutter: Cutter;
  readonly side: CutterSide;
  /** Tip depth below the face; climbing lines carry their own. */
  readonly depth: number;
  /** How far the axis runs beside the lines, for sides other than 'on'. */
  readonly beside: number;
  /** All that the cutter can reach inside the lines is cleared, not just a way along them. */
  readonly pocket: boolean;
}

/** A layer's cut with the lines that the drawing holds for it; frame view, the frame's unit. */
export interface LayerLines extends LayerCut {
  readonly contours: readonly Contour[];
  readonly climbs: readonly (readonly Point3[])[];
}

/** All that is cut from one face, read from its drawing: in frame view, depths below that face. */
export interface FaceCut {
  readonly face: Face;
  readonly thickness: number;
  /** The board as it lies in this face's setup, from its blank line; null when the drawing has none. */
  readonly board: Extents | null;
  /** In cutting order. */
  readonly layers: readonly LayerLines[];
}

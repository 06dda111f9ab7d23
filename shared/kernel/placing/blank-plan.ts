import type { Extents, Point } from '../contour/contour.ts';
import type { Flip } from '../particulars/particulars.ts';
import type { Placement } from './placement.ts';

/** The board from rough to squared, and how each face's setup lies on it. */
export interface BlankPlan {
  readonly flip: Flip;
  /** Board as loaded, back face up, from 0, 0 at the pins. */
  readonly rough: Extents;
  /** What lies on the pins after squaring, front face up, from 0, 0. */
  readonly squared: Extents;
  /** The corner of the squared edges in the back setup. */
  readonly squaredCorner: Point;
  /** Which edges of the board, back face up, are squared edges that will meet the pins. */
  readonly squaredEdges: readonly ('left' | 'right' | 'top' | 'bottom')[];
  /** Frame view → back setup, and frame view → front setup. */
  readonly back: Placement;
  readonly front: Placement;
  /** True when the board was given and not worked out. */
  readonly given: boolean;
}

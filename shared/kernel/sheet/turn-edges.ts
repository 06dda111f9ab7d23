import type { Flip } from '../particulars/particulars.ts';

export type EdgeSide = 'left' | 'top' | 'right' | 'bottom';
export type CornerPlace = `${'upper' | 'lower'} ${'left' | 'right'}`;

/** An edge of the board keeps its letter through the turn. */
export interface TurnedEdge {
  readonly letter: 'A' | 'B' | 'C' | 'D';
  readonly before: EdgeSide;
  readonly after: EdgeSide;
  /** Squared on the back, and against the pins afterwards. */
  readonly squared: boolean;
}

const SWAPPED: Record<Flip, Record<EdgeSide, EdgeSide>> = {
  'side-to-side': { left: 'right', right: 'left', top: 'top', bottom: 'bottom' },
  'end-over-end': { left: 'left', right: 'right', top: 'bottom', bottom: 'top' },
};

/** The four edges, lettered clockwise from the left with the back face up; those in `squared` will meet the pins. */
export function turnedEdges(flip: Flip, squared: readonly EdgeSide[]): TurnedEdge[] {
  const sides = ['left', 'top', 'right', 'bottom'] as const;
  return sides.map((before, i) => ({
    letter: (['A', 'B', 'C', 'D'] as const)[i]!,
    before,
    after: SWAPPED[flip][before],
    squared: squared.includes(before),
  }));
}

/** The edge that is carried over, and the one that it turns about. */
export function movingEdge(flip: Flip): { readonly lifted: EdgeSide; readonly pivot: EdgeSide } {
  return flip === 'side-to-side' ? { lifted: 'left', pivot: 'right' } : { lifted: 'top', pivot: 'bottom' };
}

/** Where the squared corner lies before and after. */
export function squaredCornerPlaces(flip: Flip): { readonly before: CornerPlace; readonly after: CornerPlace } {
  return { before: flip === 'side-to-side' ? 'lower right' : 'upper left', after: 'lower left' };
}

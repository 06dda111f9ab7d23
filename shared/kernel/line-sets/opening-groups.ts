import type { Opening } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { edgeOfOpening } from './held-depth.ts';
import { openingCut, type OpeningCut } from './opening-cut.ts';

/** Openings that are cut alike. */
export interface OpeningGroup {
  readonly openings: readonly Opening[];
  readonly cut: OpeningCut;
  /** Tells the sets of square openings apart in a frame that has beaded ones too. */
  readonly variant: string;
}

interface OpeningGroups {
  /** The cut of the openings that carry the frame's own edge, and those openings. */
  readonly cut: OpeningCut;
  readonly own: readonly Opening[];
  /** Those that hold at least one opening. */
  readonly groups: readonly OpeningGroup[];
}

/** Openings by the edge they carry. One that keeps a square edge in a beaded frame is another cut: true at another depth, lifted to another plane. */
export function openingGroups(p: Particulars, openings: readonly Opening[]): OpeningGroups {
  const cut = openingCut(p);
  const own = openings.filter((o) => p.edge.style === 'square' || !o.square);
  const square = openings.filter((o) => !own.includes(o));
  const groups = [
    { openings: own, cut, variant: '' },
    {
      openings: square,
      cut: openingCut(p, edgeOfOpening(p.edge, { square: true })),
      variant: own.length > 0 ? 'SQUARE' : '',
    },
  ].filter((group) => group.openings.length > 0);
  return { cut, own, groups };
}

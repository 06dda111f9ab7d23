import type { FrameContours } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { beadCutters, beadLineSets, type BeadProblem } from './bead-line-sets.ts';
import { cornerVeeLineSet } from './corner-vee-line-set.ts';
import type { CornerResidue } from './corner-residue.ts';
import { findCornerResidue } from './find-corner-residue.ts';
import { edgeOfOpening } from './held-depth.ts';
import type { LineSet } from './line-set.ts';
import { openingCut, type OpeningCut } from './opening-cut.ts';
import { openingLineSets, type OpeningProblem } from './opening-line-sets.ts';
import { perimeterLineSet } from './outer-line-sets.ts';

export interface FrontLineSets {
  /** In cutting order; frame view. */
  readonly lineSets: LineSet[];
  readonly problems: OpeningProblem[];
  readonly beadProblems: BeadProblem[];
  readonly residues: CornerResidue[];
  /** The cut of the openings that carry the frame's own edge. */
  readonly cut: OpeningCut;
}

/** All line sets of the front face: beads, quirks and their corners, openings and their corners, the perimeter last. */
export function frontLineSets(p: Particulars, contours: FrameContours): FrontLineSets {
  const cut = openingCut(p);
  // Openings that keep a square edge in a beaded frame are another cut: true at another depth, lifted to another plane.
  const own = contours.openings.filter((o) => p.edge.style === 'square' || !o.square);
  const square = contours.openings.filter((o) => !own.includes(o));
  const cutters = beadCutters(p.cutters);
  const beaded =
    p.edge.style === 'beaded' && cutters ? beadLineSets(p, p.edge, cutters, own, cut) : { lineSets: [], problems: [] };
  const groups = [
    { openings: own, cut, variant: '' },
    {
      openings: square,
      cut: openingCut(p, edgeOfOpening(p.edge, { square: true })),
      variant: own.length > 0 ? 'SQUARE' : '',
    },
  ].filter((g) => g.openings.length > 0);

  const cuts = groups.map((g) => openingLineSets(p, g.openings, g.cut, g.variant));
  const vees = groups.map((g) => cornerVeeLineSet(p, g.openings, g.cut, g.variant));
  return {
    lineSets: [
      ...beaded.lineSets,
      ...cuts.flatMap((c) => c.lineSets),
      ...vees.flatMap((v) => v.lineSets),
      perimeterLineSet(p, contours.perimeter),
    ],
    problems: [...cuts, ...vees].flatMap((c) => c.problems),
    beadProblems: beaded.problems,
    residues: groups.flatMap((g) => findCornerResidue(p.cutters.opening, g.cut, p.thickness, g.openings)),
    cut,
  };
}

import type { FrameContours } from '../frame/members.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { beadCutters, beadLineSets, type BeadProblem } from './bead-line-sets.ts';
import { cornerVeeLineSet } from './corner-vee-line-set.ts';
import type { LineSet } from './line-set.ts';
import type { OpeningCut } from './opening-cut.ts';
import { openingGroups } from './opening-groups.ts';
import { openingLineSets, type OpeningProblem } from './opening-line-sets.ts';
import { perimeterLineSet } from './outer-line-sets.ts';

export interface FrontLineSets {
  /** In cutting order; frame view. */
  readonly lineSets: LineSet[];
  readonly problems: OpeningProblem[];
  readonly beadProblems: BeadProblem[];
  /** The cut of the openings that carry the frame's own edge. */
  readonly cut: OpeningCut;
}

/** All line sets of the front face: beads, quirks and their corners, openings and their corners, the perimeter last. */
export function frontLineSets(p: Particulars, contours: FrameContours): FrontLineSets {
  const { cut, own, groups } = openingGroups(p, contours.openings);
  const cutters = beadCutters(p.cutters);
  const beaded =
    p.edge.style === 'beaded' && cutters ? beadLineSets(p, p.edge, cutters, own, cut) : { lineSets: [], problems: [] };
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
    cut,
  };
}

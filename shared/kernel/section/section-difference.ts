import type { BeadedEdge, Particulars } from '../particulars/particulars.ts';
import { envelopeDepth } from './envelope-depth.ts';
import { intendedDepth } from './intended-depth.ts';
import { sectionPasses, type SectionPass } from './section-passes.ts';

export interface SectionDifference {
  /** Greatest depth cut below the entered bead, and where; 0 when nothing is. */
  readonly below: number;
  readonly belowAt: number;
  /** Greatest height left standing above it. */
  readonly above: number;
  readonly aboveAt: number;
}

const STEPS = 400;

/** The entered bead held against the true section, over the bead's width: how far the cutters cut into it, and what they leave on it. */
export function sectionDifference(
  p: Particulars,
  edge: BeadedEdge,
  passes: readonly SectionPass[] = sectionPasses(p, edge),
): SectionDifference {
  let [below, belowAt, above, aboveAt] = [0, 0, 0, 0];
  for (let i = 0; i <= STEPS; i++) {
    const y = (2 * edge.bead.radius * i) / STEPS;
    // The very edge is a vertical wall: there any depth is right.
    if (i === 0) continue;
    const over = envelopeDepth(passes, y, p.thickness) - intendedDepth(edge.bead, y);
    if (over > below) [below, belowAt] = [over, y];
    if (-over > above) [above, aboveAt] = [-over, y];
  }
  return { below, belowAt, above, aboveAt };
}

import type { FrameContours } from '../frame/members.ts';
import type { CornerResidue } from '../line-sets/corner-residue.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { formatDecimal, formatWithUnit } from '../units/format-length.ts';
import type { Finding } from './finding.ts';
import { atOpening } from './place-finding.ts';

/**
 * What both bead passes leave on the mitre of a corner. The pass on the opening's side turns about its corner and reaches its full
 * radius ρ = R + t/2 along the mitre; the one on the frame's side begins where the bead is highest, ρ/sin(θ/2) from there: between
 * them ρ(1/sin(θ/2) − 1) stays as high as the face. One note for each angle; nothing for square edges.
 */
export function noteBeadNubs(
  { edge, cutters: { bead }, unit }: Particulars,
  contours: FrameContours,
  residues: readonly CornerResidue[],
): Finding[] {
  if (edge.style !== 'beaded' || bead?.kind !== 'beading') return [];
  const reach = bead.profileRadius + bead.tipFlat / 2;
  const beaded = new Map(contours.openings.filter((o) => !o.square).map((o) => [o.id, o]));
  const byAngle = new Map<string, { angle: number; of: Set<string> }>();
  for (const { angle, opening } of residues) {
    if (!beaded.has(opening)) continue;
    const key = formatDecimal((angle * 180) / Math.PI, 2);
    const known = byAngle.get(key) ?? { angle, of: new Set<string>() };
    known.of.add(opening);
    byAngle.set(key, known);
  }
  return [...byAngle].map(([degrees, { angle, of }]) => {
    const length = reach * (1 / Math.sin(angle / 2) - 1);
    return {
      code: 'bead-nub',
      level: 'note',
      text: `On the mitre of each beaded corner of ${degrees}° a nub ${formatWithUnit(length, unit)} long stays as high as the face, where neither pass of the bead reaches. Dress it by hand.`,
      remedy: '',
      numbers: { angle, length },
      places: [...beaded].filter(([id]) => of.has(id)).map(([, opening]) => atOpening(opening)),
    } satisfies Finding;
  });
}

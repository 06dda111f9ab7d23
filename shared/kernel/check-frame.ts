import { checkBeads } from './checks/check-beads.ts';
import { checkBlank } from './checks/check-blank.ts';
import { checkCutterKinds, checkFlutes } from './checks/check-cutters.ts';
import { checkDados } from './checks/check-dados.ts';
import { checkMembers } from './checks/check-members.ts';
import { checkOpeningCuts, checkOpeningPlaces } from './checks/check-openings.ts';
import { checkWalls } from './checks/check-walls.ts';
import type { FindingLevel } from './checks/finding.ts';
import { makeNotes } from './checks/make-notes.ts';
import { dadoRadius, type FrameLines } from './draw-frame.ts';
import { frameResidues } from './line-sets/find-corner-residue.ts';
import type { WorkedFrame } from './worked-frame.ts';

const RANK: Record<FindingLevel, number> = { stop: 0, caution: 1, note: 2 };

/** What every check says of a frame's lines, and what is left in its corners. */
export function checkFrame(lines: FrameLines): Pick<WorkedFrame, 'residues' | 'findings'> {
  const { particulars: p, contours, dados, blank, frontLines } = lines;
  const residues = frameResidues(p, contours.openings);
  const findings = [
    ...lines.outlineFindings,
    ...checkOpeningPlaces(contours),
    ...checkCutterKinds(p, contours),
    ...checkOpeningCuts(frontLines.problems, frontLines.cut, p.unit),
    ...checkBeads(p, contours, frontLines, dados),
    ...checkDados(p, contours, dados, dadoRadius(p)),
    ...checkFlutes(p, contours, [...lines.back.lineSets, ...lines.front.lineSets]),
    ...checkBlank(p, contours, blank),
    ...checkWalls(p, contours, dados),
    ...checkMembers(contours, p.unit),
    ...makeNotes(p, contours, frontLines.cut, residues),
  ];
  return { residues, findings: findings.sort((a, b) => RANK[a.level] - RANK[b.level]) };
}

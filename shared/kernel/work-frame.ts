import { checkBeads } from './checks/check-beads.ts';
import { checkBlank } from './checks/check-blank.ts';
import { checkCutterKinds, checkFlutes } from './checks/check-cutters.ts';
import { checkDados } from './checks/check-dados.ts';
import { checkMembers } from './checks/check-members.ts';
import { checkOpeningCuts, checkOpeningPlaces } from './checks/check-openings.ts';
import { checkWalls } from './checks/check-walls.ts';
import type { Finding, FindingLevel } from './checks/finding.ts';
import { makeNotes } from './checks/make-notes.ts';
import { radiusAtHeight } from './cutters/radius-at-height.ts';
import { membersContours } from './frame/members-contours.ts';
import { outlineDado } from './frame/outline-dado.ts';
import { tracedContours } from './frame/traced-contours.ts';
import { dadoLineSets } from './line-sets/dado-line-sets.ts';
import { frontLineSets } from './line-sets/front-line-sets.ts';
import { squaringLineSet } from './line-sets/outer-line-sets.ts';
import type { Particulars } from './particulars/particulars.ts';
import { placeLineSets } from './placing/place-line-sets.ts';
import { planBlank } from './placing/plan-blank.ts';
import { squaringLine } from './placing/squaring-line.ts';
import type { WorkedFrame } from './worked-frame.ts';

const RANK: Record<FindingLevel, number> = { stop: 0, caution: 1, note: 2 };

/**
 * The whole pipeline: particulars → members solved → contours → line sets per face → placed on the blank, with every check.
 * Pure. Bad geometry never throws: it is a stop among the findings, and the lines concerned are missing.
 */
export function workFrame(particulars: Particulars): WorkedFrame {
  const p = particulars;
  const { contours, findings: outlineFindings } =
    p.outline.kind === 'members' ? membersContours(p.outline, p.unit) : tracedContours(p.outline);

  const dadoRadius = radiusAtHeight(p.cutters.dado, p.thickness);
  const dados = p.dados.map((dado, i) => outlineDado(dado, i, dadoRadius));
  const backSets = dadoLineSets(p, dados);

  const front = frontLineSets(p, contours);

  const blank = planBlank(contours.width, contours.height, p.setup, p.blank);
  const squaring = squaringLineSet(
    p,
    squaringLine(blank, contours.width, contours.height, p.setup, radiusAtHeight(p.cutters.squaring, p.thickness)),
  );

  const findings: Finding[] = [
    ...outlineFindings,
    ...checkOpeningPlaces(contours),
    ...checkCutterKinds(p, contours),
    ...checkOpeningCuts(front.problems, front.cut, p.unit),
    ...checkBeads(p, contours, front, dados),
    ...checkDados(p, contours, dados, dadoRadius),
    ...checkFlutes(p, contours, [...backSets, squaring, ...front.lineSets]),
    ...checkBlank(p, contours, blank),
    ...checkWalls(p, contours, dados),
    ...checkMembers(contours, p.unit),
    ...makeNotes(p, contours, front.cut, front.residues),
  ];

  return {
    particulars,
    contours,
    dados,
    blank,
    back: placeLineSets('back', blank.back, blank.rough, backSets, [squaring]),
    front: placeLineSets('front', blank.front, blank.squared, front.lineSets, []),
    residues: front.residues,
    findings: findings.sort((a, b) => RANK[a.level] - RANK[b.level]),
  };
}

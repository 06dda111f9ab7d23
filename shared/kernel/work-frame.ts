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
import { findCornerResidue } from './line-sets/find-corner-residue.ts';
import { openingLineSets } from './line-sets/opening-line-sets.ts';
import { perimeterLineSet, squaringLineSet } from './line-sets/outer-line-sets.ts';
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
  const { contours, findings: outlineFindings } = p.outline.kind === 'members' ? membersContours(p.outline, p.unit) : tracedContours(p.outline);

  const dadoRadius = radiusAtHeight(p.cutters.dado, p.thickness);
  const dados = p.dados.map((dado, i) => outlineDado(dado, i, dadoRadius));
  const backSets = dadoLineSets(p, dados);

  const { lineSets: openingSets, problems, cut } = openingLineSets(p, contours.openings);
  const frontSets = [...openingSets, perimeterLineSet(p, contours.perimeter)];
  const residues = findCornerResidue(p.cutters.opening, cut, p.thickness, contours.openings);

  const blank = planBlank(contours.width, contours.height, p.setup, p.blank);
  const squaring = squaringLineSet(p, squaringLine(blank, contours.width, contours.height, p.setup, radiusAtHeight(p.cutters.squaring, p.thickness)));

  const findings: Finding[] = [
    ...outlineFindings,
    ...checkOpeningPlaces(contours),
    ...checkCutterKinds(p, contours),
    ...checkOpeningCuts(problems, cut, p.unit),
    ...checkDados(p, contours, dados, dadoRadius),
    ...checkFlutes(p, contours, [...backSets, squaring, ...frontSets]),
    ...checkBlank(p, contours, blank),
    ...checkWalls(p, contours, dados),
    ...checkMembers(contours, p.unit),
    ...makeNotes(p, contours, cut, residues),
  ];

  return {
    particulars,
    contours,
    dados,
    blank,
    back: placeLineSets('back', blank.back, blank.rough, backSets, [squaring]),
    front: placeLineSets('front', blank.front, blank.squared, frontSets, []),
    residues,
    findings: findings.sort((a, b) => RANK[a.level] - RANK[b.level]),
  };
}

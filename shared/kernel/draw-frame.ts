import { radiusAtHeight } from './cutters/radius-at-height.ts';
import type { Finding } from './checks/finding.ts';
import { membersContours } from './frame/members-contours.ts';
import { outlineDado } from './frame/outline-dado.ts';
import { tracedContours } from './frame/traced-contours.ts';
import { dadoLineSets } from './line-sets/dado-line-sets.ts';
import { frontLineSets, type FrontLineSets } from './line-sets/front-line-sets.ts';
import { squaringLineSet } from './line-sets/outer-line-sets.ts';
import type { Particulars } from './particulars/particulars.ts';
import { placeLineSets } from './placing/place-line-sets.ts';
import { planBlank } from './placing/plan-blank.ts';
import { squaringLine } from './placing/squaring-line.ts';
import type { DrawnFrame } from './worked-frame.ts';

/** A drawn frame with what the checks want to know of how it was made. */
export interface FrameLines extends DrawnFrame {
  readonly outlineFindings: readonly Finding[];
  /** In frame view, with the openings and beads that could not be made. */
  readonly frontLines: FrontLineSets;
}

/** Radius of the dado cutter, frame's unit. */
export const dadoRadius = (p: Particulars): number => radiusAtHeight(p.cutters.dado, p.thickness);

/**
 * The pipeline up to the lines: particulars → members solved → contours → line sets per face → placed on the blank. This
 * much has to be there with each keystroke. Pure; bad geometry never throws: the lines concerned are missing.
 */
export function drawFrame(p: Particulars): FrameLines {
  const { contours, findings: outlineFindings } =
    p.outline.kind === 'members' ? membersContours(p.outline, p.unit) : tracedContours(p.outline);
  const radius = dadoRadius(p);
  const dados = p.dados.map((dado, i) => outlineDado(dado, i, radius));
  const frontLines = frontLineSets(p, contours);
  const blank = planBlank(contours.width, contours.height, p.setup, p.blank);
  const squaringRadius = radiusAtHeight(p.cutters.squaring, p.thickness);
  const squaring = squaringLineSet(p, squaringLine(blank, contours.width, contours.height, p.setup, squaringRadius));
  return {
    particulars: p,
    contours,
    dados,
    blank,
    back: placeLineSets('back', blank.back, blank.rough, dadoLineSets(p, dados), [squaring]),
    front: placeLineSets('front', blank.front, blank.squared, frontLines.lineSets, []),
    outlineFindings,
    frontLines,
  };
}

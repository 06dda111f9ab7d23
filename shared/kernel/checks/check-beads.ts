import { containsPoint } from '../contour/contains-point.ts';
import type { Contour } from '../contour/contour.ts';
import { findMeeting } from '../contour/find-crossing.ts';
import { rectangle } from '../contour/make-contour.ts';
import { offsetContour } from '../contour/offset-contour.ts';
import { segmentDistance } from '../contour/segment-distance.ts';
import { segmentsOf } from '../contour/segments.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { FrameContours, Opening } from '../frame/members.ts';
import { beadCutters, type BeadCutters, type BeadProblem } from '../line-sets/bead-line-sets.ts';
import type { FrontLineSets } from '../line-sets/front-line-sets.ts';
import { beadBase } from '../line-sets/held-depth.ts';
import type { BeadedEdge, Particulars } from '../particulars/particulars.ts';
import { cornerVeePass, sectionPasses } from '../section/section-passes.ts';
import { sectionDifference } from '../section/section-difference.ts';
import { beadShave, DEEPEST_DADO, leastUnderBead, SAME } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Finding } from './finding.ts';
import { atDado, atOpening, wholeFrame } from './place-finding.ts';

/** A bead that cannot be, or not as entered. Nothing for square edges. */
export function checkBeads(
  p: Particulars,
  contours: FrameContours,
  front: FrontLineSets,
  dados: readonly DadoOutline[],
): Finding[] {
  const { edge } = p;
  const beaded = contours.openings.filter((o) => !o.square);
  const cutters = beadCutters(p.cutters);
  if (edge.style !== 'beaded' || beaded.length === 0 || !cutters) return [];
  return [
    ...checkBeadDepth(p, edge, contours),
    ...checkBeadCutters(p, edge, cutters, contours),
    ...front.beadProblems.map((problem) => collapseFinding(problem, p.unit)),
    ...checkFaceBetween(p, edge, beaded, contours, front.cut.atPlane),
    ...checkUnderBead(p, edge, beaded, dados),
    ...checkShave(p, edge, beaded),
  ];
}

/** A quirk is a groove in the face: it may take as much of the board as a dado. */
function checkBeadDepth(p: Particulars, edge: BeadedEdge, contours: FrameContours): Finding[] {
  const [depth, most] = [beadBase(edge), p.thickness * DEEPEST_DADO];
  if (depth <= most + SAME) return [];
  return [
    {
      code: 'bead-too-deep',
      level: 'stop',
      text: `Bead and quirk go ${formatWithUnit(depth, p.unit)} deep into a board of ${formatWithUnit(p.thickness, p.unit)}.`,
      remedy: `Take a smaller bead, or set it less far below the face: ${formatWithUnit(most, p.unit)} together at most.`,
      numbers: { depth, most },
      places: [wholeFrame(contours, 'front')],
      field: 'edge.bead.radius',
    },
  ];
}

function checkBeadCutters(
  p: Particulars,
  edge: BeadedEdge,
  { bead, quirk, corner }: BeadCutters,
  contours: FrameContours,
): Finding[] {
  const say = (n: number) => formatWithUnit(n, p.unit);
  const places = [wholeFrame(contours, 'front')];
  const { radius: R, quirk: q } = edge.bead;
  const findings: Finding[] = [];
  if (Math.abs(bead.profileRadius - R) > SAME)
    findings.push({
      code: 'bead-cutter-differs',
      level: 'stop',
      text: `The beading cutter’s profile radius is ${say(bead.profileRadius)}; the bead entered is ${say(R)}.`,
      remedy: 'Enter the cutter’s radius as the bead’s, or take the cutter that fits.',
      numbers: { profileRadius: bead.profileRadius, radius: R },
      places,
      field: 'edge.bead.radius',
    });
  if (quirk.diameter > q + SAME)
    findings.push({
      code: 'quirk-narrower-than-cutter',
      level: 'stop',
      text: `The quirk is ${say(q)} wide; its cutter is ${say(quirk.diameter)}.`,
      remedy: 'Widen the quirk or take a smaller cutter.',
      numbers: { quirk: q, diameter: quirk.diameter },
      places,
      field: 'edge.bead.quirk',
    });
  const vee = 2 * radiusAtHeight(corner, beadBase(edge));
  if (vee > q + SAME)
    findings.push({
      code: 'vee-over-bead',
      level: 'stop',
      text: `The V-cutter is ${say(vee)} wide at the face when it reaches the quirk’s floor; the quirk is ${say(q)}: it would cut the bead.`,
      remedy: 'Take a V-cutter with a smaller angle, or widen the quirk.',
      numbers: { vee, quirk: q },
      places,
      field: 'cutters.corner.includedAngle',
    });
  const scar = bead.tipFlat + R - q;
  if (scar > SAME)
    findings.push({
      code: 'quirk-scar',
      level: 'caution',
      text: `The bead’s frame-side pass reaches ${say(scar)} beyond the quirk and scars the face.`,
      remedy: `Widen the quirk to ${say(bead.tipFlat + R)}, or take a beading cutter with a smaller tip flat.`,
      numbers: { scar, wanted: bead.tipFlat + R },
      places,
      field: 'edge.bead.quirk',
    });
  return findings;
}

const LINES: Partial<Record<BeadProblem['set'], string>> = {
  BEAD_INNER: 'bead, opening side',
  BEAD_OUTER: 'bead, frame side',
  QUIRK: 'quirk',
  QUIRK_CORNER: 'quirk’s outer wall',
};

const collapseFinding = ({ opening, set, offset, reason, at, radius }: BeadProblem, unit: Unit): Finding => ({
  code: 'bead-collapses',
  level: 'stop',
  text: `Opening ${opening.label}: the line ${LINES[set]}, ${formatWithUnit(offset, unit)} from the opening’s edge, ${
    reason === 'arc'
      ? `has no room beside an arc of radius ${formatWithUnit(radius ?? 0, unit)}`
      : reason === 'crosses'
        ? 'crosses itself'
        : 'loses a side'
  }.`,
  remedy: 'Take a smaller bead or quirk, make the arc larger, or keep this opening’s edge square.',
  numbers: { offset, ...(radius === undefined ? {} : { radius }) },
  places: [{ face: 'front', features: [opening.id], extents: { minX: at.x, minY: at.y, maxX: at.x, maxY: at.y } }],
});

function leastDistance(a: Contour, b: Contour): number {
  let least = Infinity;
  const others = segmentsOf(b);
  for (const s of segmentsOf(a)) for (const t of others) least = Math.min(least, segmentDistance(s, t));
  return least;
}

interface Border {
  readonly name: string;
  readonly opening?: Opening;
  /** The line up to which the board is worked; the perimeter, or the quirk's outer wall of an opening. */
  readonly contour: Contour;
}

/** Face must be left between the quirks of two openings, and between a quirk and the frame's edge. */
function checkFaceBetween(
  p: Particulars,
  edge: BeadedEdge,
  beaded: readonly Opening[],
  contours: FrameContours,
  atPlane: number,
): Finding[] {
  const wallOf = (o: Opening): Contour | undefined => {
    const wall = offsetContour(o.contour, atPlane + 2 * edge.bead.radius + edge.bead.quirk);
    return wall.ok ? wall.contour : undefined;
  };
  const walls = beaded.flatMap((opening): Border[] => {
    const contour = wallOf(opening);
    return contour ? [{ name: `opening ${opening.label}`, opening, contour }] : [];
  });
  const others: Border[] = [
    ...contours.openings
      .filter((o) => o.square)
      .map((opening) => ({ name: `opening ${opening.label}`, opening, contour: opening.contour })),
    { name: 'the frame’s edge', contour: contours.perimeter },
  ];
  const findings: Finding[] = [];
  walls.forEach((wall, i) => {
    for (const other of [...walls.slice(i + 1), ...others]) {
      const inside = other.opening
        ? containsPoint(wall.contour, other.contour.vertices[0]!) ||
          containsPoint(other.contour, wall.contour.vertices[0]!)
        : !containsPoint(other.contour, wall.contour.vertices[0]!);
      if (!inside && !findMeeting(wall.contour, other.contour)) continue;
      const between = leastDistance(wall.opening!.contour, other.opening?.contour ?? other.contour);
      findings.push({
        code: 'no-face-between',
        level: 'stop',
        text: `Bead and quirk leave no face between opening ${wall.opening!.label} and ${other.name}: ${formatWithUnit(between, p.unit)} of board is there.`,
        remedy: 'Make the member wider, or the bead or quirk smaller.',
        numbers: { between },
        places: [atOpening(wall.opening!), ...(other.opening ? [atOpening(other.opening)] : [])],
        field: 'edge.bead.quirk',
      });
    }
  });
  return findings;
}

/** Dados whose floor comes near the bead or quirk above them. */
function checkUnderBead(
  p: Particulars,
  edge: BeadedEdge,
  beaded: readonly Opening[],
  dados: readonly DadoOutline[],
): Finding[] {
  const least = leastUnderBead(p.unit);
  const reach = 2 * edge.bead.radius + edge.bead.quirk;
  return dados.flatMap((dado) => {
    const left = p.thickness - beadBase(edge) - dado.depth;
    if (left >= least - SAME) return [];
    const box = rectangle(dado.extents);
    const above = beaded.filter((o) => leastDistance(box, o.contour) < reach - SAME);
    if (above.length === 0) return [];
    return [
      {
        code: 'thin-under-bead',
        level: 'caution',
        text: `Dado ${dado.part} leaves ${formatWithUnit(left, p.unit)} of board under the bead or quirk of opening ${above.map((o) => o.label).join(', ')}.`,
        remedy: `Make the dado shallower or move it, so that ${formatWithUnit(least, p.unit)} is left.`,
        numbers: { left },
        places: [atDado(dado), ...above.map((o) => atOpening(o))],
        field: `dados.${dado.index}.depth`,
      } satisfies Finding,
    ];
  });
}

/** The opening cutter's flank, or another pass, cutting into the entered bead; and the V-cutter of the corners, there. */
function checkShave(p: Particulars, edge: BeadedEdge, beaded: readonly Opening[]): Finding[] {
  const passes = sectionPasses(p, edge);
  const vee = cornerVeePass(p, edge);
  const all = sectionDifference(p, edge, passes);
  const worst = Math.max(all.below, all.above);
  const places = beaded.map((o) => atOpening(o));
  const common = { code: 'bead-shaved', level: 'caution', places } as const;
  const findings: Finding[] = [];
  if (worst > beadShave(p.unit))
    findings.push({
      ...common,
      text:
        all.below >= all.above
          ? `A cutter’s flank takes ${formatWithUnit(all.below, p.unit)} off the bead, measured straight down, ${formatWithUnit(all.belowAt, p.unit)} from the opening’s edge.`
          : `The cutters leave ${formatWithUnit(all.above, p.unit)} standing on the bead.`,
      remedy: 'Take an opening cutter with a smaller side angle, or a straight one; look at the section.',
      numbers: { below: all.below, above: all.above, belowAt: all.belowAt },
      field: 'cutters.opening',
    });
  const inCorners = vee ? sectionDifference(p, edge, [...passes, vee]).below : 0;
  if (inCorners > Math.max(all.below, beadShave(p.unit)))
    findings.push({
      ...common,
      text: `In the corners the V-cutter’s flank takes ${formatWithUnit(inCorners, p.unit)} off the bead, measured straight down.`,
      remedy: 'Take a V-cutter with a smaller angle, or let the opening cutter alone climb into the corners.',
      numbers: { below: inCorners },
      field: 'edge.corners',
    });
  return findings;
}

import { containsPoint } from '../contour/contains-point.ts';
import { findMeeting } from '../contour/find-crossing.ts';
import type { FrameContours, Opening } from '../frame/members.ts';
import type { OpeningCut } from '../line-sets/opening-cut.ts';
import type { OpeningProblem } from '../line-sets/opening-line-sets.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Finding } from './finding.ts';
import { atOpening } from './place-finding.ts';

/** Openings that cannot be cut with their cutter. */
export function checkOpeningCuts(problems: readonly OpeningProblem[], cut: OpeningCut, unit: Unit): Finding[] {
  const axis = formatWithUnit(cut.axisOffset, unit);
  return problems.map(({ opening, reason, at, radius }): Finding => {
    const place = {
      face: 'front',
      features: [opening.id],
      extents: { minX: at.x, minY: at.y, maxX: at.x, maxY: at.y },
    } as const;
    const common = {
      level: 'stop',
      numbers: { axisOffset: cut.axisOffset, ...(radius === undefined ? {} : { radius }) },
    } as const;
    switch (reason) {
      case 'small':
        return {
          ...common,
          code: 'opening-smaller-than-cutter',
          text: `Opening ${opening.label} is ${formatWithUnit(Math.min(opening.width, opening.height), unit)} across; its cutter takes ${formatWithUnit(2 * cut.axisOffset, unit)}.`,
          remedy: 'Make the opening larger or take a smaller cutter.',
          places: [atOpening(opening)],
        };
      case 'arc':
        return {
          ...common,
          code: 'arc-smaller-than-cutter',
          text: `Opening ${opening.label} has an arc of radius ${formatWithUnit(radius ?? 0, unit)}; the cutter’s axis runs ${axis} inside it.`,
          remedy: 'Make the arc’s radius larger, make it a sharp corner, or take a smaller cutter.',
          places: [place],
        };
      default:
        return {
          ...common,
          code: 'offset-collapses',
          text: `Opening ${opening.label}: the cutter’s axis, ${axis} inside the line, ${reason === 'crosses' ? 'crosses itself' : 'loses a side'} at the marked place.`,
          remedy: 'Widen the opening there, take out small steps of its line, or take a smaller cutter.',
          places: [place],
        };
    }
  });
}

/** Openings outside the perimeter, through it, or over one another. */
export function checkOpeningPlaces({ perimeter, openings }: FrameContours): Finding[] {
  const findings: Finding[] = [];
  for (const o of openings) {
    if (!findMeeting(o.contour, perimeter) && containsPoint(perimeter, o.contour.vertices[0]!)) continue;
    findings.push({
      code: 'opening-outside-perimeter',
      level: 'stop',
      text: `Opening ${o.label} is not wholly inside the perimeter.`,
      remedy: 'Move the opening or the perimeter.',
      numbers: {},
      places: [atOpening(o)],
    });
  }
  for (let i = 0; i < openings.length; i++)
    for (let j = i + 1; j < openings.length; j++)
      if (overlap(openings[i]!, openings[j]!)) findings.push(overlapFinding(openings[i]!, openings[j]!));
  return findings;
}

function overlap(a: Opening, b: Opening): boolean {
  const p = a.extents;
  const q = b.extents;
  if (p.minX > q.maxX || q.minX > p.maxX || p.minY > q.maxY || q.minY > p.maxY) return false;
  return (
    findMeeting(a.contour, b.contour) !== undefined ||
    containsPoint(a.contour, b.contour.vertices[0]!) ||
    containsPoint(b.contour, a.contour.vertices[0]!)
  );
}

const overlapFinding = (a: Opening, b: Opening): Finding => ({
  code: 'openings-overlap',
  level: 'stop',
  text: `Openings ${a.label} and ${b.label} lie over one another or touch.`,
  remedy: 'Move one of them.',
  numbers: {},
  places: [atOpening(a), atOpening(b)],
});

import type { Contour, Extents } from '../contour/contour.ts';
import { polygon, rectangle } from '../contour/make-contour.ts';
import type { Finding } from '../checks/finding.ts';
import type { MembersOutline } from '../particulars/particulars.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { FrameContours, Member, Opening } from './members.ts';
import { openingContour } from './opening-contour.ts';
import { openingLabel } from './opening-label.ts';
import { solveLayout, type LayoutMisfit, type SolvedBetween, type SolvedOpening } from './solve-layout.ts';

export interface SolvedFrame {
  readonly contours: FrameContours;
  readonly findings: readonly Finding[];
}

/** A members outline solved into lines, frame view. What does not add up is a stop, and the openings concerned are left out. */
export function membersContours(outline: MembersOutline, unit: Unit): SolvedFrame {
  const { width, height, stiles, rails, feet } = outline;
  const findings: Finding[] = [];
  const whole: Extents = { minX: 0, minY: 0, maxX: width, maxY: height };
  const space: Extents = {
    minX: stiles.left,
    maxX: width - stiles.right,
    minY: feet + rails.bottom,
    maxY: height - rails.top,
  };
  const shortX = space.minX - space.maxX;
  const shortY = space.minY - space.maxY;
  if (shortX >= 0) findings.push(noRoom('stiles', 'width', width, shortX, whole, 'outline.width', unit));
  if (shortY >= 0)
    findings.push(
      noRoom(feet > 0 ? 'rails and feet' : 'rails', 'height', height, shortY, whole, 'outline.height', unit),
    );
  if (findings.length > 0)
    return { contours: { width, height, perimeter: rectangle(whole), openings: [], members: [] }, findings };

  const solved = solveLayout(outline.layout, space);
  for (const misfit of solved.misfits) findings.push(misfitFinding(misfit, unit));
  const openings: Opening[] = [];
  solved.openings.forEach((opening, i) => {
    const made = makeOpening(opening, i, unit);
    if ('code' in made) findings.push(made);
    else openings.push(made);
  });
  return {
    contours: {
      width,
      height,
      perimeter: perimeterOf(outline),
      openings,
      members: [...outerMembers(outline), ...solved.betweens.map(betweenMember)],
    },
    findings,
  };
}

/** The outer contour; with feet it is notched between the stiles. */
function perimeterOf({ width, height, stiles, feet }: MembersOutline): Contour {
  if (feet === 0) return rectangle({ minX: 0, minY: 0, maxX: width, maxY: height });
  const left = stiles.left;
  const right = width - stiles.right;
  return polygon([
    { x: 0, y: 0 },
    { x: left, y: 0 },
    { x: left, y: feet },
    { x: right, y: feet },
    { x: right, y: 0 },
    { x: width, y: 0 },
    { x: width, y: height },
    { x: 0, y: height },
  ]);
}

function outerMembers({ width, height, stiles, rails, feet }: MembersOutline): Member[] {
  const inner = { minX: stiles.left, maxX: width - stiles.right };
  const stile = (side: 'left' | 'right', minX: number, maxX: number): Member => ({
    id: `stile-${side}`,
    kind: 'stile',
    label: side === 'left' ? 'Left stile' : 'Right stile',
    extents: { minX, maxX, minY: 0, maxY: height },
    width: stiles[side],
    length: height,
  });
  const rail = (side: 'top' | 'bottom', minY: number, maxY: number): Member => ({
    id: `rail-${side}`,
    kind: 'rail',
    label: side === 'top' ? 'Top rail' : 'Bottom rail',
    extents: { ...inner, minY, maxY },
    width: rails[side],
    length: inner.maxX - inner.minX,
  });
  return [
    stile('left', 0, stiles.left),
    stile('right', width - stiles.right, width),
    rail('top', height - rails.top, height),
    rail('bottom', feet, feet + rails.bottom),
  ];
}

function betweenMember({ path, kind, index, extents }: SolvedBetween): Member {
  const x = extents.maxX - extents.minX;
  const y = extents.maxY - extents.minY;
  return {
    id: `between-${[...path, index].join('.')}`,
    kind,
    label: kind === 'mid-stile' ? 'Mid-stile' : 'Mid-rail',
    extents,
    width: kind === 'mid-stile' ? x : y,
    length: kind === 'mid-stile' ? y : x,
    path,
  };
}

function makeOpening({ part, path, extents }: SolvedOpening, index: number, unit: Unit): Opening | Finding {
  const arch = part.opening.arch ?? 0;
  const label = part.opening.label ?? openingLabel(index);
  const width = extents.maxX - extents.minX;
  const height = extents.maxY - extents.minY;
  if (arch > width / 2 || arch >= height) {
    const most = Math.min(width / 2, height);
    return {
      code: 'arch-unfit',
      level: 'stop',
      text: `The arch of opening ${label} rises ${formatWithUnit(arch, unit)}; the opening has room for ${formatWithUnit(most, unit)} at most.`,
      remedy: 'Make the arch lower: at most half the opening’s width, and less than its height.',
      numbers: { arch, most },
      places: [{ face: 'both', features: [`opening-${index}`], extents }],
      field: fieldOfPath(path, 'opening.arch'),
    };
  }
  return {
    id: `opening-${index}`,
    label,
    contour: openingContour(extents, arch),
    extents,
    width,
    height,
    arch,
    square: part.opening.edge === 'square',
    path,
  };
}

/** Path of an entry of the layout tree within the particulars: steps do not say whether they are columns or rows, so both ends agree on "at". */
const fieldOfPath = (path: readonly number[], entry: string) =>
  ['outline.layout', ...path.map(String), entry].join('.');

function misfitFinding({ path, along, over, extents }: LayoutMisfit, unit: Unit): Finding {
  const parts = along === 'width' ? 'Columns and mid-stiles' : 'Rows and mid-rails';
  const much = formatWithUnit(Math.abs(over), unit);
  return {
    code: 'members-do-not-add-up',
    level: 'stop',
    text:
      over > 0
        ? `${parts} are ${much} too long for the ${along} they share.`
        : over < 0
          ? `${parts} are ${much} short of the ${along} they share.`
          : `${parts} leave nothing of the ${along} for the parts without a size.`,
    remedy: `Take ${much} ${over > 0 ? 'off' : 'onto'} one of them, or leave one part without a size: it takes what is left.`,
    numbers: { over },
    places: [{ face: 'both', features: [], extents }],
    field: fieldOfPath(path, along === 'width' ? 'columns' : 'rows'),
  };
}

function noRoom(
  members: string,
  along: string,
  size: number,
  short: number,
  extents: Extents,
  field: string,
  unit: Unit,
): Finding {
  return {
    code: 'members-do-not-add-up',
    level: 'stop',
    text: `The ${members} together are ${short > 0 ? `${formatWithUnit(short, unit)} more than` : 'all of'} the ${along} of ${formatWithUnit(size, unit)}: nothing is left for openings.`,
    remedy: `Make the ${members} narrower or the ${along} greater.`,
    numbers: { over: short },
    places: [{ face: 'both', features: [], extents }],
    field,
  };
}

import { tidyLength } from '../../box/tidy-length.ts';
import type { Contour } from '../../contour/contour.ts';
import { joinExtents } from '../../contour/contour-extents.ts';
import { membersContours } from '../../frame/members-contours.ts';
import { openingLabel } from '../../frame/opening-label.ts';
import { tracedContours } from '../../frame/traced-contours.ts';
import type { MembersOutline, OpeningPart, TracedOutline } from '../../particulars/particulars.ts';
import type { Unit } from '../../units/unit.ts';
import { contoursAgree } from './contours-agree.ts';
import { findLayout, type Leaf } from './find-layout.ts';
import { EXACT_SHARE, membersAgree } from './frames-tolerances.ts';
import type { MembersProblem } from './members-problem.ts';
import { readOpening, type ReadOpening } from './read-opening.ts';
import { readPerimeter } from './read-perimeter.ts';

export type MembersFromTraced =
  { readonly ok: true; readonly outline: MembersOutline } | { readonly ok: false; readonly problem: MembersProblem };

const refused = (code: MembersProblem['code'], message: string, opening?: number): MembersFromTraced => ({
  ok: false,
  problem: { code, message, ...(opening === undefined ? {} : { opening }) },
});

const leafOf = ({ extents, arch }: ReadOpening, index: number, square: boolean): Leaf => {
  const opening: OpeningPart['opening'] = {
    label: openingLabel(index),
    ...(arch > 0 ? { arch: tidyLength(arch) } : {}),
    ...(square ? { edge: 'square' as const } : {}),
  };
  return { extents, part: { opening } };
};

/**
 * A traced frame as stiles, rails and a layout of openings: its perimeter a rectangle, with feet or without, its openings
 * rectangles, arched or not, that straight cuts part. Openings keep the labels that they have as traced ones. The members, solved
 * again, are the traced contours within `membersAgree`; anything else comes back as a problem.
 */
export function membersFromTraced(traced: TracedOutline, unit: Unit): MembersFromTraced {
  const within = membersAgree(unit);
  const { contours, findings } = tracedContours(traced);
  if (findings[0]) return refused('outline-unsound', findings[0].text);
  const outer = readPerimeter(contours.perimeter, within);
  if (!outer)
    return refused(
      'perimeter-no-rectangle',
      'The perimeter is neither a rectangle nor one with a notch between two feet.',
    );
  const openings: ReadOpening[] = [];
  for (const { contour, label } of contours.openings) {
    const read = readOpening(contour, within);
    if (!read)
      return refused(
        'opening-no-rectangle',
        `Opening ${label} is neither an upright rectangle nor one with an arc for a head.`,
        openings.length,
      );
    openings.push(read);
  }
  const [first, ...rest] = openings;
  if (!first) return refused('no-openings', 'There is no opening, so there are no stiles and rails.');
  const space = joinExtents(first.extents, ...rest.map(({ extents }) => extents));
  const left = space.minX;
  const right = outer.width - space.maxX;
  if (outer.feet > 0 && (Math.abs(outer.left - left) > within || Math.abs(outer.right - right) > within))
    return refused('feet-beside-stiles', 'The feet are not as wide as the stiles above them.');
  const leaves = openings.map((opening, i) => leafOf(opening, i, traced.squareOpenings?.includes(i) ?? false));
  let problem = refused('no-layout', 'The openings are not columns and rows that straight stiles and rails part.');
  // Exactly first: what is nearly columns may be rows without any error.
  for (const tolerance of [within * EXACT_SHARE, within]) {
    const layout = findLayout(leaves, space, tolerance);
    if (!layout) continue;
    const outline: MembersOutline = {
      kind: 'members',
      width: tidyLength(outer.width),
      height: tidyLength(outer.height),
      stiles: { left: tidyLength(left), right: tidyLength(right) },
      rails: { top: tidyLength(outer.height - space.maxY), bottom: tidyLength(space.minY - outer.feet) },
      feet: tidyLength(outer.feet),
      layout,
    };
    if (agrees(outline, contours.perimeter, contours.openings, unit, within)) return { ok: true, outline };
    problem = refused('does-not-agree', 'Made of stiles and rails the frame would not be the one that was drawn.');
  }
  return problem;
}

/** Whether the members, solved, are the contours they were read from. */
function agrees(
  outline: MembersOutline,
  perimeter: Contour,
  openings: readonly { readonly label: string; readonly contour: Contour }[],
  unit: Unit,
  within: number,
): boolean {
  const solved = membersContours(outline, unit);
  if (solved.findings.length > 0 || solved.contours.openings.length !== openings.length) return false;
  const made = new Map(solved.contours.openings.map(({ label, contour }) => [label, contour]));
  return (
    contoursAgree(solved.contours.perimeter, perimeter, within) &&
    openings.every(({ label, contour }) => {
      const same = made.get(label);
      return same !== undefined && contoursAgree(same, contour, within);
    })
  );
}

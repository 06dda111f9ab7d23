import type { CutterKind, CutterRole } from '../cutters/cutter.ts';
import type { FrameContours } from '../frame/members.ts';
import type { LineSet } from '../line-sets/line-set.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { formatWithUnit } from '../units/format-length.ts';
import { SAME } from '../tolerances.ts';
import type { Finding } from './finding.ts';
import { wholeFrame } from './place-finding.ts';

export const FIT: Record<CutterRole, readonly CutterKind[]> = {
  dado: ['straight'],
  squaring: ['straight'],
  opening: ['straight', 'tapered', 'vee'],
  perimeter: ['straight'],
  bead: ['beading'],
  quirk: ['straight'],
  corner: ['vee'],
};

export const ROLE_WORDS: Record<CutterRole, string> = {
  dado: 'dado',
  squaring: 'squaring',
  opening: 'opening',
  perimeter: 'perimeter',
  bead: 'bead',
  quirk: 'quirk',
  corner: 'corner',
};

/** Cutters of a kind that cannot do their work. Only cutters with work to do are looked at. */
export function checkCutterKinds(p: Particulars, contours: FrameContours): Finding[] {
  const used: CutterRole[] = ['squaring', 'perimeter'];
  if (p.dados.length > 0) used.push('dado');
  if (contours.openings.length > 0) used.push('opening');
  if (p.edge.style === 'beaded' && contours.openings.some((o) => !o.square)) used.push('bead', 'quirk', 'corner');
  else if (p.edge.corners === 'vee' && contours.openings.length > 0) used.push('corner');
  return used.flatMap((role) => {
    const cutter = p.cutters[role];
    const kinds = FIT[role];
    if (cutter && kinds.includes(cutter.kind)) return [];
    return [
      {
        code: 'cutter-unfit',
        level: 'stop',
        text: `${cutter ? `The ${ROLE_WORDS[role]} cutter is ${cutter.kind === 'vee' ? 'a V-cutter' : `a ${cutter.kind} one`}` : `There is no ${ROLE_WORDS[role]} cutter`}; this work takes a ${kinds.join(' or ').replace('vee', 'V')} cutter.`,
        remedy: 'Choose another cutter for it.',
        numbers: {},
        places: [wholeFrame(contours, role === 'dado' || role === 'squaring' ? 'back' : 'front')],
        field: cutter ? `cutters.${role}.kind` : `cutters.${role}`,
      } satisfies Finding,
    ];
  });
}

/** Cuts deeper than their cutter's flute is long. */
export function checkFlutes(p: Particulars, contours: FrameContours, lineSets: readonly LineSet[]): Finding[] {
  const deepest = new Map<CutterRole, LineSet>();
  for (const set of lineSets) {
    if (set.cutter === null) continue;
    const known = deepest.get(set.cutter);
    if (!known || known.depth < set.depth) deepest.set(set.cutter, set);
  }
  return [...deepest].flatMap(([role, { depth, face }]) => {
    const flute = p.cutters[role]!.fluteLength;
    if (flute >= depth - SAME) return [];
    return [
      {
        code: 'flute-too-short',
        level: 'stop',
        text: `The ${ROLE_WORDS[role]} cutter’s flute is ${formatWithUnit(flute, p.unit)} long; the cut is ${formatWithUnit(depth, p.unit)} deep.`,
        remedy: `Take a cutter with a flute of at least ${formatWithUnit(depth, p.unit)}.`,
        numbers: { flute, depth },
        places: [wholeFrame(contours, face)],
        field: `cutters.${role}.fluteLength`,
      } satisfies Finding,
    ];
  });
}

import type { EntityFate } from '#shared/kernel/tracing/found-drawing.ts';
import type { LoopRole } from '#shared/kernel/tracing/frames/loop-role.ts';
import type { NoticeLevel } from '../../../ui/notice.tsx';

export const ROLE_WORDS: Record<LoopRole, string> = {
  perimeter: 'Perimeter',
  opening: 'Opening',
  dado: 'Dado',
  'leave-out': 'Leave out',
};

export const ROLE_OPTIONS = (Object.entries(ROLE_WORDS) as [LoopRole, string][]).map(([value, label]) => ({
  value,
  label,
}));

export const FATE_WORDS: Record<EntityFate, string> = { kept: 'Kept', aside: 'Set aside', refused: 'Refused' };

/** Why entities are set aside or refused; stable codes of the reader. */
const REASON_WORDS: Readonly<Record<string, string>> = {
  text: 'text',
  dimension: 'dimension or leader',
  hatch: 'hatch or fill',
  point: 'point',
  picture: 'picture or underlay',
  'construction-line': 'endless construction line',
  viewport: 'viewport',
  'paper-space': 'in paper space',
  invisible: 'invisible',
  'layer-off': 'layer is off',
  'layer-frozen': 'layer is frozen',
  'layer-left-out': 'you left its layer out',
  'empty-block': 'nothing in its block is kept',
  'no-length': 'of no length',
  'not-a-number': 'a number that is none',
  'missing-number': 'a number is missing',
  'not-a-pair': 'a group code that is none',
  'three-dimensional': 'solid, face or mesh',
  'not-flat': 'not all at one height',
  tilted: 'not in the XY plane',
  'unknown-entity': 'a type that is not read',
  'stray-part': 'part without its beginning',
  'bad-size': 'radius, scale or count not above 0',
  'out-of-range': 'too far from the origin',
  'cut-off': 'the file ends within it',
  'spline-data': 'spline data that do not fit',
  'curve-lost': 'a curve that arcs cannot follow',
  'block-missing': 'its block is missing',
  'block-external': 'its block is in another file',
  'block-cycle': 'its block holds itself',
  'block-bomb': 'its block unfolds too far',
  'block-too-deep': 'too many blocks in blocks',
};

export const sayReason = (reason: string): string => REASON_WORDS[reason] ?? reason.replaceAll('-', ' ');

/** How a problem is marked: its colour, and always a word. */
export interface ProblemLook {
  readonly level: NoticeLevel;
  readonly word: string;
}

const OPEN: ProblemLook = { level: 'stop', word: 'Open' };
const NOTE: ProblemLook = { level: 'note', word: 'Note' };
const CAUTION: ProblemLook = { level: 'caution', word: 'Caution' };

const LOOKS: Readonly<Record<string, ProblemLook>> = {
  'left-open': OPEN,
  'gap-ambiguous': OPEN,
  incomplete: { level: 'stop', word: 'Not whole' },
  'no-entities': { level: 'stop', word: 'Empty' },
  'gap-closed': NOTE,
  'inside-an-opening': NOTE,
  'touches-the-outline': NOTE,
  'only-round-cells': NOTE,
  flattened: NOTE,
  'spline-fitted': NOTE,
  'ellipse-fitted': NOTE,
};

export const problemLook = (code: string): ProblemLook => LOOKS[code] ?? CAUTION;

export const loopName = (i: number): string => `Loop ${i + 1}`;

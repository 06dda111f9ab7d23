import type { NumberColumn } from '#shared/kernel/cutter-drawer/cutter-columns.ts';
import type { CutterKind, CutterRole } from '#shared/kernel/cutters/cutter.ts';

export const KIND_WORDS: Record<CutterKind, string> = {
  straight: 'Straight',
  tapered: 'Tapered',
  vee: 'V',
  beading: 'Beading',
};

export const ROLE_WORDS: Record<CutterRole, string> = {
  dado: 'dados',
  squaring: 'squaring edge',
  opening: 'openings',
  perimeter: 'perimeter',
  bead: 'bead',
  quirk: 'quirk',
  corner: 'corners',
};

type NumberEntry = NumberColumn['entry'];

export const NUMBER_WORDS: Record<NumberEntry, string> = {
  number: 'Number in the machine',
  diameter: 'Diameter',
  includedAngle: 'Included angle',
  tipRadius: 'Tip radius',
  sideAngle: 'Angle of a side',
  profileRadius: 'Profile radius',
  tipFlat: 'Tip flat',
  fluteLength: 'Flute length',
  maxPass: 'Deepest pass',
};

/** Entries that are no length: degrees, or a plain number. */
export const NO_LENGTH: readonly NumberEntry[] = ['number', 'includedAngle', 'sideAngle'];

const isNumberEntry = (entry: string): entry is NumberEntry => entry in NUMBER_WORDS;

/** Name of an entry that was changed, as draftsTouched tells it. */
export const changeWords = (entry: string): string =>
  isNumberEntry(entry) ? NUMBER_WORDS[entry].toLowerCase() : entry;

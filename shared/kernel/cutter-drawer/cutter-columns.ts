import type { CutterKind } from '../cutters/cutter.ts';

/** A column of the cutters' CSV that holds a number: the entry of a cutter that it fills, and the kinds that have it. */
export interface NumberColumn {
  readonly heading: string;
  readonly entry:
    | 'number'
    | 'diameter'
    | 'includedAngle'
    | 'tipRadius'
    | 'sideAngle'
    | 'profileRadius'
    | 'tipFlat'
    | 'fluteLength'
    | 'maxPass';
  /** All kinds when absent. */
  readonly kinds?: readonly CutterKind[];
}

export const NUMBER_COLUMNS: readonly NumberColumn[] = [
  { heading: 'number', entry: 'number' },
  { heading: 'diameter', entry: 'diameter', kinds: ['straight'] },
  { heading: 'included angle', entry: 'includedAngle', kinds: ['vee'] },
  { heading: 'tip radius', entry: 'tipRadius', kinds: ['tapered'] },
  { heading: 'side angle', entry: 'sideAngle', kinds: ['tapered'] },
  { heading: 'profile radius', entry: 'profileRadius', kinds: ['beading'] },
  { heading: 'tip flat', entry: 'tipFlat', kinds: ['beading'] },
  { heading: 'flute length', entry: 'fluteLength' },
  { heading: 'max pass', entry: 'maxPass' },
];

/** The header row, in the order in which it is written; it may be read in any. */
export const CUTTER_HEADINGS: readonly string[] = [
  'name',
  'unit',
  'kind',
  ...NUMBER_COLUMNS.map((c) => c.heading),
  'remarks',
];

/** Columns that a file must have; the others may be left out where no cutter needs them. */
export const NEEDED_HEADINGS: readonly string[] = ['name', 'unit', 'kind', 'flute length'];

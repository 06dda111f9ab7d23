import { CUTTER_HEADINGS, NUMBER_COLUMNS } from './cutter-columns.ts';
import type { DrawerEntry } from './drawer-cutter.ts';
import { plainNumber } from '../csv/plain-number.ts';
import { writeCsvLine } from '../csv/write-csv-line.ts';

function cellsOf({ unit, cutter, remarks }: DrawerEntry): string[] {
  const numbers: Readonly<Record<string, unknown>> = { ...cutter };
  const cells = NUMBER_COLUMNS.map(({ entry }) => {
    const value = numbers[entry];
    return typeof value === 'number' ? plainNumber(value) : '';
  });
  return [cutter.name, unit, cutter.kind, ...cells, remarks];
}

/** The cutters of a drawer as CSV (RFC 4180) with a header row; decimal points, lengths in the unit of each row, angles in degrees. */
export const writeCuttersCsv = (entries: readonly DrawerEntry[]): string =>
  [CUTTER_HEADINGS, ...entries.map(cellsOf)].map(writeCsvLine).join('');

import type { BoxPart } from '#shared/kernel/box/box-part.ts';
import { writeCsvLine } from '#shared/kernel/csv/write-csv-line.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';

const HEADINGS = [
  'Part',
  'Count',
  'Unit',
  'Thickness',
  'Front to back with growth',
  'Length',
  'Grows by',
  'Edge that grows',
];

/** The list of box parts as CSV with a header row; lengths as decimals in `unit`, an empty cell where a size is not known. */
export const boxPartsCsv = (parts: readonly BoxPart[], unit: Unit): string =>
  [
    HEADINGS,
    ...parts.map(({ part, count, thickness, width, length, growth, grows }) => [
      part,
      String(count),
      unit,
      String(thickness),
      width === undefined ? '' : String(width),
      String(length),
      String(growth),
      grows,
    ]),
  ]
    .map(writeCsvLine)
    .join('');

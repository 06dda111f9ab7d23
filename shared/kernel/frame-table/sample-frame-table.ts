import { writeCsvLine } from '../csv/write-csv-line.ts';
import type { Unit } from '../units/unit.ts';
import { TABLE_HEADINGS, type TableHeading } from './table-columns.ts';

type SampleRow = Partial<Record<TableHeading, string>>;

// Decimals, not fractions: a spreadsheet takes 3/4 for a day in spring.
const COMMON: Record<Unit, SampleRow> = {
  in: {
    unit: 'in',
    'left stile': '1.75',
    'right stile': '1.75',
    'top rail': '1.75',
    'bottom rail': '1.5',
    columns: '1',
    rows: '1',
    edge: 'square',
    'box thickness': '0.75',
  },
  mm: {
    unit: 'mm',
    'left stile': '45',
    'right stile': '45',
    'top rail': '45',
    'bottom rail': '38',
    columns: '1',
    rows: '1',
    edge: 'square',
    'box thickness': '18',
  },
};

/** A small kitchen, invented: round numbers of either unit, not converted. Each row shows another use of the columns. */
const ROWS: Record<Unit, readonly SampleRow[]> = {
  in: [
    { name: 'B33 two doors', width: '33', height: '30.5', 'mid-stile': '1.5', columns: '2' },
    { name: 'B18 drawers', width: '18', height: '30.5', 'mid-rail': '1.5', rows: '5 + * + * + *' },
    {
      name: 'B36 doors and drawers',
      width: '36',
      height: '30.5',
      'mid-stile': '1.5',
      'mid-rail': '1.5',
      columns: '2',
      rows: '5 + *',
    },
    {
      name: 'W42 three doors',
      width: '42',
      height: '36',
      'bottom rail': '1.75',
      'mid-stile': '1.5',
      columns: '11 + * + 11',
    },
    { name: 'P24 pantry', width: '24', height: '84', 'bottom rail': '1.25', 'mid-rail': '1.75', rows: '24 + *' },
    {
      name: 'V36 vanity on feet',
      width: '36',
      height: '34.5',
      'mid-stile': '1.5',
      columns: '2',
      feet: '4',
    },
    {
      name: 'Bookcase with arches',
      width: '44',
      height: '78',
      'left stile': '2',
      'right stile': '2',
      'top rail': '3',
      'bottom rail': '2',
      'mid-stile': '2',
      columns: '2',
      edge: 'beaded',
      arch: '1.5',
    },
    {
      name: 'Hearth surround',
      width: '48',
      height: '42',
      'left stile': '5',
      'right stile': '5',
      'top rail': '6',
      'bottom rail': '2',
      edge: 'beaded',
      'box thickness': '0',
      remark: 'no box behind it',
    },
  ],
  mm: [
    { name: 'B80 two doors', width: '840', height: '775', 'mid-stile': '40', columns: '2' },
    { name: 'B45 drawers', width: '450', height: '775', 'mid-rail': '40', rows: '125 + * + * + *' },
    {
      name: 'B90 doors and drawers',
      width: '900',
      height: '775',
      'mid-stile': '40',
      'mid-rail': '40',
      columns: '2',
      rows: '125 + *',
    },
    {
      name: 'W105 three doors',
      width: '1050',
      height: '900',
      'bottom rail': '45',
      'mid-stile': '40',
      columns: '280 + * + 280',
    },
    { name: 'P60 pantry', width: '600', height: '2100', 'bottom rail': '32', 'mid-rail': '45', rows: '600 + *' },
    { name: 'V90 vanity on feet', width: '900', height: '875', 'mid-stile': '40', columns: '2', feet: '100' },
    {
      name: 'Bookcase with arches',
      width: '1100',
      height: '1950',
      'left stile': '50',
      'right stile': '50',
      'top rail': '75',
      'bottom rail': '50',
      'mid-stile': '50',
      columns: '2',
      edge: 'beaded',
      arch: '40',
    },
    {
      name: 'Hearth surround',
      width: '1200',
      height: '1050',
      'left stile': '125',
      'right stile': '125',
      'top rail': '150',
      'bottom rail': '50',
      edge: 'beaded',
      'box thickness': '0',
      remark: 'no box behind it',
    },
  ],
};

const write = (unit: Unit, rows: readonly SampleRow[]): string =>
  [TABLE_HEADINGS, ...rows.map((row) => TABLE_HEADINGS.map((heading) => ({ ...COMMON[unit], ...row })[heading] ?? ''))]
    .map(writeCsvLine)
    .join('');

/** A whole kitchen as a table, to look at. */
export const sampleFrameTable = (unit: Unit): string => write(unit, ROWS[unit]);

/** A table to fill in: the headings, and one frame to overwrite. */
export const frameTableTemplate = (unit: Unit): string => write(unit, ROWS[unit].slice(0, 1));

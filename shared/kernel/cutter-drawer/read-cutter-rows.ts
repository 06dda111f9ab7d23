import { CUTTER_HEADINGS, NEEDED_HEADINGS, NUMBER_COLUMNS, type NumberColumn } from './cutter-columns.ts';
import { sayCell, type CellProblem } from '../csv/cell-problem.ts';
import { checkHeadings } from '../csv/check-headings.ts';
import { readPlainNumber } from '../csv/plain-number.ts';
import { readCsv, type CsvRow } from '../csv/read-csv.ts';
import { unguardFormula } from '../csv/write-csv-line.ts';

/** A row as its cells say, not yet held against what a cutter takes. */
export interface CutterRow {
  readonly line: number;
  readonly entry: {
    readonly unit: string;
    readonly cutter: Readonly<Record<string, unknown>>;
    readonly remarks: string;
  };
  readonly problems: readonly CellProblem[];
}

export interface CutterRows {
  readonly rows: readonly CutterRow[];
  /** What is wrong beside the rows: faults of the CSV, or a header row that leaves nothing to read. */
  readonly problems: readonly CellProblem[];
}

function checkHeader({ line, cells }: CsvRow, headings: readonly string[]): CellProblem[] {
  if (headings.length === 1 && cells[0]!.includes(';'))
    return [{ line, column: 'the header row', got: sayCell(cells[0]!), takes: 'cells parted by commas' }];
  return checkHeadings(line, headings, CUTTER_HEADINGS, NEEDED_HEADINGS);
}

function readNumber(
  { heading, entry, kinds }: NumberColumn,
  text: string,
  kind: string,
  line: number,
  problems: CellProblem[],
): Record<string, number> {
  if (text === '') return {};
  if (kinds && !(kinds as readonly string[]).includes(kind)) {
    problems.push({
      line,
      column: heading,
      got: sayCell(text),
      takes: `nothing: only a ${kinds.join(' or ')} cutter has it`,
    });
    return {};
  }
  const value = readPlainNumber(text);
  if (value === undefined)
    problems.push({ line, column: heading, got: sayCell(text), takes: 'a number with a decimal point, such as 9.525' });
  return value === undefined ? {} : { [entry]: value };
}

function readRow({ line, cells }: CsvRow, headings: readonly string[]): CutterRow {
  const problems: CellProblem[] = [];
  const text = (heading: string): string => {
    const index = headings.indexOf(heading);
    return unguardFormula((index < 0 ? undefined : cells[index]) ?? '').trim();
  };
  cells.slice(headings.length).forEach((cell, i) => {
    if (cell.trim() !== '')
      problems.push({
        line,
        column: `number ${headings.length + i + 1}`,
        got: sayCell(cell),
        takes: 'no cell beyond the last column',
      });
  });
  const kind = text('kind').toLowerCase();
  const numbers = NUMBER_COLUMNS.map((column) => readNumber(column, text(column.heading), kind, line, problems));
  const name = text('name');
  const cutter = Object.assign({ kind, ...(name === '' ? {} : { name }) }, ...numbers) as Record<string, unknown>;
  return { line, entry: { unit: text('unit').toLowerCase(), cutter, remarks: text('remarks') }, problems };
}

/** Reads the rows of a cutters' CSV as far as pure text goes. Columns in any order, headings in any case. Never throws. */
export function readCutterRows(text: string): CutterRows {
  const { rows, faults } = readCsv(text);
  const [header, ...rest] = rows;
  const headings = header?.cells.map((cell) => unguardFormula(cell).trim().toLowerCase()) ?? [];
  const broken = faults.map(({ line, column, got, takes }) => ({
    line,
    column: headings[column - 1] ?? `number ${column}`,
    got,
    takes,
  }));
  if (!header)
    return {
      rows: [],
      problems:
        broken.length > 0
          ? broken
          : [{ line: 1, column: 'the header row', got: 'nothing', takes: CUTTER_HEADINGS.join(', ') }],
    };
  const wrong = checkHeader(header, headings);
  if (wrong.length > 0) return { rows: [], problems: [...wrong, ...broken] };
  return { rows: rest.map((row) => readRow(row, headings)), problems: broken };
}

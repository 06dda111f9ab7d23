import { sayCell, type CellProblem } from '../csv/cell-problem.ts';
import { checkHeadings } from '../csv/check-headings.ts';
import { readCsv } from '../csv/read-csv.ts';
import { sniffSeparator } from '../csv/sniff-separator.ts';
import { unguardFormula } from '../csv/write-csv-line.ts';
import { readTableRow, type TableRow } from './read-table-row.ts';
import { TABLE_COLUMNS, TABLE_HEADINGS } from './table-columns.ts';

export interface FrameTable {
  /** In the order of the file. */
  readonly rows: readonly TableRow[];
  /** What is wrong beside the rows: faults of the CSV, or a header row that leaves nothing to read. */
  readonly problems: readonly CellProblem[];
}

const NEEDED = TABLE_COLUMNS.flatMap((column) => ('needed' in column ? [column.heading] : []));

/** Spreadsheets write cells without text behind the last column. */
const withoutEnd = (headings: readonly string[]): string[] =>
  headings.slice(0, headings.findLastIndex((heading) => heading !== '') + 1);

/**
 * Reads a table of frames, a row a frame, up to `most` rows: what is beyond is told as one problem. Columns in any order,
 * headings in any case; cells parted by commas, semicolons or tabs. Never throws.
 */
export function readFrameTable(text: string, most: number): FrameTable {
  const { rows, faults } = readCsv(text, sniffSeparator(text.replace(/^\uFEFF/, ''), TABLE_HEADINGS));
  const [header, ...rest] = rows;
  const headings = withoutEnd(header?.cells.map((cell) => unguardFormula(cell).trim().toLowerCase()) ?? []);
  const broken = faults.map(({ line, column, got, takes }) => ({
    line,
    column: headings[column - 1] ?? `number ${column}`,
    got,
    takes,
  }));
  if (!header) {
    const none = { line: 1, column: 'the header row', got: 'nothing', takes: TABLE_HEADINGS.join(', ') };
    return { rows: [], problems: broken.length > 0 ? broken : [none] };
  }
  if (!headings.some((heading) => (TABLE_HEADINGS as readonly string[]).includes(heading))) {
    const got = sayCell(header.cells.join(' '));
    const takes = `a row of headings: ${TABLE_HEADINGS.join(', ')}`;
    return { rows: [], problems: [{ line: header.line, column: 'the header row', got, takes }, ...broken] };
  }
  const wrong = checkHeadings(header.line, headings, TABLE_HEADINGS, NEEDED);
  if (wrong.length > 0) return { rows: [], problems: [...wrong, ...broken] };
  const beyond = rest[most];
  const tooMany = beyond && {
    line: beyond.line,
    column: 'all columns',
    got: `${rest.length} rows`,
    takes: `at most ${most} at once; rows from here on are not read`,
  };
  return {
    rows: rest.slice(0, most).map((row) => readTableRow(row, { headings, columns: header.cells.length })),
    problems: [...broken, ...(tooMany ? [tooMany] : [])],
  };
}

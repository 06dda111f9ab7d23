import type { CellProblem } from '../kernel/csv/cell-problem.ts';
import { NUMBER_COLUMNS } from '../kernel/cutter-drawer/cutter-columns.ts';
import type { DrawerEntry } from '../kernel/cutter-drawer/drawer-cutter.ts';
import { readCutterRows, type CutterRow } from '../kernel/cutter-drawer/read-cutter-rows.ts';
import { DRAWER_LIMITS, drawerEntry } from './cutters.ts';
import { fieldErrors } from './field-errors.ts';

export interface CsvProblem extends CellProblem {
  /** All of it in a sentence. */
  readonly message: string;
}

/** Both the good rows and what is wrong with the others: to take the good ones alone is for a person to say. */
export interface ReadCuttersCsv {
  readonly cutters: readonly { readonly line: number; readonly entry: DrawerEntry }[];
  readonly problems: readonly CsvProblem[];
}

const problemOf = ({ line, column, got, takes }: CellProblem): CsvProblem => ({
  line,
  column,
  got,
  takes,
  message: `line ${line}, ${column}: got ${got}, takes ${takes}`,
});

/** Heading of the column that fills an entry such as 'cutter.fluteLength'. */
function headingOf(path: string): string {
  const entry = path.replace(/^cutter\./, '');
  return NUMBER_COLUMNS.find((column) => column.entry === entry)?.heading ?? entry;
}

function readEntry({ line, entry, problems }: CutterRow): DrawerEntry | CellProblem[] {
  const read = drawerEntry.safeParse(entry);
  if (read.success) return problems.length > 0 ? [...problems] : read.data;
  const told = new Set(problems.map((problem) => problem.column));
  const more = fieldErrors(read.error, entry).map(({ path, got, takes }) => ({
    line,
    column: headingOf(path),
    got,
    takes,
  }));
  return [...problems, ...more.filter(({ column }) => !told.has(column))];
}

/**
 * Reads the CSV of a cutter drawer, as written by write-cutters-csv.ts or by a spreadsheet. Every bad row is named with
 * line and column, what it got and what it takes; a name that stands twice is the second row's. Never throws.
 */
export function parseCuttersCsv(text: string): ReadCuttersCsv {
  const { rows, problems } = readCutterRows(text);
  const cutters: { line: number; entry: DrawerEntry }[] = [];
  const wrong: CellProblem[] = [...problems];
  const names = new Map<string, number>();
  for (const row of rows.slice(0, DRAWER_LIMITS.cutters)) {
    const read = readEntry(row);
    if (Array.isArray(read)) {
      wrong.push(...read);
      continue;
    }
    const name = read.cutter.name.toLowerCase();
    const first = names.get(name);
    if (first !== undefined) {
      wrong.push({
        line: row.line,
        column: 'name',
        got: JSON.stringify(read.cutter.name),
        takes: `another name than line ${first}`,
      });
      continue;
    }
    names.set(name, row.line);
    cutters.push({ line: row.line, entry: read });
  }
  const beyond = rows[DRAWER_LIMITS.cutters];
  if (beyond)
    wrong.push({
      line: beyond.line,
      column: 'all',
      got: `${rows.length} rows`,
      takes: `at most ${DRAWER_LIMITS.cutters}`,
    });
  return { cutters, problems: wrong.sort((a, b) => a.line - b.line).map(problemOf) };
}

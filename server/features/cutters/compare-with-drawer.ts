import { drawerEntry, type CsvRow } from '#shared/contracts/cutters.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import type { CsvProblem, ReadCuttersCsv } from '#shared/contracts/parse-cutters-csv.ts';
import { CUTTER_HEADINGS, NUMBER_COLUMNS } from '#shared/kernel/cutter-drawer/cutter-columns.ts';
import type { DrawerCutter, DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { plainNumber } from '#shared/kernel/csv/plain-number.ts';

/** A good row of a file beside the cutter of the drawer that it speaks of. */
export interface ComparedRow extends Omit<CsvRow, 'name'> {
  readonly entry: DrawerEntry;
  /** As it is in the drawer; null for a new one. */
  readonly before: DrawerCutter | null;
}

interface Compared {
  readonly rows: readonly ComparedRow[];
  readonly problems: readonly CsvProblem[];
}

type ReadRow = ReadCuttersCsv['cutters'][number];

const nameOf = ({ cutter }: DrawerEntry): string => cutter.name.toLowerCase();

/** The one thing among many that a number points to; undefined when none or several do. */
const only = <T>(found: readonly T[]): T | undefined => (found.length === 1 ? found[0] : undefined);

/**
 * The cutter that each row speaks of: the one of its name, whatever its case; else the one with its number in the machine,
 * when it is of the same kind, the number stands once in the file and in the drawer, and no row has its name.
 */
function pairUp(rows: readonly ReadRow[], drawer: readonly DrawerCutter[]): ReadonlyMap<ReadRow, DrawerCutter> {
  const byName = new Map(drawer.map((held) => [nameOf(held), held]));
  const named = new Set(rows.map(({ entry }) => nameOf(entry)));
  const pairs = new Map<ReadRow, DrawerCutter>();
  for (const row of rows) {
    const { number, kind } = row.entry.cutter;
    const numbered = <T extends DrawerEntry>(held: T) => held.cutter.number === number;
    const held =
      byName.get(nameOf(row.entry)) ??
      (number !== undefined && only(rows.filter(({ entry }) => numbered(entry)))
        ? only(drawer.filter(numbered))
        : undefined);
    const isOwn = held && nameOf(held) === nameOf(row.entry);
    if (held && (isOwn || (held.cutter.kind === kind && !named.has(nameOf(held))))) pairs.set(row, held);
  }
  return pairs;
}

/** What the file has no column for stays as it is in the drawer; a cutter of another kind or unit keeps nothing but its number and remarks. */
function keepUntold(entry: DrawerEntry, before: DrawerCutter, headings: ReadonlySet<string>): DrawerEntry {
  const isAlike = before.unit === entry.unit && before.cutter.kind === entry.cutter.kind;
  const held: Readonly<Record<string, unknown>> = { ...before.cutter };
  const kept = NUMBER_COLUMNS.filter(
    (column) =>
      !headings.has(column.heading) && held[column.entry] !== undefined && (isAlike || column.entry === 'number'),
  ).map((column) => [column.entry, held[column.entry]] as const);
  return {
    ...entry,
    cutter: { ...entry.cutter, ...Object.fromEntries(kept) },
    remarks: headings.has('remarks') ? entry.remarks : before.remarks,
  };
}

/** Cells of an entry by the headings of their columns; '' for nothing. */
function cellsOf({ unit, cutter, remarks }: DrawerEntry): ReadonlyMap<string, string> {
  const numbers: Readonly<Record<string, unknown>> = { ...cutter };
  return new Map([
    ['name', cutter.name],
    ['unit', unit],
    ['kind', cutter.kind],
    ...NUMBER_COLUMNS.map(({ heading, entry }) => {
      const value = numbers[entry];
      return [heading, typeof value === 'number' ? plainNumber(value) : ''] as const;
    }),
    ['remarks', remarks],
  ]);
}

function changesOf(before: DrawerEntry, after: DrawerEntry): CsvRow['changes'] {
  const [was, is] = [cellsOf(before), cellsOf(after)];
  return CUTTER_HEADINGS.filter((column) => was.get(column) !== is.get(column)).map((column) => ({
    column,
    was: was.get(column)!,
    is: is.get(column)!,
  }));
}

/** With what the drawer keeps a row can go wrong that was right by itself: a deepest pass below a flute that is now shorter. */
function problemsOf(line: number, entry: DrawerEntry): CsvProblem[] {
  const read = drawerEntry.safeParse(entry);
  if (read.success) return [];
  return fieldErrors(read.error, entry).map(({ path, got, takes }) => {
    const field = path.replace(/^cutter\./, '');
    const column = NUMBER_COLUMNS.find((known) => known.entry === field)?.heading ?? field;
    return { line, column, got, takes, message: `line ${line}, ${column}: got ${got}, takes ${takes}` };
  });
}

/** Holds the good rows of a file against the drawer. `headings`: the columns that the file has, in small letters. */
export function compareWithDrawer(
  rows: readonly ReadRow[],
  headings: ReadonlySet<string>,
  drawer: readonly DrawerCutter[],
): Compared {
  const pairs = pairUp(rows, drawer);
  const compared: ComparedRow[] = [];
  const problems: CsvProblem[] = [];
  for (const row of rows) {
    const before = pairs.get(row) ?? null;
    if (!before) {
      compared.push({ line: row.line, entry: row.entry, before, is: 'new', changes: [] });
      continue;
    }
    const entry = keepUntold(row.entry, before, headings);
    const wrong = problemsOf(row.line, entry);
    problems.push(...wrong);
    if (wrong.length > 0) continue;
    const changes = changesOf(before, entry);
    compared.push({ line: row.line, entry, before, is: changes.length > 0 ? 'changed' : 'same', changes });
  }
  return { rows: compared, problems };
}

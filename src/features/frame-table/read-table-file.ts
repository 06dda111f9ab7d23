import { FRAME_TABLE_LIMITS } from '#shared/contracts/frame-table.ts';
import { parseFrameTable } from '#shared/contracts/parse-frame-table.ts';
import type { CellProblem } from '#shared/kernel/csv/cell-problem.ts';
import { decodeCsv } from '#shared/kernel/csv/decode-csv.ts';
import { judgeRow, type JudgedRow } from './judge-row.ts';

export interface ReadTable {
  readonly rows: readonly JudgedRow[];
  /** What is wrong beside the rows. */
  readonly problems: readonly CellProblem[];
  /** True where letters beyond English ones may have been read wrong. */
  readonly lettersUnsure: boolean;
}

/** A file that is no table at all: said in one sentence. */
export class NoTable extends Error {}

/** The page answers in between: a long table takes a second or two. Milliseconds. */
const AT_ONCE = 40;

interface ReadCall {
  readonly file: File;
  readonly signal: AbortSignal;
  readonly onRow: (done: number, of: number) => void;
}

/** Reads a file as a table and works every row out. Throws NoTable, or the abort when cancelled. */
export async function readTableFile({ file, signal, onRow }: ReadCall): Promise<ReadTable> {
  const most = FRAME_TABLE_LIMITS.csvBytes;
  if (file.size > most) throw new NoTable(`Got ${file.size} bytes; takes a CSV file of at most ${most}.`);
  const decoded = decodeCsv(new Uint8Array(await file.arrayBuffer()));
  if (!decoded.ok) throw new NoTable(`Got ${decoded.got}; takes ${decoded.takes}.`);
  const table = parseFrameTable(decoded.text);
  const rows: JudgedRow[] = [];
  let since = performance.now();
  for (const row of table.rows) {
    rows.push(judgeRow(row));
    if (performance.now() - since > AT_ONCE) {
      onRow(rows.length, table.rows.length);
      await new Promise((resolve) => setTimeout(resolve));
      since = performance.now();
    }
    signal.throwIfAborted();
  }
  return { rows, problems: table.problems, lettersUnsure: decoded.letters !== 'utf-8' };
}

import type { z } from 'zod';
import type { CellProblem } from '../kernel/csv/cell-problem.ts';
import { columnOfField } from '../kernel/frame-table/column-of-field.ts';
import { frameOfTable } from '../kernel/frame-table/frame-of-table.ts';
import { readFrameTable } from '../kernel/frame-table/read-frame-table.ts';
import type { TableRow } from '../kernel/frame-table/read-table-row.ts';
import { fieldErrors } from './field-errors.ts';
import { FRAME_TABLE_LIMITS } from './frame-table.ts';
import { particulars } from './particulars.ts';

/** A row of the table as a frame that the server takes; whether it can be cut is not looked at yet. */
export interface ParsedRow {
  readonly line: number;
  readonly name: string;
  readonly remark: string;
  /** Left out where a cell is wrong. */
  readonly particulars?: z.output<typeof particulars>;
  readonly problems: readonly CellProblem[];
}

export interface ParsedFrameTable {
  readonly rows: readonly ParsedRow[];
  /** What is wrong beside the rows. */
  readonly problems: readonly CellProblem[];
}

function parseRow({ line, name, remark, frame, problems }: TableRow): ParsedRow {
  const common = { line, name, remark };
  if (!frame) return { ...common, problems };
  const made = frameOfTable(frame);
  const read = particulars.safeParse(made);
  if (read.success) return { ...common, particulars: read.data, problems };
  const wrong = fieldErrors(read.error, made).map(({ path, got, takes }) => ({
    line,
    column: columnOfField(path),
    got,
    takes,
  }));
  // Several entries that follow from one cell are one problem.
  const columns = wrong.map(({ column }) => column);
  return { ...common, problems: wrong.filter(({ column }, i) => columns.indexOf(column) === i) };
}

/** Reads the text of a table of frames: each row as a frame or with what is wrong in it, by line and column. Never throws. */
export function parseFrameTable(text: string): ParsedFrameTable {
  const { rows, problems } = readFrameTable(text, FRAME_TABLE_LIMITS.frames);
  return { rows: rows.map(parseRow), problems };
}

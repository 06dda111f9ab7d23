import type { ParsedRow } from '#shared/contracts/parse-frame-table.ts';
import type { CellProblem } from '#shared/kernel/csv/cell-problem.ts';
import { columnOfField } from '#shared/kernel/frame-table/column-of-field.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

/** A row with what the checks say of its frame. It is good when it has no problem; cautions may stand beside a good one. */
export interface JudgedRow extends ParsedRow {
  /** Left out where a cell is wrong. */
  readonly worked?: WorkedFrame;
  readonly cautions: readonly string[];
}

export const isGood = ({ problems }: Pick<JudgedRow, 'problems'>): boolean => problems.length === 0;

/** Works the frame of a row out: each stop is a problem of the row, with its column where one can be told. */
export function judgeRow(row: ParsedRow): JudgedRow {
  if (!row.particulars) return { ...row, cautions: [] };
  const worked = workFrame(row.particulars);
  const stops = worked.findings.filter(({ level }) => level === 'stop');
  const problems = stops.map(({ field = '', text, remedy }): CellProblem => ({
    line: row.line,
    column: columnOfField(field),
    got: text,
    takes: remedy,
  }));
  const cautions = worked.findings.filter(({ level }) => level === 'caution').map(({ text }) => text);
  return { ...row, worked, problems: [...row.problems, ...problems], cautions };
}

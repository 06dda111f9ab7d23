/** A cell that is wrong: its line in the file, from 1, and the heading of its column. */
export interface CellProblem {
  readonly line: number;
  readonly column: string;
  readonly got: string;
  readonly takes: string;
}

const LONGEST = 60;

/** What stands in a cell, short enough for a message. */
export const sayCell = (text: string): string =>
  text === '' ? 'nothing' : JSON.stringify(text.length > LONGEST ? `${text.slice(0, LONGEST - 3)}…` : text);

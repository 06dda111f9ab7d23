/** A row of a CSV file; `line` is the line of the file, from 1, on which it begins. */
export interface CsvRow {
  readonly line: number;
  readonly cells: readonly string[];
}

/** Something that is no CSV: `column` counts cells from 1. */
export interface CsvFault {
  readonly line: number;
  readonly column: number;
  readonly got: string;
  readonly takes: string;
}

export interface ReadCsv {
  readonly rows: readonly CsvRow[];
  readonly faults: readonly CsvFault[];
}

const excerpt = (text: string): string => JSON.stringify(text.length > 40 ? `${text.slice(0, 39)}…` : text);

/** What parts the cells of a row. Spreadsheets write semicolons where a comma is the decimal point, and tabs when asked to. */
export type CsvSeparator = ',' | ';' | '\t';

const SEPARATOR_WORDS: Record<CsvSeparator, string> = { ',': 'a comma', ';': 'a semicolon', '\t': 'a tab' };

/**
 * Reads CSV after RFC 4180: cells parted by `separator`, in double quotes where they hold it, quotes or line ends. Takes
 * any line end, a byte order mark, and a last line without an end; passes over rows without any text. A row with a
 * fault is left out and the fault told. Does not undo the guard against formulas. Never throws.
 */
export function readCsv(text: string, separator: CsvSeparator = ','): ReadCsv {
  const rows: CsvRow[] = [];
  const faults: CsvFault[] = [];
  const ends = `${separator}\r\n`;
  const input = text.replace(/^\uFEFF/, '');
  let at = 0;
  let line = 1;

  /** Passes over one line end, when there is one. */
  function endLine(): boolean {
    if (input.startsWith('\r\n', at)) at += 2;
    else if (input[at] === '\n' || input[at] === '\r') at += 1;
    else return false;
    line += 1;
    return true;
  }

  function quotedCell(column: number, rowLine: number): string {
    at += 1;
    let cell = '';
    for (;;) {
      const from = at;
      while (at < input.length && !'"\r\n'.includes(input[at]!)) at += 1;
      cell += input.slice(from, at);
      if (at >= input.length) {
        faults.push({
          line: rowLine,
          column,
          got: `${excerpt(cell)} and the end of the file`,
          takes: 'a closing double quote',
        });
        return cell;
      }
      const end = at;
      if (endLine()) cell += input.slice(end, at);
      else if (input[at + 1] === '"') {
        cell += '"';
        at += 2;
      } else break;
    }
    at += 1;
    const after = bareText();
    if (after !== '')
      faults.push({
        line: rowLine,
        column,
        got: `${excerpt(after)} after a closing quote`,
        takes: `${SEPARATOR_WORDS[separator]} or the end of the line there; a quote inside a cell is written twice`,
      });
    return cell;
  }

  function bareText(): string {
    const from = at;
    while (at < input.length && !ends.includes(input[at]!)) at += 1;
    return input.slice(from, at);
  }

  function bareCell(column: number): string {
    const cell = bareText();
    if (cell.includes('"'))
      faults.push({ line, column, got: excerpt(cell), takes: 'the whole cell in double quotes when it holds one' });
    return cell;
  }

  while (at < input.length) {
    const rowLine = line;
    const known = faults.length;
    const cells: string[] = [];
    for (;;) {
      cells.push(input[at] === '"' ? quotedCell(cells.length + 1, rowLine) : bareCell(cells.length + 1));
      if (input[at] !== separator) break;
      at += 1;
    }
    endLine();
    if (faults.length === known && cells.some((cell) => cell.trim() !== '')) rows.push({ line: rowLine, cells });
  }
  return { rows, faults };
}

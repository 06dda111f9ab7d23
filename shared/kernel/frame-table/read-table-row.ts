import { sayCell, type CellProblem } from '../csv/cell-problem.ts';
import type { CsvRow } from '../csv/read-csv.ts';
import { unguardFormula } from '../csv/write-csv-line.ts';
import { newFrame } from '../particulars/new-frame.ts';
import type { Bead } from '../particulars/particulars.ts';
import { parseLength } from '../units/parse-length.ts';
import type { Unit } from '../units/unit.ts';
import { usualBead, type TableFrame } from './frame-of-table.ts';
import { parseShares, type Share } from './parse-shares.ts';
import { WHOLE_ROW, type TableHeading } from './table-columns.ts';

export interface TableHeader {
  /** Trimmed, in small letters, without those at the end that are empty. */
  readonly headings: readonly string[];
  /** Cells of the header row, empty ones too. */
  readonly columns: number;
}

export interface TableRow {
  readonly line: number;
  /** '' where none is entered. */
  readonly name: string;
  readonly remark: string;
  /** Left out where a cell is wrong. */
  readonly frame?: TableFrame;
  readonly problems: readonly CellProblem[];
}

const DECIMAL_POINT = 'with a decimal point where it has one';

/** The cells of one row by heading, and what is wrong with them. */
class Cells {
  readonly problems: CellProblem[] = [];
  readonly #row: CsvRow;
  readonly #headings: readonly string[];

  constructor(row: CsvRow, headings: readonly string[]) {
    this.#row = row;
    this.#headings = headings;
  }

  wrong(column: string, text: string, takes: string): void {
    this.problems.push({ line: this.#row.line, column, got: sayCell(text), takes });
  }

  text(heading: TableHeading): string {
    return unguardFormula(this.#row.cells[this.#headings.indexOf(heading)] ?? '').trim();
  }

  /** A length above 0. Without `otherwise` the cell must have one; NaN where it is wrong. */
  length(heading: TableHeading, unit: Unit, otherwise?: number): number {
    return this.#read(heading, unit, otherwise, (value) => value > 0, 'above 0');
  }

  /** A length that may be 0. */
  lengthOrNone(heading: TableHeading, unit: Unit, otherwise?: number): number {
    return this.#read(heading, unit, otherwise, (value) => value >= 0, '0 or more');
  }

  #read(
    heading: TableHeading,
    unit: Unit,
    otherwise: number | undefined,
    fits: (value: number) => boolean,
    bound: string,
  ): number {
    const text = this.text(heading);
    if (text === '' && otherwise !== undefined) return otherwise;
    const parsed = parseLength(text, unit);
    if (parsed.ok && fits(parsed.value)) return parsed.value;
    const takes = parsed.ok
      ? `a length ${bound}`
      : text.includes(',')
        ? `${parsed.takes}, ${DECIMAL_POINT}`
        : parsed.takes;
    this.wrong(heading, text, takes);
    return NaN;
  }

  shares(heading: 'columns' | 'rows', unit: Unit): readonly Share[] {
    const text = this.text(heading);
    const parsed = parseShares(text, unit);
    if (parsed.ok) return parsed.shares;
    this.wrong(heading, text, text.includes(',') ? `${parsed.takes}, ${DECIMAL_POINT}` : parsed.takes);
    return ['*'];
  }

  /** One of some words, whatever the capitals. */
  word<T extends string>(heading: TableHeading, words: readonly [T, T]): T | undefined {
    const text = this.text(heading);
    const found = words.find((word) => word === text.toLowerCase());
    if (found === undefined) this.wrong(heading, text, words.join(' or '));
    return found;
  }
}

/** Width between columns or rows: needed only where there are several; a cell that is not used must still be a length. */
function between(cells: Cells, heading: 'mid-stile' | 'mid-rail', unit: Unit, shares: readonly Share[]): number {
  if (shares.length === 1) {
    cells.lengthOrNone(heading, unit, 0);
    return 0;
  }
  if (cells.text(heading) !== '') return cells.length(heading, unit);
  const parts = heading === 'mid-stile' ? 'columns' : 'rows';
  cells.wrong(heading, '', `its width, since there are ${shares.length} ${parts}`);
  return NaN;
}

function readBead(cells: Cells, unit: Unit): Bead {
  const usual = usualBead(unit);
  return {
    radius: cells.length('bead radius', unit, usual.radius),
    drop: cells.lengthOrNone('bead drop', unit, usual.drop),
    quirk: cells.length('quirk', unit, usual.quirk),
  };
}

/**
 * A row with more cells than the header row: a decimal comma between commas parts one cell in two, and all behind it are
 * another column's. That alone is told then.
 */
function tooManyCells({ line, cells }: CsvRow, { columns, headings }: TableHeader): CellProblem[] {
  if (cells.length > columns)
    return [
      {
        line,
        column: WHOLE_ROW,
        got: `${cells.length} cells`,
        takes: `${columns}, as the header row has; a length has a decimal point, not a comma`,
      },
    ];
  return cells.slice(headings.length).flatMap((cell, i) => {
    const column = `number ${headings.length + i + 1}`;
    return cell.trim() === '' ? [] : [{ line, column, got: sayCell(cell), takes: 'no cell beyond the last heading' }];
  });
}

/** Reads one row of the table. All wrong cells are told; without a unit no length can be read, so the other words alone are. */
export function readTableRow(row: CsvRow, header: TableHeader): TableRow {
  const cells = new Cells(row, header.headings);
  const name = cells.text('name');
  const common = { line: row.line, name, remark: cells.text('remark') };
  const shifted = tooManyCells(row, header);
  if (shifted.length > 0) return { ...common, problems: shifted };
  if (name === '') cells.wrong('name', name, 'some text');
  const unit = cells.word('unit', ['in', 'mm']);
  const edge = cells.word('edge', ['square', 'beaded']);
  if (unit === undefined) return { ...common, problems: cells.problems };

  const columns = cells.shares('columns', unit);
  const rows = cells.shares('rows', unit);
  const bead = readBead(cells, unit);
  const frame: TableFrame = {
    name,
    unit,
    width: cells.length('width', unit),
    height: cells.length('height', unit),
    stiles: { left: cells.length('left stile', unit), right: cells.length('right stile', unit) },
    rails: { top: cells.length('top rail', unit), bottom: cells.length('bottom rail', unit) },
    midStile: between(cells, 'mid-stile', unit, columns),
    midRail: between(cells, 'mid-rail', unit, rows),
    columns,
    rows,
    box: cells.lengthOrNone('box thickness', unit),
    feet: cells.lengthOrNone('feet', unit, 0),
    arch: cells.lengthOrNone('arch', unit, 0),
    thickness: cells.length('board thickness', unit, newFrame(unit, name).thickness),
    ...(edge === 'beaded' ? { bead } : {}),
  };
  return { ...common, problems: cells.problems, ...(cells.problems.length === 0 ? { frame } : {}) };
}

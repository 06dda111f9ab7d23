import { readCsv, type CsvSeparator } from './read-csv.ts';

const SEPARATORS: readonly CsvSeparator[] = [',', ';', '\t'];

/** What parts the cells of a table: the separator by which its header row has most of the `known` headings; a comma when none does. */
export function sniffSeparator(text: string, known: readonly string[]): CsvSeparator {
  const header = text.split(/[\r\n]+/).find((line) => line.trim() !== '') ?? '';
  const found = (separator: CsvSeparator): number => {
    const cells = readCsv(header, separator).rows[0]?.cells ?? [];
    return cells.filter((cell) => known.includes(cell.trim().toLowerCase())).length;
  };
  return SEPARATORS.reduce((best, separator) => (found(separator) > found(best) ? separator : best));
}

import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetCell, SheetTable } from './sheet-model.ts';

/** Parts named in one row; more make another row, so that no row is higher than a page. */
const NAMES_IN_ROW = 8;

interface Alike {
  readonly panel: number;
  readonly clearance: number;
  readonly depth: number;
  readonly names: string[];
}

/** Dados of the same panel, clearance and depth. */
function alikeDados(dados: WorkedFrame['particulars']['dados']): Alike[] {
  const groups = new Map<string, Alike>();
  for (const { part, panel, clearance, depth } of dados) {
    const key = JSON.stringify([panel, clearance, depth]);
    const known = groups.get(key);
    if (known) known.names.push(part);
    else groups.set(key, { panel, clearance, depth, names: [part] });
  }
  return [...groups.values()];
}

/** Each name once, in order, with how often when more than once: "Shelf (3 dados)". */
function countNames(names: readonly string[]): string[] {
  const counts = new Map<string, number>();
  for (const name of names) counts.set(name, (counts.get(name) ?? 0) + 1);
  return [...counts].map(([name, count]) => (count > 1 ? `${name} (${count} dados)` : name));
}

const inRows = (names: readonly string[]): string[][] =>
  Array.from({ length: Math.ceil(names.length / NAMES_IN_ROW) }, (_, i) =>
    names.slice(i * NAMES_IN_ROW, (i + 1) * NAMES_IN_ROW),
  );

/** Box parts that plug into the frame: each grows by its dado's depth on the front edge. Parts that grow alike are told together. */
export function boxPartTable(worked: WorkedFrame): SheetTable {
  const { unit, dados } = worked.particulars;
  const length = (value: number): SheetCell => ({ text: formatLength(value, unit), value });
  const rows = alikeDados(dados).flatMap(({ panel, clearance, depth, names }) =>
    inRows(countNames(names)).map((row): SheetCell[] => [
      { text: row.join(', ') },
      length(panel),
      length(panel + clearance),
      { text: `add ${formatWithUnit(depth, unit)} to the front-to-back size`, value: depth, bold: true },
    ]),
  );
  const columns = [
    { key: 'part', heading: 'Box parts', align: 'left' },
    { key: 'panel', heading: 'Panel', align: 'right' },
    { key: 'width', heading: 'Dado width', align: 'right' },
    { key: 'grow', heading: 'When cutting the part', align: 'left' },
  ] as const;
  return { columns, rows, whenEmpty: 'No dados, so no part grows.' };
}

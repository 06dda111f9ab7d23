import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetCell, SheetTable } from './sheet-model.ts';

/** Box parts that plug into the frame: each grows by its dado's depth on the front edge. Parts that grow alike are told once. */
export function boxPartTable(worked: WorkedFrame): SheetTable {
  const { unit, dados } = worked.particulars;
  const alike = new Map<string, { part: string; panel: number; clearance: number; depth: number; count: number }>();
  for (const { part, panel, clearance, depth } of dados) {
    const key = JSON.stringify([part, panel, clearance, depth]);
    const known = alike.get(key);
    if (known) known.count += 1;
    else alike.set(key, { part, panel, clearance, depth, count: 1 });
  }
  const length = (value: number): SheetCell => ({ text: formatLength(value, unit), value });
  const rows = [...alike.values()].map(({ part, panel, clearance, depth, count }): SheetCell[] => [
    { text: count > 1 ? `${part} (${count} dados)` : part },
    length(panel),
    length(panel + clearance),
    { text: `add ${formatWithUnit(depth, unit)} to the front-to-back size`, value: depth, bold: true },
  ]);
  const columns = [
    { key: 'part', heading: 'Box part', align: 'left' },
    { key: 'panel', heading: 'Panel', align: 'right' },
    { key: 'width', heading: 'Dado width', align: 'right' },
    { key: 'grow', heading: 'When cutting the part', align: 'left' },
  ] as const;
  return { columns, rows, whenEmpty: 'No dados, so no part grows.' };
}

import { formatLength } from '../units/format-length.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { placedDados } from './back-drawing.ts';
import { placedOpenings } from './front-drawing.ts';
import type { SheetCell, SheetTable } from './sheet-model.ts';

const right = (key: string, heading: string) => ({ key, heading, align: 'right' }) as const;
const left = (key: string, heading: string) => ({ key, heading, align: 'left' }) as const;

/** Every dado's sides from the pins in the back setup: the whole truth, whatever the drawing has room for. */
export function dadoTable(worked: WorkedFrame): SheetTable {
  const { unit } = worked.particulars;
  const length = (value: number): SheetCell => ({ text: formatLength(value, unit), value });
  const rows = placedDados(worked).map(({ tag, part, depth, extents: e }): SheetCell[] => [
    { text: tag, bold: true },
    { text: part },
    length(e.minX),
    length(e.maxX),
    length(e.minY),
    length(e.maxY),
    length(depth),
  ]);
  const columns = [
    left('tag', 'Dado'),
    left('part', 'Box part'),
    right('x1', 'Left side'),
    right('x2', 'Right side'),
    right('y1', 'Lower side'),
    right('y2', 'Upper side'),
    right('depth', 'Depth'),
  ];
  return { columns, rows, whenEmpty: 'No dados: the back is only squared.' };
}

/** Every opening's sides from the pins in the front setup, and its entered size. */
export function openingTable(worked: WorkedFrame): SheetTable {
  const { unit } = worked.particulars;
  const length = (value: number): SheetCell => ({ text: formatLength(value, unit), value });
  const openings = placedOpenings(worked);
  const arched = openings.some((o) => o.arch > 0);
  const rows = openings.map(({ tag, label, extents: e, width, height, arch }): SheetCell[] => [
    { text: tag, bold: true },
    { text: label },
    length(e.minX),
    length(e.maxX),
    length(e.minY),
    length(e.maxY),
    { text: `${formatLength(width, unit)} × ${formatLength(height, unit)}` },
    ...(arched ? [arch > 0 ? length(arch) : { text: '–' }] : []),
  ]);
  const columns = [
    left('tag', 'No.'),
    left('label', 'Opening'),
    right('x1', 'Left side'),
    right('x2', 'Right side'),
    right('y1', 'Lower side'),
    right('y2', 'Upper side'),
    right('size', 'Size'),
    ...(arched ? [right('arch', 'Arch rise')] : []),
  ];
  return { columns, rows, whenEmpty: 'No openings.' };
}

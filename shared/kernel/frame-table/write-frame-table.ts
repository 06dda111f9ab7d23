import { plainNumber } from '../csv/plain-number.ts';
import { writeCsvLine } from '../csv/write-csv-line.ts';
import { listChanges } from '../particulars/list-changes.ts';
import type { MembersOutline, Particulars } from '../particulars/particulars.ts';
import { frameOfTable } from './frame-of-table.ts';
import { findGrid, type Grid } from './grid.ts';
import type { Share } from './parse-shares.ts';
import { TABLE_HEADINGS, type TableHeading } from './table-columns.ts';

type Cells = Partial<Record<TableHeading, string>>;

const ONE_OPENING: Grid = { columns: ['*'], rows: ['*'], midStile: 0, midRail: 0, arch: 0 };

/** Parts of a frame beside its members: the cells that say them, and the words for what they cannot say. */
const PARTS: readonly { readonly path: RegExp; readonly cells: readonly TableHeading[]; readonly words: string }[] = [
  { path: /^dados\b/, cells: ['box thickness'], words: 'dados' },
  { path: /^edge\b/, cells: ['edge', 'bead radius', 'bead drop', 'quirk'], words: 'edge' },
  { path: /^setup\b/, cells: [], words: 'turning over and setup' },
  { path: /^cutters\b/, cells: [], words: 'cutters' },
  { path: /^blank\b/, cells: [], words: 'the given board' },
];

const remarkOf = (words: readonly string[]): Cells =>
  words.length > 0 ? { remark: `not in table: ${words.join(', ')}` } : {};

const writeShares = (shares: readonly Share[]): string =>
  shares.every((share) => share === '*')
    ? String(shares.length)
    : shares.map((share) => (share === '*' ? share : plainNumber(share))).join(' + ');

const writeGrid = ({ columns, rows, midStile, midRail, arch }: Grid): Cells => ({
  columns: writeShares(columns),
  rows: writeShares(rows),
  ...(columns.length > 1 ? { 'mid-stile': plainNumber(midStile) } : {}),
  ...(rows.length > 1 ? { 'mid-rail': plainNumber(midRail) } : {}),
  ...(arch > 0 ? { arch: plainNumber(arch) } : {}),
});

function writeEdge({ edge }: Particulars): Cells {
  if (edge.style === 'square') return { edge: 'square' };
  const { radius, drop, quirk } = edge.bead;
  return {
    edge: 'beaded',
    'bead radius': plainNumber(radius),
    'bead drop': plainNumber(drop),
    quirk: plainNumber(quirk),
  };
}

/** A bead's size is held at its base unless the frame says otherwise: said or not, it is the same edge. */
const withHeldAt = (p: Particulars): Particulars =>
  p.edge.style === 'beaded' && p.edge.sizeHeldAt === undefined
    ? { ...p, edge: { ...p.edge, sizeHeldAt: 'bead base' } }
    : p;

function cellsOfMembers(p: Particulars, outline: MembersOutline): Cells {
  const { width, height, stiles, rails, feet } = outline;
  const grid = findGrid(p, outline);
  const box = p.dados[0]?.panel ?? 0;
  const { name, unit, thickness, edge } = p;
  const read = frameOfTable({
    ...(grid ?? ONE_OPENING),
    ...{ name, unit, width, height, stiles, rails, feet, thickness, box },
    ...(edge.style === 'beaded' ? { bead: edge.bead } : {}),
  });
  // What reading the row would give in place of the frame: the cells concerned stay empty.
  const changed = listChanges(withHeldAt(p), read).map(({ path }) => path);
  const isChanged = (path: RegExp): boolean => changed.some((one) => path.test(one));
  const lost = PARTS.filter(({ path }) => isChanged(path));
  const cells: Cells = {
    width: plainNumber(width),
    height: plainNumber(height),
    'left stile': plainNumber(stiles.left),
    'right stile': plainNumber(stiles.right),
    'top rail': plainNumber(rails.top),
    'bottom rail': plainNumber(rails.bottom),
    feet: feet > 0 ? plainNumber(feet) : '',
    'box thickness': plainNumber(box),
    ...(grid ? writeGrid(grid) : {}),
    ...writeEdge(p),
  };
  for (const { cells: headings } of lost) for (const heading of headings) delete cells[heading];
  return {
    ...cells,
    ...remarkOf([
      ...(grid ? [] : ['openings that are no even grid']),
      ...(grid && isChanged(/^outline\.layout/) ? ['labels of the openings'] : []),
      ...lost.map(({ words }) => words),
    ]),
  };
}

function cellsOf(p: Particulars): Cells {
  return {
    name: p.name,
    unit: p.unit,
    'board thickness': plainNumber(p.thickness),
    ...(p.outline.kind === 'members'
      ? cellsOfMembers(p, p.outline)
      : remarkOf(['an outline traced from a drawing, and all that follows from it'])),
  };
}

/**
 * Frames as a table with a header row, for a spreadsheet or to read again; decimal points, lengths in the unit of each
 * row. What the table cannot say of a frame is named in its remark, and the cells concerned stay empty: a row never says
 * another frame. Rows with an empty needed cell are told when they are read.
 */
export const writeFrameTable = (frames: readonly Particulars[]): string =>
  [TABLE_HEADINGS, ...frames.map(cellsOf).map((cells) => TABLE_HEADINGS.map((heading) => cells[heading] ?? ''))]
    .map(writeCsvLine)
    .join('');

import { openingLabel } from '../frame/opening-label.ts';
import { listChanges } from '../particulars/list-changes.ts';
import type { LayoutPart, MembersOutline, Particulars } from '../particulars/particulars.ts';
import type { Share } from './parse-shares.ts';

/** Openings in even columns and rows, as a row of the table says them; lengths in the frame's unit. */
export interface Grid {
  /** Left to right; one alone is `*`. */
  readonly columns: readonly Share[];
  /** Top to bottom; one alone is `*`. */
  readonly rows: readonly Share[];
  /** Width between columns; 0 where there is one. */
  readonly midStile: number;
  /** Width between rows; 0 where there is one. */
  readonly midRail: number;
  /** Rise of the arch over each opening of the top row; 0 for none. */
  readonly arch: number;
}

const sized = (part: LayoutPart, share: Share): LayoutPart => (share === '*' ? part : { ...part, size: share });

/** The grid as a layout tree: rows of columns, or less where there is one of either. Labels follow the order of reading. */
export function layOutGrid({ columns, rows, midStile, midRail, arch }: Grid): LayoutPart {
  const opening = (row: number, column: number): LayoutPart => ({
    opening: {
      label: openingLabel(row * columns.length + column),
      ...(row === 0 && arch > 0 ? { arch } : {}),
    },
  });
  const line = (row: number): LayoutPart =>
    columns.length === 1
      ? opening(row, 0)
      : { columns: columns.map((share, i) => sized(opening(row, i), share)), between: midStile };
  return rows.length === 1 ? line(0) : { rows: rows.map((share, row) => sized(line(row), share)), between: midRail };
}

const shareOf = ({ size }: LayoutPart): Share => size ?? '*';

/** The grid that a frame's openings are, whatever their labels; `undefined` where they are none that a row of the table can say. */
export function findGrid(particulars: Particulars, outline: MembersOutline): Grid | undefined {
  const { layout } = outline;
  const lines = 'rows' in layout ? layout.rows : [layout];
  const top = lines[0]!;
  const openings = 'columns' in top ? top.columns : [top];
  const first = openings[0]!;
  const grid: Grid = {
    columns: 'columns' in top ? openings.map(shareOf) : ['*'],
    rows: 'rows' in layout ? lines.map(shareOf) : ['*'],
    midStile: 'columns' in top ? top.between : 0,
    midRail: 'rows' in layout ? layout.between : 0,
    arch: 'opening' in first ? (first.opening.arch ?? 0) : 0,
  };
  const again = { ...particulars, outline: { ...outline, layout: layOutGrid(grid) } };
  return listChanges(particulars, again).every(({ path }) => path.endsWith('.opening.label')) ? grid : undefined;
}

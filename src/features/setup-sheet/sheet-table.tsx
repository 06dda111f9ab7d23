import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetCell, SheetSwatch, SheetTable as Table } from '#shared/kernel/sheet/sheet-model.ts';
import { classNames } from '../../ui/class-names.ts';

/** Width of a character of the large type, and space between columns, in CSS pixels. */
const CHARACTER = 12;
const GAP = 16;
/** Longer texts go on to the next line. */
const MOST_CHARACTERS = 18;

/** CSS pixels that a table wants; with less room it stands as blocks, one a row. */
const wantedWidth = ({ columns, rows }: Table): number =>
  columns.reduce((sum, _, c) => {
    const longest = Math.max(6, ...rows.map((row) => (row[c]?.text.length ?? 0) + (row[c]?.swatch ? 3 : 0)));
    return sum + Math.min(longest, MOST_CHARACTERS) * CHARACTER + GAP;
  }, 0);

function Swatch({ swatch }: { readonly swatch: SheetSwatch }) {
  if (swatch.kind === 'layer') {
    return (
      <svg aria-hidden="true" viewBox="0 0 10 10" className="mr-2 inline-block size-[0.8em]">
        <path d="M0.5 0.5h9v9h-9z" fill={swatch.hex} className="stroke-ink" />
      </svg>
    );
  }
  return (
    <svg aria-hidden="true" viewBox="0 0 24 10" className="mr-2 inline-block h-[0.8em] w-[2em]">
      <path
        d="M0 5h24"
        stroke={SHEET_COLOURS[swatch.colour]}
        strokeWidth="2"
        strokeDasharray={swatch.dashed ? '5 3' : undefined}
        fill="none"
      />
    </svg>
  );
}

function Cell({ cell }: { readonly cell: SheetCell }) {
  return (
    <span
      className={classNames('wrap-anywhere', cell.bold && 'font-bold')}
      style={{ color: cell.colour && SHEET_COLOURS[cell.colour] }}
    >
      {cell.swatch && <Swatch swatch={cell.swatch} />}
      {cell.text}
    </span>
  );
}

function AsBlocks({ table: { columns, rows } }: { readonly table: Table }) {
  return (
    <ol>
      {rows.map((row, i) => (
        <li key={i} className="break-inside-avoid border-b border-rule py-2">
          <dl className="grid grid-cols-[repeat(auto-fill,minmax(8.5rem,1fr))] gap-x-4 gap-y-1">
            {columns.map((column, c) => (
              <div key={column.key}>
                <dt className="text-12 text-pencil">{column.heading}</dt>
                <dd>{row[c] && <Cell cell={row[c]} />}</dd>
              </div>
            ))}
          </dl>
        </li>
      ))}
    </ol>
  );
}

interface SheetTableProps {
  readonly title: string;
  readonly table: Table;
  /** CSS pixels that the table has across. */
  readonly width: number;
}

/** A table of the setup sheet: as a table where there is room, else row by row with every value under its heading. */
export function SheetTable({ title, table, width }: SheetTableProps) {
  if (table.rows.length === 0) return <p>{table.whenEmpty}</p>;
  if (wantedWidth(table) > width) return <AsBlocks table={table} />;
  const align = (c: number) => table.columns[c]?.align === 'right' && 'text-right';
  return (
    <table className="w-full border-collapse text-left">
      <caption className="sr-only">{title}</caption>
      <thead>
        <tr className="border-b border-ink">
          {table.columns.map((column, c) => (
            <th
              key={column.key}
              scope="col"
              className={classNames('px-2 py-1 text-12 font-normal text-pencil first:pl-0 last:pr-0', align(c))}
            >
              {column.heading}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {table.rows.map((row, r) => (
          <tr key={r} className="break-inside-avoid border-b border-rule">
            {row.map((cell, c) => (
              <td key={c} className={classNames('px-2 py-2 align-top first:pl-0 last:pr-0', align(c))}>
                <Cell cell={cell} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

import { useState, type ReactNode } from 'react';
import { classNames } from './class-names.ts';

export interface Column<Row> {
  readonly key: string;
  readonly head: string;
  readonly cell: (row: Row) => ReactNode;
  /** Numbers go to the right. */
  readonly align?: 'left' | 'right';
  /** What the column sorts by; left out where sorting makes no sense. */
  readonly sortBy?: (row: Row) => string | number;
  /** The cell that names the row; one column of a table has it. */
  readonly names?: boolean;
  /** Left out where the window is narrow: what another column shows too. */
  readonly spare?: boolean;
  /** Head for screen readers only: columns of drawings or actions. */
  readonly hideHead?: boolean;
}

interface TableProps<Row> {
  /** For screen readers: what is listed. */
  readonly caption: string;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
}

interface Order {
  readonly key: string;
  readonly direction: 'ascending' | 'descending';
}

const compare = (a: string | number, b: string | number): number =>
  typeof a === 'number' && typeof b === 'number' ? a - b : String(a).localeCompare(String(b), 'en', { numeric: true });

function inOrder<Row>(rows: readonly Row[], columns: readonly Column<Row>[], order: Order | null): readonly Row[] {
  const by = columns.find((column) => column.key === order?.key)?.sortBy;
  if (order === null || by === undefined) return rows;
  const sign = order.direction === 'ascending' ? 1 : -1;
  return rows.toSorted((a, b) => sign * compare(by(a), by(b)));
}

/** Rows ruled by hairlines. Heads that sort are buttons; rows come in the order given until one is pressed. */
export function Table<Row>({ caption, columns, rows, rowKey }: TableProps<Row>) {
  const [order, setOrder] = useState<Order | null>(null);
  const press = (key: string) =>
    setOrder((now) => ({
      key,
      direction: now?.key === key && now.direction === 'ascending' ? 'descending' : 'ascending',
    }));
  return (
    <div className="overflow-x-auto print:overflow-visible">
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-ink">
            {columns.map((column) => {
              const direction = order?.key === column.key ? order.direction : undefined;
              return (
                <th
                  key={column.key}
                  scope="col"
                  aria-sort={direction}
                  className={classNames(
                    'px-1.5 py-1 align-bottom lg:px-2 text-11 font-normal text-pencil',
                    column.align === 'right' && 'text-right',
                    column.spare && 'max-lg:hidden',
                  )}
                >
                  {column.sortBy === undefined ? (
                    <span className={column.hideHead ? 'sr-only' : 'inline-block py-1'}>{column.head}</span>
                  ) : (
                    <button
                      type="button"
                      onClick={() => press(column.key)}
                      className="relative min-h-6 whitespace-nowrap hover:underline"
                    >
                      {column.head}
                      <span aria-hidden="true" className="absolute top-1 left-full">
                        {direction === 'ascending' ? '↑' : direction === 'descending' ? '↓' : ''}
                      </span>
                    </button>
                  )}
                </th>
              );
            })}
          </tr>
        </thead>
        <tbody>
          {inOrder(rows, columns, order).map((row) => (
            <tr key={rowKey(row)} className="break-inside-avoid border-b border-rule hover:bg-board-light">
              {columns.map((column) => {
                const look = classNames(
                  'px-1.5 py-1.5 font-normal lg:px-2',
                  column.align === 'right' && 'text-right',
                  column.spare && 'max-lg:hidden',
                );
                return column.names ? (
                  <th key={column.key} scope="row" className={look}>
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={look}>
                    {column.cell(row)}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Table, type Column } from '../../../src/ui/table.tsx';
import { show } from '../show.tsx';

interface Row {
  readonly name: string;
  readonly width: number;
}

const COLUMNS: Column<Row>[] = [
  { key: 'name', head: 'Frame', names: true, sortBy: (row) => row.name, cell: (row) => row.name },
  { key: 'width', head: 'Width', align: 'right', sortBy: (row) => row.width, cell: (row) => row.width },
  { key: 'note', head: 'Note', cell: () => 'none' },
];
const ROWS: Row[] = [
  { name: 'B9', width: 30 },
  { name: 'B33', width: 9 },
  { name: 'B12', width: 100 },
];

const names = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent);

describe('Table', () => {
  it('When nothing is pressed, then rows keep the order they were given in', () => {
    show(<Table caption="Frames" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} />);
    expect(names()).toEqual(['B9', 'B33', 'B12']);
  });

  it('When a head of names is pressed, then figures in names count as numbers, and pressing again turns the order', async () => {
    const { user } = show(<Table caption="Frames" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} />);
    await user.click(screen.getByRole('button', { name: 'Frame' }));
    expect(names()).toEqual(['B9', 'B12', 'B33']);
    await user.click(screen.getByRole('button', { name: /^Frame/ }));
    expect(names()).toEqual(['B33', 'B12', 'B9']);
    expect(screen.getByRole('columnheader', { name: /^Frame/ }).getAttribute('aria-sort')).toBe('descending');
  });

  it('When a head of numbers is pressed, then rows go by number', async () => {
    const { user } = show(<Table caption="Frames" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} />);
    await user.click(screen.getByRole('button', { name: 'Width' }));
    expect(names()).toEqual(['B33', 'B9', 'B12']);
  });

  it('When a column does not sort, then its head is no button', () => {
    show(<Table caption="Frames" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} />);
    expect(screen.queryByRole('button', { name: 'Note' })).toBeNull();
  });
});

import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { FRAME_TABLE_LIMITS } from '#shared/contracts/frame-table.ts';
import { parseFrameTable } from '#shared/contracts/parse-frame-table.ts';
import { frameTableTemplate, sampleFrameTable } from '#shared/kernel/frame-table/sample-frame-table.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { FrameTablePage, type FrameTablePageProps } from '../../../../src/features/frame-table/frame-table-page.tsx';
import { ApiError } from '../../../../src/lib/api-error.ts';
import { allowSlowMachine } from '../../../setup/slow-machine.ts';
import { show } from '../../show.tsx';

allowSlowMachine();

const MISTAKES = readFileSync(join(import.meta.dirname, '../../../../samples/kitchen-with-mistakes.csv'), 'utf8');
const framesOf = (text: string) => parseFrameTable(text).rows.map(({ particulars }) => particulars!);

function page(change: Partial<FrameTablePageProps> = {}) {
  const onAdd = vi.fn<(frames: Particulars[]) => void>();
  const view = show(
    <FrameTablePage
      shopName="Marsh Lane Cabinets"
      unit="in"
      job={{ id: 'j', name: 'Fenwick Lane' }}
      names={[]}
      mayEdit
      busy={false}
      error={null}
      onReset={() => undefined}
      {...change}
      onAdd={onAdd}
    />,
  );
  const choose = (content: BlobPart, name = 'kitchen.csv') =>
    view.user.upload(screen.getByLabelText('CSV file of frames'), new File([content], name, { type: 'text/csv' }));
  return { ...view, onAdd, choose };
}
const shown = () => screen.findByRole('table', { name: 'Frames of the table' });
const cells = (row: HTMLElement) =>
  [...row.querySelectorAll('th, td')].map((cell) => cell.textContent?.trim().replace(/\s+/g, ' '));
const rowsOf = (table: HTMLElement) => within(table).getAllByRole('row').slice(1);

describe('FrameTablePage', () => {
  it('When there is no table yet, then it says what to do first, and nothing can be added', () => {
    page();
    expect(screen.getByText(/^Begin with the template/)).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Download the template' })).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull();
  });

  it('When the sample is looked at, then each row is drawn, and all its frames can be added', async () => {
    const { user, onAdd } = page();
    await user.click(screen.getByRole('button', { name: 'Look at a sample kitchen' }));
    const rows = rowsOf(await shown());
    expect(cells(rows[0]!)).toEqual(['2', '', 'B33 two doors', '33 × 30 1/2 in', '2', 'square', 'good']);
    // A picture has the perimeter, and a path for each opening.
    expect(rows.map((row) => row.querySelectorAll('svg path').length)).toEqual([3, 5, 5, 4, 3, 3, 3, 2]);
    expect(cells(rows[4]!).at(-1)).toContain('Caution: Dado Bottom breaks into opening B');
    expect(onAdd).not.toHaveBeenCalled();
    await user.click(screen.getByRole('button', { name: 'Add all 8 frames' }));
    expect(onAdd).toHaveBeenCalledExactlyOnceWith(framesOf(sampleFrameTable('in')));
  });

  it('When rows are wrong, then each cell is named by line and column, and the good frames alone can be added', async () => {
    const { user, choose, onAdd } = page();
    await choose(MISTAKES);
    const table = await screen.findByRole('table', { name: 'What is wrong in the table' });
    expect(rowsOf(table).map((row) => cells(row).slice(0, 3))).toEqual([
      ['3', 'height', '"30,5"'],
      ['4', 'unit', '"cm"'],
      ['5', 'mid-stile', 'nothing'],
      ['7', 'columns', 'Columns and mid-stiles are 7 in short of the width they share.'],
      ['8', 'arch', 'The arch of opening A rises 30 in; the opening has room for 9 1/2 in at most.'],
      ['8', 'arch', 'The arch of opening B rises 30 in; the opening has room for 9 1/2 in at most.'],
      ['9', 'edge', '"round"'],
      ['9', 'columns', '"one"'],
    ]);
    expect(screen.getByText(/8 rows: 2 good, 6 not\. Nothing is added yet/)).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Add the 2 good ones' }));
    expect(onAdd.mock.calls[0]![0].map(({ name }) => name)).toEqual(['B33 two doors', 'P24 pantry']);
  });

  it('When the table is not wanted, then nothing is added, and focus is where another can be chosen', async () => {
    const { user, choose, onAdd } = page();
    await choose(frameTableTemplate('in'));
    await shown();
    expect(screen.getByRole('button', { name: 'Add the frame' })).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Take nothing' }));
    expect(screen.queryByRole('table')).toBeNull();
    expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull();
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Choose a file' }));
    expect(onAdd).not.toHaveBeenCalled();
  });

  it('When a name stands twice or is in the job, then that is a caution, and the frames are good', async () => {
    const { choose } = page({ names: ['b33 TWO doors'] });
    const [head, first] = frameTableTemplate('in').split('\r\n');
    await choose([head, first, first].join('\r\n'));
    const rows = rowsOf(await shown());
    expect(cells(rows[0]!).at(-1)).toBe(
      'Caution: The job has a frame of this name already.Caution: Line 3 of the table: this name too.',
    );
    expect(screen.getByRole('button', { name: 'Add all 2 frames' })).toBeTruthy();
  });

  it.each([
    ['a picture', Uint8Array.from([0x89, 0x50, 0x4e, 0x47, 0, 1]), 'Got a file that is no text; takes a CSV file'],
    ['a spreadsheet', Uint8Array.from([0x50, 0x4b, 3, 4]), 'Got a spreadsheet’s own file or a zip; takes a CSV file'],
    [
      'a file that is too long',
      new Uint8Array(FRAME_TABLE_LIMITS.csvBytes + 1).fill(65),
      'takes a CSV file of at most 1048576.',
    ],
  ])('When %s is chosen, then it says what it is and what it takes', async (_what, content, message) => {
    const { choose } = page();
    await choose(content);
    expect((await screen.findByRole('alert')).textContent).toContain(message);
    expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull();
  });

  it('When the headings are wrong, or stand alone, then that is told and nothing can be added', async () => {
    const { choose } = page();
    await choose('name;unit;breadth\r\nB33;in;33');
    const table = await screen.findByRole('table', { name: 'What is wrong in the table' });
    expect(cells(rowsOf(table)[0]!).slice(0, 3)).toEqual(['1', 'breadth', 'a column that is not known']);
    await choose(frameTableTemplate('in').split('\r\n')[0]!);
    await waitFor(() => expect(screen.getByText(/The table has headings alone/)).toBeTruthy());
    expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull();
  });

  it('When the file is in Windows-1252, then its letters are to be looked at', async () => {
    const { choose } = page();
    // ü is 0xFC there (WHATWG Encoding Standard).
    const text = frameTableTemplate('in').replace('B33', 'B?33');
    await choose(Uint8Array.from([...text].map((letter) => (letter === '?' ? 0xfc : letter.charCodeAt(0)))));
    expect(rowsOf(await shown()).map((row) => cells(row)[2])).toEqual(['Bü33 two doors']);
    expect(screen.getByText(/was read as Windows-1252/)).toBeTruthy();
  });

  it('When the person may not add frames, then the table can be looked at only', async () => {
    const { choose } = page({ mayEdit: false, names: ['B33'] });
    await choose(sampleFrameTable('mm'));
    await shown();
    expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull();
    expect(screen.getByText('Designers and the owner add frames')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Download this job’s frames as a table' })).toBeTruthy();
  });

  it('When the server refuses a frame, then its line in the table is told', async () => {
    const error = new ApiError(400, 'invalid-input', 'Not taken.', [
      { path: 'frames.1.name', message: '', got: '"x"', takes: 'another name' },
    ]);
    const { choose } = page({ error });
    const good = MISTAKES.split('\r\n');
    await choose([good[0], good[1], good[2], good[5]].join('\r\n'));
    await shown();
    expect(screen.getByRole('alert').textContent).toBe(
      'Nothing added: Not taken. Line 4, name: Got "x"; takes another name.',
    );
  });
});

import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { StoredCutter } from '#shared/contracts/cutters.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { CuttersPage } from '../../../../src/features/cutters/cutters-page.tsx';
import { allowSlowMachine } from '../../../setup/slow-machine.ts';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

allowSlowMachine();

const STRAIGHT: StoredCutter = {
  id: 's',
  unit: 'in',
  cutter: { kind: 'straight', name: 'Straight 3/8', diameter: 0.375, fluteLength: 1.25, maxPass: 0.5 },
  remarks: 'Two flutes',
};
const VEE: StoredCutter = {
  id: 'v',
  unit: 'mm',
  cutter: { kind: 'vee', name: 'V 30', includedAngle: 30, fluteLength: 12, number: 4 },
  remarks: '',
};

const page = (change: object = {}) => (
  <CuttersPage cutters={[STRAIGHT, VEE]} shopName="Tern & Alder Joinery" unit="in" mayEdit mayEditFrames {...change} />
);
const rowOf = (name: string) => screen.getByRole('rowheader', { name }).closest('tr')!;
const field = (label: string) => screen.getByLabelText<HTMLInputElement>(label);
// Keys one by one take long where the whole dialog is drawn anew with each.
const enter = (label: string, value: string) => fireEvent.change(field(label), { target: { value } });

describe('CuttersPage', () => {
  it('When the drawer is shown, then each cutter stands there with its shape, its numbers and its remarks', () => {
    show(page());
    const straight = within(rowOf('Straight 3/8'));
    expect(straight.getByRole('img', { name: 'straight, diameter 3/8 in' })).toBeTruthy();
    expect(straight.getAllByRole('cell').map((cell) => cell.textContent)).toEqual([
      '',
      'straight, diameter 3/8 in',
      'none',
      '1/2 in',
      '1 1/4 in',
      'Two flutes',
      'ChangeDelete',
    ]);
    expect(within(rowOf('V 30')).getByText('all at once')).toBeTruthy();
  });

  it('When the shape is drawn, then its outline is as wide as the numbers say', () => {
    show(page());
    const points = (name: string) =>
      rowOf(name)
        .querySelector('polygon')!
        .getAttribute('points')!
        .split(' ')
        .map((pair) => pair.split(',').map(Number));
    // Circle of 3/8 in; a V of included angle 30° is 2 · 12 · tan 15° wide at 12 above its tip.
    const width = (name: string) =>
      Math.max(...points(name).map(([x]) => x!)) - Math.min(...points(name).map(([x]) => x!));
    expect(width('Straight 3/8')).toBeCloseTo(0.375, 12);
    expect(width('V 30')).toBeCloseTo(24 * Math.tan(Math.PI / 12), 12);
  });

  it('When the person may not change the drawer, then it can be read and exported only', () => {
    show(page({ mayEdit: false }));
    expect(screen.getAllByRole('button').map((b) => b.textContent?.trim())).toEqual(
      expect.arrayContaining(['Export as CSV']),
    );
    for (const name of [/^Change/, /^Delete/, /^Put in/, /^Import/])
      expect(screen.queryByRole('button', { name })).toBeNull();
  });

  it('When a cutter is put in, then its kind decides the fields, and lengths are sent as numbers', async () => {
    const seen = answerCalls(({ body }) => json({ id: 'n', ...(body as object) }, 201));
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Put in a cutter' }));
    expect(screen.queryByLabelText('Tip radius')).toBeNull();
    await user.selectOptions(screen.getByLabelText('Kind'), 'Tapered');
    enter('Name', 'Nose 1/16');
    enter('Tip radius', '1/16');
    enter('Angle of a side, degrees', '1.5');
    enter('Flute length', '1 1/4');
    await user.click(screen.getByRole('button', { name: 'Put it in the drawer' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(seen[0]).toMatchObject({
      method: 'POST',
      path: '/api/cutters',
      body: {
        unit: 'in',
        cutter: { kind: 'tapered', name: 'Nose 1/16', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 },
        remarks: '',
      },
    });
  });

  it('When entries are wrong, then each says what it takes, keeps the text typed, and nothing is sent', async () => {
    const seen = answerCalls(() => undefined);
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Put in a cutter' }));
    enter('Diameter', 'wide');
    await user.click(screen.getByRole('button', { name: 'Put it in the drawer' }));
    expect(field('Diameter').value).toBe('wide');
    expect(screen.getByText(/^Got “wide”; takes/)).toBeTruthy();
    for (const label of ['Name', 'Diameter', 'Flute length'])
      expect(field(label).getAttribute('aria-invalid')).toBe('true');
    expect(field('Deepest pass').getAttribute('aria-invalid')).toBeNull();
    expect(seen).toEqual([]);
  });

  it('When a change touches drafts, then they are listed with links and updated through a save with their version', async () => {
    const changed: StoredCutter = {
      ...STRAIGHT,
      cutter: { ...STRAIGHT.cutter, diameter: 0.374 } as StoredCutter['cutter'],
    };
    const draft = (id: string, particulars: Particulars, version: number) =>
      json({
        id,
        jobId: 'j',
        jobName: 'Kitchen',
        particulars,
        version,
        changedAt: '',
        changedBy: '',
        removed: false,
        revisions: [],
        draftChanged: true,
        tracing: null,
      });
    const seen = answerCalls(({ method, path }) => {
      if (method === 'PUT' && path === '/api/cutters/s')
        return json({
          cutter: changed,
          changes: ['diameter'],
          drafts: [
            { frameId: 'f1', frameName: 'B33 base', jobName: 'Kitchen', roles: ['dado', 'perimeter'] },
            { frameId: 'f2', frameName: 'B18 drawers', jobName: 'Kitchen', roles: ['dado'] },
          ],
        });
      if (path === '/api/frames/f1') return draft('f1', newFrame('in', 'B33 base'), 7);
      if (path === '/api/frames/f1/draft') return json({ version: 8, changedAt: '', draftChanged: true });
      if (path === '/api/frames/f2') return draft('f2', newFrame('in', 'B18 drawers'), 3);
      if (path === '/api/frames/f2/draft') return json({ code: 'stale-draft', message: 'Changed meanwhile.' }, 409);
      return undefined;
    });
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Change Straight 3/8' }));
    expect(field('Diameter').value).toBe('3/8');
    enter('Diameter', '0.374');
    await user.click(screen.getByRole('button', { name: 'Save the cutter' }));
    const link = await screen.findByRole('link', { name: 'B33 base' });
    expect(link.getAttribute('href')).toBe('/frames/f1');
    expect(link.closest('li')!.textContent).toContain('dados, perimeter');

    await user.click(screen.getByRole('button', { name: 'Update 2 drafts' }));
    await waitFor(() => expect(link.closest('li')!.textContent).toContain('updated'));
    await waitFor(() =>
      expect(screen.getByRole('link', { name: 'B18 drawers' }).closest('li')!.textContent).toContain(
        'not updated: Somebody else saved',
      ),
    );
    const saves = seen.filter((call) => call.method === 'PUT' && call.path.endsWith('/draft'));
    expect(saves[0]!.body).toMatchObject({
      version: 7,
      particulars: {
        name: 'B33 base',
        cutters: {
          dado: { diameter: 0.374 },
          squaring: { diameter: 0.374 },
          perimeter: { diameter: 0.374 },
          opening: { kind: 'tapered' },
        },
      },
    });
    expect(saves[1]!.body).toMatchObject({ version: 3 });
  });

  it('When a cutter is deleted, then it says so, and undo puts the same one back', async () => {
    const seen = answerCalls(({ method, body }) => {
      if (method === 'DELETE') return json({ cutter: null, changes: ['removed'], drafts: [] });
      return method === 'POST' ? json({ id: 'again', ...(body as object) }, 201) : undefined;
    });
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Delete Straight 3/8' }));
    expect(await screen.findByText('Straight 3/8 is out of the drawer.')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull());
    const { id: _id, ...entry } = STRAIGHT;
    expect(seen.map(({ method, path }) => `${method} ${path}`)).toEqual(['DELETE /api/cutters/s', 'POST /api/cutters']);
    expect(seen[1]!.body).toEqual(entry);
  });

  it('When a CSV file is chosen, then each row is shown against the drawer and nothing is taken before that is asked for', async () => {
    const problems = [{ line: 3, column: 'diameter', got: '"wide"', takes: 'a number', message: 'line 3' }];
    const rows = [
      { line: 2, name: 'Straight 3/8', is: 'changed', changes: [{ column: 'max pass', was: '0.5', is: '' }] },
      { line: 4, name: 'V 30', is: 'same', changes: [] },
      { line: 5, name: 'Straight 1/4', is: 'new', changes: [] },
    ];
    const { maxPass: _pass, ...cutter } = STRAIGHT.cutter;
    const changed = {
      before: STRAIGHT,
      answer: {
        cutter: { ...STRAIGHT, cutter },
        changes: ['maxPass'],
        drafts: [{ frameId: 'f1', frameName: 'B33 base', jobName: 'Kitchen', roles: ['dado'] }],
      },
    };
    const seen = answerCalls(({ path }) =>
      path.endsWith('take=true')
        ? json({ rows, problems, added: [{ ...STRAIGHT, id: 'n' }], changed: [changed] })
        : json({ rows, problems, added: [], changed: [] }),
    );
    const { user } = show(page());
    const file = new File(['name'], 'ours.csv', { type: 'text/csv' });
    await user.upload(screen.getByLabelText('CSV file of cutters'), file);
    const dialog = within(await screen.findByRole('dialog', { name: 'Cutters of ours.csv' }));
    expect(dialog.getByText(/^1 new, 1 changed, 1 in the drawer as it is, 1 problem\./)).toBeTruthy();
    const cells = (caption: string) =>
      within(dialog.getByRole('table', { name: caption }))
        .getAllByRole('row')
        .slice(1)
        .map((row) => [...row.children].map((cell) => cell.textContent));
    expect(cells('What is wrong in the file')).toEqual([['3', 'diameter', '"wide"', 'a number']]);
    expect(cells('Rows against the drawer')).toEqual([
      ['2', 'Straight 3/8', 'changed', 'max pass: nothing, was 0.5'],
      ['4', 'V 30', 'as it is', ''],
      ['5', 'Straight 1/4', 'new', ''],
    ]);
    expect(seen.map(({ path }) => path)).toEqual(['/api/cutters/csv']);

    await user.click(dialog.getByRole('button', { name: 'Take 2 good rows' }));
    expect(await screen.findByText('1 cutter put in and 1 changed from ours.csv.')).toBeTruthy();
    expect(seen.map(({ path }) => path)).toEqual(['/api/cutters/csv', '/api/cutters/csv?take=true']);
    expect((seen[1]!.body as FormData).get('file')).toMatchObject({ name: 'ours.csv' });
    expect(screen.getByRole('link', { name: 'B33 base' }).getAttribute('href')).toBe('/frames/f1');
  });

  it('When a CSV file has nothing that is not in the drawer, then there is nothing to take', async () => {
    answerCalls(() =>
      json({ rows: [{ line: 2, name: 'V 30', is: 'same', changes: [] }], problems: [], added: [], changed: [] }),
    );
    const { user } = show(page());
    await user.upload(screen.getByLabelText('CSV file of cutters'), new File(['name'], 'ours.csv'));
    const dialog = within(await screen.findByRole('dialog'));
    expect(dialog.getByText(/There is nothing to take/)).toBeTruthy();
    expect(dialog.queryByRole('button', { name: /^Take \d/ })).toBeNull();
  });

  it('When a cutter is typed and Escape is pressed, then it is asked first, and staying keeps what was typed', async () => {
    const seen = answerCalls(() => undefined);
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Put in a cutter' }));
    enter('Name', 'Half typed');
    const cutter = () => screen.queryByRole('dialog', { name: 'New cutter' });
    const asks = () => screen.queryByRole('dialog', { name: 'The new cutter is not saved' });
    fireEvent.keyDown(field('Name'), { key: 'Escape' });
    expect(asks()).toBeTruthy();
    // A second Escape stays too.
    fireEvent.keyDown(screen.getByRole('button', { name: 'Stay' }), { key: 'Escape' });
    expect(asks()).toBeNull();
    expect(field('Name').value).toBe('Half typed');
    await user.click(within(cutter()!).getByRole('button', { name: 'Cancel' }));
    await user.click(screen.getByRole('button', { name: 'Leave without saving' }));
    expect([cutter(), asks()]).toEqual([null, null]);
    expect(seen).toEqual([]);
  });

  it('When nothing was typed, then Escape closes the cutter at once', async () => {
    const { user } = show(page());
    await user.click(screen.getByRole('button', { name: 'Change V 30' }));
    fireEvent.keyDown(field('Name'), { key: 'Escape' });
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('When the drawer is empty, then common sizes are offered in the unit of the shop', async () => {
    const seen = answerCalls(() => json({ rows: [], problems: [], added: [STRAIGHT], changed: [] }));
    const { user } = show(page({ cutters: [], unit: 'mm' }));
    await user.click(screen.getByRole('button', { name: 'Begin with common sizes in millimetres' }));
    await waitFor(() => expect(seen.map(({ path }) => path)).toEqual(['/api/cutters/csv?take=true']));
    expect(await ((seen[0]!.body as FormData).get('file') as File).text()).toContain('Straight 10,mm,straight');
  });
});

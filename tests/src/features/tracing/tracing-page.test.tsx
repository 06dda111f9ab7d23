import { screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { Tracing } from '#shared/contracts/tracings.ts';
import { NotTraceable } from '#shared/kernel/tracing/not-traceable.ts';
import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { sampleDrawing } from '../../../../src/features/tracing/sample-drawing.ts';
import { TracingPage } from '../../../../src/features/tracing/tracing-page.tsx';
import { drawing, frameDrawing, rectangleLines } from '../../../builders/drawings.ts';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const TRACING: Tracing = {
  id: 't1',
  jobId: 'j1',
  jobName: 'Fenwick Lane kitchen',
  fileName: 'base.dxf',
  bytes: 1,
  sha256: '0',
  uploadedBy: 'Ada Fell',
  uploadedAt: '2026-05-04T10:00:00.000Z',
  removed: false,
  frames: [],
};

beforeEach(() => {
  // jsdom lays nothing out.
  Element.prototype.getBoundingClientRect = () => new DOMRect(0, 0, 400, 400);
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      disconnect() {}
    },
  );
});

/** The page of a drawing that the kernel reads as the server would. */
function showDrawing(text: string, mayEdit = true, tracing: Partial<Tracing> = {}) {
  const onAdded = vi.fn();
  const seen = answerCalls(({ path, body }) => {
    if (path === '/api/tracings/t1/frames') return json({ frames: [{ id: 'f1', name: 'base' }] }, 201);
    if (path !== '/api/tracings/t1/reading') return undefined;
    try {
      return json(traceDrawing(new TextEncoder().encode(text), (body as { options: TraceOptions }).options));
    } catch (error) {
      if (!(error instanceof NotTraceable)) throw error;
      return json({ code: 'drawing-refused', message: error.message, details: { reason: error.code } }, 422);
    }
  });
  const page = show(
    <TracingPage tracing={{ ...TRACING, ...tracing }} shopName="Tern & Alder" mayEdit={mayEdit} onAdded={onAdded} />,
  );
  return { ...page, seen, onAdded };
}

const roleOf = (loop: number) => screen.getByRole<HTMLSelectElement>('combobox', { name: `Loop ${loop} is` });
const addButton = () => screen.getByRole<HTMLButtonElement>('button', { name: /^Add / });
const readings = (seen: { path: string; body: unknown }[]): TraceOptions[] =>
  seen.filter(({ path }) => path.endsWith('/reading')).map(({ body }) => (body as { options: TraceOptions }).options);

describe('TracingPage', () => {
  it('When the file does not say its unit, then nothing else goes on before one is chosen by its size', async () => {
    const { seen, user } = showDrawing(frameDrawing(null));
    const millimetres = await screen.findByRole('button', { name: /^Millimetres 20 × 30 mm/ });
    // 20 / 25.4 and 30 / 25.4.
    expect(millimetres.textContent).toContain('≈0.7874 × ≈1.1811 in');
    expect(screen.getByRole('button', { name: /^Inches 20 × 30 in that is 508 × 762 mm$/ })).toBeTruthy();
    expect(addButton().disabled).toBe(true);
    expect(screen.queryByRole('combobox')).toBeNull();
    await user.click(millimetres);
    expect(await screen.findByLabelText('Name of frame 1')).toBeTruthy();
    expect(readings(seen).map(({ unit }) => unit)).toEqual([null, 'mm']);
    expect(addButton().disabled).toBe(false);
  });

  it('When a loop’s role changes, then the frames follow at once, and undo and redo take the step back and forth', async () => {
    const { user } = showDrawing(sampleDrawing());
    expect(await screen.findByText('2 openings, 0 dados')).toBeTruthy();
    await user.selectOptions(roleOf(2), 'leave-out');
    expect(screen.queryByText('2 openings, 0 dados')).toBeNull();
    await user.keyboard('{Control>}z{/Control}');
    expect(screen.getByText('2 openings, 0 dados')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Redo' }));
    expect(roleOf(2).value).toBe('leave-out');
  });

  it('When several loops are chosen, then one press makes all of them the same', async () => {
    const { user } = showDrawing(sampleDrawing());
    await user.click(await screen.findByRole('checkbox', { name: /^Loop 2 / }));
    await user.click(screen.getByRole('checkbox', { name: /^Loop 3 / }));
    const bar = screen.getByRole('group', { name: 'Make it' });
    await user.click(within(bar).getByRole('button', { name: 'Dado' }));
    expect([roleOf(2).value, roleOf(3).value]).toEqual(['dado', 'dado']);
    expect(screen.getByText('0 openings, 2 dados')).toBeTruthy();
  });

  it('When the drawing has the keyboard, then its keys walk the loops and say what they are', async () => {
    const { user } = showDrawing(sampleDrawing());
    (await screen.findByRole('group', { name: /^Drawing/ })).focus();
    await user.keyboard('nnl');
    expect(roleOf(2).value).toBe('leave-out');
    await user.keyboard('bp');
    expect(roleOf(1).value).toBe('perimeter');
    expect(screen.getByText(/^Loop 1, .*: perimeter\.$/)).toBeTruthy();
  });

  it('When frames are added, then the roles, names and the options of this reading are sent, and it leads on', async () => {
    const { seen, onAdded, user } = showDrawing(frameDrawing());
    const name = await screen.findByLabelText('Name of frame 1');
    await user.clear(name);
    expect(addButton().disabled).toBe(true);
    await user.type(name, 'B20 base');
    await user.click(screen.getByRole('checkbox', { name: 'Frame 1 as stiles and rails' }));
    await user.click(addButton());
    await waitFor(() => expect(onAdded).toHaveBeenCalledWith([{ id: 'f1', name: 'base' }]));
    expect(seen.at(-1)!.body).toMatchObject({
      confirmed: false,
      roles: ['perimeter', 'opening'],
      frames: [{ name: 'B20 base', asMembers: true }],
      options: { unit: null, gap: 0.05, view: 'front' },
    });
  });

  it('When an outline is none of stiles and rails, then it says why and cannot be chosen', async () => {
    showDrawing(drawing(rectangleLines(0, 0, 20, 30)));
    const box = await screen.findByRole<HTMLInputElement>('checkbox', { name: 'Frame 1 as stiles and rails' });
    expect(box.disabled).toBe(true);
    expect(screen.getByText('There is no opening, so there are no stiles and rails.')).toBeTruthy();
  });

  it('When an option changes, then the drawing is read again, and roles that were chosen stay', async () => {
    const { seen, user } = showDrawing(sampleDrawing());
    await user.selectOptions(await screen.findByRole('combobox', { name: 'Loop 2 is' }), 'leave-out');
    const gap = screen.getByLabelText('Close gaps up to, mm');
    await user.clear(gap);
    await user.type(gap, '0.2{Enter}');
    await waitFor(() => expect(readings(seen).at(-1)!.gap).toBe(0.2));
    await waitFor(() => expect(screen.queryByText('Reading the drawing again.')).toBeNull());
    expect(roleOf(2).value).toBe('leave-out');
    await user.clear(gap);
    await user.type(gap, '7{Enter}');
    expect(screen.getByText('Got “7”; takes millimetres from 0 to 1.')).toBeTruthy();
    expect(readings(seen)).toHaveLength(2);
  });

  it('When a loop of which something was said is not in the next reading, then the page says so', async () => {
    const { user } = showDrawing(sampleDrawing());
    // The second opening of the first frame, whose corner is not closed.
    await user.selectOptions(await screen.findByRole('combobox', { name: 'Loop 3 is' }), 'leave-out');
    const gap = screen.getByLabelText('Close gaps up to, mm');
    await user.clear(gap);
    await user.type(gap, '0{Enter}');
    expect(await screen.findByText(/What you said of 1 loop of the reading before is not carried over/)).toBeTruthy();
  });

  it('When another reading fails, then the old one stays and can be gone back to', async () => {
    const { user } = showDrawing(sampleDrawing());
    await screen.findByLabelText('Name of frame 1');
    answerCalls(() => json({ code: 'drawing-refused', message: 'Too slow to read.', details: { reason: 'x' } }, 422));
    await user.click(screen.getByRole('radio', { name: 'Back' }));
    expect((await screen.findByRole('alert')).textContent).toContain('Too slow to read.');
    expect(screen.getByLabelText('Name of frame 1')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Back to the last reading' }));
    expect(screen.queryByRole('alert')).toBeNull();
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Front' }).checked).toBe(true);
  });

  it('When a reading is cancelled, then the last one holds with its options', async () => {
    const { user } = showDrawing(sampleDrawing());
    await screen.findByLabelText('Name of frame 1');
    vi.stubGlobal(
      'fetch',
      (_: string, { signal }: RequestInit) =>
        new Promise((_resolve, reject) =>
          signal!.addEventListener('abort', () => reject(new DOMException('gone', 'AbortError'))),
        ),
    );
    await user.click(screen.getByRole('radio', { name: 'Back' }));
    expect(await screen.findByText('Reading the drawing again.')).toBeTruthy();
    expect(addButton().disabled).toBe(true);
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    await waitFor(() => expect(screen.queryByText('Reading the drawing again.')).toBeNull());
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Front' }).checked).toBe(true);
    expect(addButton().disabled).toBe(false);
  });

  it('When the file cannot be read, then the server’s advice is shown', async () => {
    showDrawing('%PDF-1.7\n');
    expect((await screen.findByRole('alert')).textContent).toMatch(/PDF.*Export the drawing as an ASCII DXF/);
    expect(addButton().disabled).toBe(true);
  });

  it('When the end of the file is missing, then a person has to confirm before frames are added', async () => {
    const { user } = showDrawing(frameDrawing().replace('0\nENDSEC\n0\nEOF\n', ''));
    const confirm = await screen.findByRole('checkbox', { name: /all that belongs to the frames is there/ });
    expect(addButton().disabled).toBe(true);
    await user.click(confirm);
    expect(addButton().disabled).toBe(false);
  });

  it('When something was said, then leaving asks; frames that were added end that', async () => {
    const { user, router } = showDrawing(frameDrawing());
    await user.type(await screen.findByLabelText('Name of frame 1'), ' two');
    await user.click(screen.getByRole('link', { name: 'Fenwick Lane kitchen' }));
    await user.click(await screen.findByRole('button', { name: 'Stay' }));
    expect(router.state.location.pathname).toBe('/');
    await user.click(addButton());
    await waitFor(() => expect(addButton().getAttribute('aria-disabled')).not.toBe('true'));
    await user.click(screen.getByRole('link', { name: 'Fenwick Lane kitchen' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/jobs/j1'));
  });

  it('When the census is read, then kept, set aside and refused add up, and a switch reads again', async () => {
    const bad = [0, 'LINE', 8, 'X', 10, '1,5', 20, 0, 11, 3, 21, 4];
    const { seen, user } = showDrawing(drawing([...rectangleLines(0, 0, 20, 30), ...bad]));
    expect(await screen.findByText('4 kept + 0 set aside + 1 refused = 5 entities')).toBeTruthy();
    const table = screen.getByRole('table', { name: 'Entities of the file' });
    expect(within(table).getByRole('row', { name: /LINE on X Refused/ }).textContent).toContain(
      'a number that is none',
    );
    await user.click(screen.getByRole('checkbox', { name: 'Layers that are off' }));
    await waitFor(() => expect(readings(seen).at(-1)!.include.offLayers).toBe(true));
  });

  it('When something is at a place, then the list says where in the drawing’s own coordinates, and shows it there', async () => {
    const { user } = showDrawing(sampleDrawing());
    // The corner that the sample leaves 0.001 open, at 17.25, 1.25.
    const said = await screen.findByText('A gap of 0.0254 mm was closed here.', { exact: false });
    expect(said.textContent).toMatch(/At 17\.25\d*, 1\.25\d* in\./);
    await user.click(screen.getByRole('button', { name: 'Show 1 on the drawing' }));
    const svg = screen.getByRole('img', { name: /^Drawing/ });
    expect(within(svg).getByText('1 Note')).toBeTruthy();
    // In the middle of the page.
    expect(svg.querySelector('g[transform^="translate(200 200)"]')).toBeTruthy();
  });

  it('When a layer is left out, then the drawing is read without it, and it can be read again', async () => {
    const other = rectangleLines(5, 5, 8, 8).map((tag) => (tag === 'FRAME' ? 'SHELF' : tag));
    const { seen, user } = showDrawing(drawing([...rectangleLines(0, 0, 20, 30), ...other]));
    expect(await screen.findByText('1 opening, 0 dados')).toBeTruthy();
    const layers = screen.getByRole('group', { name: 'Layers that are read' });
    await user.click(within(layers).getByRole('checkbox', { name: 'SHELF 4' }));
    expect(await screen.findByText('0 openings, 0 dados')).toBeTruthy();
    expect(readings(seen).at(-1)!.leaveOut).toEqual(['SHELF']);
    await user.click(within(layers).getByRole('checkbox', { name: 'SHELF 4' }));
    expect(await screen.findByText('1 opening, 0 dados')).toBeTruthy();
  });

  it('When the person may not edit frames, then there is all to see and nothing to add', async () => {
    showDrawing(frameDrawing(), false);
    const name = await screen.findByLabelText<HTMLInputElement>('Name of frame 1');
    expect(name.readOnly).toBe(true);
    expect(roleOf(1).disabled).toBe(true);
    expect(screen.queryByRole('button', { name: /^Add / })).toBeNull();
    expect(screen.queryByRole('group', { name: 'Make it' })).toBeNull();
    expect(screen.getByText('Designers and the owner add frames')).toBeTruthy();
  });

  it('When frames came of it before, then they are named with links', async () => {
    showDrawing(frameDrawing(), true, { frames: [{ id: 'f9', name: 'First try' }] });
    expect(screen.getByRole('link', { name: 'First try' }).getAttribute('href')).toBe('/frames/f9');
    await screen.findByLabelText('Name of frame 1');
  });
});

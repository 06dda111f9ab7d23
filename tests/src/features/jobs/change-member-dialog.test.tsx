import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { ChangeMemberDialog } from '../../../../src/features/jobs/change-member-dialog.tsx';
import { answerCalls, json, type SeenCall } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const VERSIONS: Record<string, number> = { Base: 3, Wall: 7, Tall: 1, Metric: 2 };

const stored = (id: string, unit: Unit = 'in') => ({
  id,
  jobId: 'j1',
  jobName: 'Fenwick Lane kitchen',
  particulars: newFrame(unit, id),
  version: VERSIONS[id],
  changedAt: '2026-05-01T08:00:00.000Z',
  changedBy: 'Ines Alder',
  removed: false,
  revisions: [],
  draftChanged: false,
  tracing: null,
});

const savedAnswer = () => json({ version: 99, changedAt: '2026-05-01T09:00:00.000Z', draftChanged: true });

/** A server with these frames; `save` answers what is saved, by frame. */
function serve(ids: readonly string[], save: (id: string) => Response = savedAnswer): SeenCall[] {
  return answerCalls(({ method, path }) => {
    const id = path.split('/')[3]!;
    if (method === 'PUT') return save(id);
    return ids.includes(id) ? json(stored(id, id === 'Metric' ? 'mm' : 'in')) : undefined;
  });
}

async function open(ids: readonly string[]) {
  const onClose = vi.fn();
  const shown = show(<ChangeMemberDialog frameIds={ids} unit="in" onClose={onClose} />);
  await screen.findByLabelText('New length');
  return { onClose, ...shown };
}

/** Types the whole text and leaves the field. */
function enter(value: string) {
  const field = screen.getByLabelText('New length');
  fireEvent.change(field, { target: { value } });
  fireEvent.blur(field);
}
const row = (name: string) => screen.getByRole('row', { name: new RegExp(`^${name}`) });
const puts = (seen: readonly SeenCall[]) => seen.filter(({ method }) => method === 'PUT');

describe('ChangeMemberDialog', () => {
  it('When it opens, then the length begins as it is now and nothing is to be saved', async () => {
    serve(['Base']);
    await open(['Base']);
    expect(screen.getByLabelText<HTMLInputElement>('New length').value).toBe('1 3/4');
    expect(row('Base').textContent).toContain('Stays as it is, left stile: 1 3/4 in already');
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Nothing to save' }).disabled).toBe(true);
  });

  it('When a stile is made wider, then each frame says what changes and what goes along, and is saved with its version', async () => {
    const seen = serve(['Base', 'Wall']);
    const { user } = await open(['Base', 'Wall']);
    enter('2');
    expect(row('Base').textContent).toContain('left stile: 2 in, was 1 3/4 in');
    // Two equal openings: the mid-stile and the partition centred behind it move by half of what the stile grows.
    expect(row('Base').textContent).toContain('Partition stands at 16 1/4 in, was 16 1/8 in');
    await user.click(screen.getByRole('button', { name: 'Change and save 2 frames' }));
    expect(await screen.findByText('2 frames saved, 0 stale, 0 refused.')).toBeTruthy();
    expect(puts(seen)).toMatchObject([
      {
        path: '/api/frames/Base/draft',
        body: { version: 3, particulars: { name: 'Base', outline: { stiles: { left: 2, right: 1.75 } } } },
      },
      { path: '/api/frames/Wall/draft', body: { version: 7, particulars: { name: 'Wall' } } },
    ]);
    expect(within(row('Wall')).getByText('saved')).toBeTruthy();
  });

  it('When one is stale and one refused, then each says so and the others are saved all the same', async () => {
    const refusals: Record<string, () => Response> = {
      Base: () => json({ code: 'stale-draft', message: 'stale' }, 409),
      Wall: () => json({ code: 'too-large', message: 'This frame is too large to keep.' }, 413),
    };
    const seen = serve(['Base', 'Wall', 'Tall'], (id) => (refusals[id] ?? savedAnswer)());
    const { user } = await open(['Base', 'Wall', 'Tall']);
    enter('2');
    await user.click(screen.getByRole('button', { name: 'Change and save 3 frames' }));
    expect(await screen.findByText('1 frame saved, 1 stale, 1 refused.')).toBeTruthy();
    expect(row('Base').textContent).toContain('stale: somebody else saved it meanwhile');
    expect(row('Wall').textContent).toContain('refused: This frame is too large to keep.');
    expect(within(row('Tall')).getByText('saved')).toBeTruthy();
    expect(puts(seen)).toHaveLength(3);
  });

  it('When a frame cannot take the change, then it says why and is not sent', async () => {
    const seen = serve(['Base', 'Metric']);
    const { user } = await open(['Base', 'Metric']);
    enter('2');
    expect(row('Metric').textContent).toContain('Not changed: The frame is in millimetres, the change in inches.');
    await user.click(screen.getByRole('button', { name: 'Change and save 1 frame' }));
    expect(await screen.findByText('1 frame saved, 0 stale, 0 refused.')).toBeTruthy();
    expect(puts(seen).map(({ path }) => path)).toEqual(['/api/frames/Base/draft']);
  });

  it('When a member would leave an opening no room, then it says so and nothing can be saved', async () => {
    serve(['Base']);
    await open(['Base']);
    enter('40');
    expect(row('Base').textContent).toContain('Not changed: ');
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Nothing to save' }).disabled).toBe(true);
  });

  it('When the length cannot be read, then nothing is saved from the one before it', async () => {
    const seen = serve(['Base']);
    const { user } = await open(['Base']);
    enter('2');
    enter('two');
    await user.click(screen.getByRole('button', { name: 'Change and save 1 frame' }));
    expect(screen.getByRole('alert').textContent).toContain('The length cannot be read.');
    expect(puts(seen)).toEqual([]);
  });

  it('When it is closed while drafts are saved, then it stops and says which are left', async () => {
    let answer = (_: Response): void => undefined;
    answerCalls(({ method, path }) => (method === 'PUT' ? undefined : json(stored(path.split('/')[3]!))));
    const fetched = globalThis.fetch;
    vi.stubGlobal('fetch', (path: string, init: RequestInit) =>
      init.method === 'PUT' ? new Promise<Response>((resolve) => (answer = resolve)) : fetched(path, init),
    );
    const { user, onClose } = await open(['Base', 'Wall']);
    enter('2');
    await user.click(screen.getByRole('button', { name: 'Change and save 2 frames' }));
    await user.click(screen.getByRole('button', { name: 'Close' }));
    expect(onClose).not.toHaveBeenCalled();
    answer(savedAnswer());
    expect(await screen.findByText('1 frame saved, 0 stale, 0 refused, 1 left.')).toBeTruthy();
    expect(row('Wall').textContent).toContain('left as it was: stopped before its turn');
    await user.click(screen.getByRole('button', { name: 'Close' }));
    expect(onClose).toHaveBeenCalledTimes(1);
  });
});

import { afterEach, describe, expect, it } from 'vitest';
import { startMakers, type Caps } from '../../../server/making/start-makers.ts';
import type { Makers, Tasks } from '../../../server/making/tasks.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';

allowSlowMachine();

let makers: Makers;
const start = (size: number, caps?: Caps) =>
  (makers = startMakers(new URL('./faulty-worker.mjs', import.meta.url), size, caps));
const act = (what: string, signal?: AbortSignal) =>
  makers.make('summary', { act: what } as unknown as Tasks['summary']['input'], signal) as Promise<unknown>;
afterEach(() => makers.close());

describe('The pool of workers', () => {
  it('When tasks come one after another, then one worker does them all', async () => {
    start(2);
    expect(new Set([await act('answer'), await act('answer'), await act('answer')]).size).toBe(1);
  });

  it('When many come at once, then no more workers than allowed do them', async () => {
    start(2);
    expect(new Set(await Promise.all(Array.from({ length: 20 }, () => act('answer')))).size).toBe(2);
  });

  it.each(['break', 'end'])(
    'When a worker comes to grief (%s), then its task fails and the next ones are done by another',
    async (what) => {
      start(1);
      const failing = act(what);
      const next = act('answer');
      await expect(failing).rejects.toThrow(/a worker (broke down|ended)/);
      expect(await next).toEqual(expect.any(Number));
      expect(await act('answer')).toEqual(expect.any(Number));
    },
  );

  it('When a task never ends, then it is given up after its time, and the next is done', async () => {
    start(1, { timeMs: 5000, memoryMb: 200, remedy: 'Send less.' });
    const hanging = act('hang');
    const next = act('answer');
    await expect(hanging).rejects.toMatchObject({
      code: 'too-large',
      userMessage: 'This takes longer than 5 seconds to work out and was given up. Send less.',
    });
    expect(await next).toEqual(expect.any(Number));
  });

  it('When a task wants more memory than it may have, then it is given up by that name, and the next is done', async () => {
    start(1, { timeMs: 60_000, memoryMb: 100, remedy: 'Send less.' });
    const hoarding = act('hoard');
    const next = act('answer');
    await expect(hoarding).rejects.toMatchObject({
      code: 'too-large',
      userMessage: 'This takes more than 100 MB of memory to work out and was given up. Send less.',
    });
    expect(await next).toEqual(expect.any(Number));
  });

  it('When a proof fails, then it comes back as that, and the worker goes on', async () => {
    start(1);
    const before = await act('answer');
    await expect(act('refuse')).rejects.toMatchObject({ code: 'proof-failed', details: { proof: { ok: false } } });
    expect(await act('answer')).toBe(before);
  });

  it('When too many wait, then further ones are turned away at once', async () => {
    start(1);
    const tasks = Array.from({ length: 80 }, () => act('answer').catch((error: { code: string }) => error.code));
    const results = await Promise.all(tasks);
    // One is under way and 64 wait; the rest is turned away.
    expect(results.filter((r) => r === 'too-many-requests')).toHaveLength(80 - 65);
  });

  it('When the asker has gone before the turn came, then the task is not done', async () => {
    start(1);
    const gone = new AbortController();
    const first = act('answer');
    const second = act('hang', gone.signal);
    gone.abort(new Error('gone'));
    await expect(second).rejects.toThrow('gone');
    expect(await first).toEqual(await act('answer'));
  });
});

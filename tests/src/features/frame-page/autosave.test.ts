import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import type { StaleDraft } from '#shared/contracts/frames.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { createAutosave, type SaveFailure } from '../../../../src/features/frame-page/model/autosave.ts';

const base = newFrame('in', 'Base');
const wide = (width: number): Particulars => setField(base, 'outline.width', width);

/** A server whose answers are given one by one. */
function setUp() {
  const calls: {
    draft: { version: number; particulars: Particulars };
    answer: (version: number) => void;
    refuse: (failure: SaveFailure) => void;
  }[] = [];
  const autosave = createAutosave({
    version: 1,
    saved: base,
    save: (draft) =>
      new Promise((resolve, reject) => {
        calls.push({
          draft,
          answer: (version) => resolve({ version }),
          refuse: (failure) => reject(failure as unknown as Error),
        });
      }),
    judge: (error) => error as SaveFailure,
  });
  return { autosave, calls, at: () => autosave.store.get() };
}

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('autosave', () => {
  test('When typing pauses, then the newest draft is sent once, with the version it started from', async () => {
    const { autosave, calls, at } = setUp();
    autosave.change(wide(3));
    await vi.advanceTimersByTimeAsync(500);
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(599);
    expect(calls).toHaveLength(0);
    expect(at()).toEqual({ kind: 'saving' });
    await vi.advanceTimersByTimeAsync(1);
    expect(calls.map((c) => c.draft)).toEqual([{ version: 1, particulars: wide(36) }]);
    calls[0]!.answer(2);
    await vi.advanceTimersByTimeAsync(0);
    expect(at()).toEqual({ kind: 'saved' });
  });

  test('When a save is under way, then the next one waits for its answer and goes out with the new version', async () => {
    const { autosave, calls, at } = setUp();
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(600);
    autosave.change(wide(37));
    await vi.advanceTimersByTimeAsync(5_000);
    expect(calls).toHaveLength(1);
    calls[0]!.answer(2);
    await vi.advanceTimersByTimeAsync(600);
    expect(calls[1]!.draft).toEqual({ version: 2, particulars: wide(37) });
    expect(at()).toEqual({ kind: 'saving' });
    calls[1]!.answer(3);
    await vi.advanceTimersByTimeAsync(0);
    expect(at()).toEqual({ kind: 'saved' });
  });

  test('When the server cannot be reached, then it says why and tries again, each time after a longer wait', async () => {
    const { autosave, calls, at } = setUp();
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(600);
    for (const wait of [1_000, 2_000, 4_000]) {
      calls.at(-1)!.refuse({ kind: 'retry', why: 'no connection' });
      await vi.advanceTimersByTimeAsync(0);
      expect(at()).toEqual({ kind: 'not-saved', why: 'no connection', retries: true });
      const before = calls.length;
      await vi.advanceTimersByTimeAsync(wait - 1);
      expect(calls).toHaveLength(before);
      await vi.advanceTimersByTimeAsync(1);
      expect(calls).toHaveLength(before + 1);
    }
    calls.at(-1)!.answer(2);
    await vi.advanceTimersByTimeAsync(0);
    expect(at()).toEqual({ kind: 'saved' });
  });

  test('When a draft is refused for good, then it waits for the next change', async () => {
    const { autosave, calls, at } = setUp();
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(600);
    calls[0]!.refuse({ kind: 'give-up', why: 'not allowed' });
    await vi.advanceTimersByTimeAsync(120_000);
    expect(calls).toHaveLength(1);
    expect(at()).toEqual({ kind: 'not-saved', why: 'not allowed', retries: false });
    autosave.change(wide(37));
    await vi.advanceTimersByTimeAsync(600);
    expect(calls).toHaveLength(2);
  });

  test('When somebody else saved meanwhile, then nothing is sent until a person has chosen, and then from their version', async () => {
    const { autosave, calls, at } = setUp();
    const stale = { version: 7, particulars: wide(50) } as StaleDraft;
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(600);
    calls[0]!.refuse({ kind: 'stale', stale });
    await vi.advanceTimersByTimeAsync(0);
    expect(at()).toEqual({ kind: 'stale', stale, base });
    autosave.change(wide(37));
    await vi.advanceTimersByTimeAsync(60_000);
    expect(calls).toHaveLength(1);
    autosave.goOnFrom(7, wide(50));
    autosave.change(wide(37));
    await vi.advanceTimersByTimeAsync(600);
    expect(calls[1]!.draft).toEqual({ version: 7, particulars: wide(37) });
  });

  test('When a change is taken back before it was sent, then nothing is sent', async () => {
    const { autosave, calls, at } = setUp();
    autosave.change(wide(36));
    autosave.change(base);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(calls).toHaveLength(0);
    expect(at()).toEqual({ kind: 'saved' });
  });

  test('When a release asks for a save during one that is older, then it waits for both', async () => {
    const { autosave, calls } = setUp();
    autosave.change(wide(36));
    await vi.advanceTimersByTimeAsync(600);
    autosave.change(wide(37));
    const flushed = autosave.flush();
    calls[0]!.answer(2);
    await vi.advanceTimersByTimeAsync(0);
    expect(calls[1]!.draft).toEqual({ version: 2, particulars: wide(37) });
    calls[1]!.answer(3);
    expect(await flushed).toBe(true);
    expect(autosave.version()).toBe(3);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(calls).toHaveLength(2);
  });

  test('When a save asked for fails, then it answers that not everything is saved', async () => {
    const { autosave, calls } = setUp();
    autosave.change(wide(36));
    const flushed = autosave.flush();
    calls[0]!.refuse({ kind: 'give-up', why: 'not allowed' });
    expect(await flushed).toBe(false);
  });

  test('When it is stopped, then nothing is sent by itself any more', async () => {
    const { autosave, calls } = setUp();
    autosave.change(wide(36));
    autosave.stop();
    await vi.advanceTimersByTimeAsync(60_000);
    expect(calls).toHaveLength(0);
  });
});

import { describe, expect, test } from 'vitest';
import { CannotCut, GivenUp, WorkshopClient } from '../../../../src/features/cut-part/sweeping/workshop-client.ts';
import type { Measured } from '#shared/kernel/height-field/measure-frame.ts';
import { FakeWorker } from './fake-worker.ts';
import { filesOf, smallFrame } from './parts.ts';

const measured: Measured = {
  cell: 1,
  fineCell: 0.1,
  front: { left: null, cut: null },
  back: { left: null, cut: null },
};
const frame = filesOf(smallFrame());

function clientWith() {
  const workers: FakeWorker[] = [];
  const client = new WorkshopClient(() => {
    workers.push(new FakeWorker());
    return workers.at(-1) as unknown as Worker;
  });
  const ask = (control = new AbortController(), of = frame) => {
    const shares: number[] = [];
    return {
      control,
      shares,
      answer: client.ask(of, { kind: 'measure' }, (done) => shares.push(done), control.signal),
    };
  };
  return { client, workers, ask };
}

describe('When the page asks its worker', () => {
  test('then the frame is sent once, then each wish, and the answer comes to who asked', async () => {
    const { workers, ask } = clientWith();
    const [first, second] = [ask(), ask()];
    const [worker] = workers;
    expect(worker!.sent.map((m) => m.kind)).toEqual(['frame', 'ask', 'ask']);
    worker!.say({ kind: 'progress', id: 2, done: 0.5 });
    worker!.say({ kind: 'answer', id: 2, answer: measured });
    worker!.say({ kind: 'answer', id: 1, answer: measured });
    expect(await second.answer).toBe(measured);
    expect(await first.answer).toBe(measured);
    expect([first.shares, second.shares]).toEqual([[], [0.5]]);
    expect(workers).toHaveLength(1);
  });

  test('then cancelling tells the worker, and the wish is given up', async () => {
    const { workers, ask } = clientWith();
    const one = ask();
    one.control.abort();
    await expect(one.answer).rejects.toBeInstanceOf(GivenUp);
    expect(workers[0]!.sent.at(-1)).toEqual({ kind: 'cancel', id: 1 });
    // An answer that was under way already finds nobody.
    workers[0]!.say({ kind: 'answer', id: 1, answer: measured });
  });

  test('then another frame gives up what was asked about the one before', async () => {
    const { workers, ask } = clientWith();
    const old = ask();
    const fresh = ask(undefined, filesOf(smallFrame({ name: 'Another' })));
    await expect(old.answer).rejects.toBeInstanceOf(GivenUp);
    workers[0]!.say({ kind: 'answer', id: 2, answer: measured });
    expect(await fresh.answer).toBe(measured);
  });

  test('then a frame that cannot be cut and a mistake of the program are told apart', async () => {
    const { workers, ask } = clientWith();
    const [refused, failed] = [ask(), ask()];
    workers[0]!.say({ kind: 'refused', id: 1, reason: 'the back face has no lines' });
    workers[0]!.say({ kind: 'failed', id: 2, message: 'out of memory' });
    await expect(refused.answer).rejects.toThrow(new CannotCut('the back face has no lines'));
    await expect(failed.answer).rejects.toThrow('out of memory');
    await expect(failed.answer).rejects.not.toBeInstanceOf(CannotCut);
  });

  test('then a worker that breaks is said to, and a new one is started with the next wish', async () => {
    const { workers, ask } = clientWith();
    const one = ask();
    workers[0]!.onerror!({ message: 'no such file' });
    await expect(one.answer).rejects.toThrow('no such file');
    expect(workers[0]!.isEnded).toBe(true);
    const next = ask();
    workers[1]!.say({ kind: 'answer', id: 2, answer: measured });
    expect(await next.answer).toBe(measured);
  });
});

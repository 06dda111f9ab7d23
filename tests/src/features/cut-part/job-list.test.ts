import { describe, expect, test } from 'vitest';
import { JobList, type JobNews } from '../../../../src/features/cut-part/sweeping/job-list.ts';

/** A list whose clock goes on by one with each piece of work. */
function listWithClock() {
  const news: JobNews<string>[] = [];
  const clock = { now: 0, worked: [] as string[] };
  const jobs = new JobList<string>(
    (one) => news.push(one),
    () => clock.now,
  );
  function* work(name: string, pieces: number): Generator<number, string, void> {
    for (let i = 1; i <= pieces; i++) {
      clock.now += 1;
      clock.worked.push(name);
      yield i / pieces;
    }
    return `${name} done`;
  }
  return { jobs, news, clock, work };
}

describe('When work is done in pieces', () => {
  test('then progress is told after each stretch, and the answer last', () => {
    const { jobs, news, work } = listWithClock();
    jobs.add({ id: 1, rank: 0, work: work('a', 5) });
    while (!jobs.isIdle) jobs.run(2);
    expect(news).toEqual([
      { kind: 'progress', id: 1, done: 0.4 },
      { kind: 'progress', id: 1, done: 0.8 },
      { kind: 'answer', id: 1, answer: 'a done' },
    ]);
  });

  test('then what is more urgent is worked first, even when it comes later, and equals in turn', () => {
    const { jobs, news, work } = listWithClock();
    jobs.add({ id: 1, rank: 2, work: work('numbers', 3) });
    jobs.run(1);
    jobs.add({ id: 2, rank: 0, work: work('picture', 2) });
    jobs.add({ id: 3, rank: 0, work: work('second picture', 1) });
    while (!jobs.isIdle) jobs.run(1);
    expect(news.filter((one) => one.kind === 'answer').map((one) => one.id)).toEqual([2, 3, 1]);
  });

  test('then cancelled work is not gone on with, and says nothing', () => {
    const { jobs, news, clock, work } = listWithClock();
    jobs.add({ id: 1, rank: 0, work: work('a', 100) });
    jobs.run(3);
    jobs.cancel(1);
    expect(jobs.isIdle).toBe(true);
    jobs.run(3);
    expect(clock.worked).toHaveLength(3);
    expect(news.map((one) => one.kind)).toEqual(['progress']);
  });

  test('then an error ends its own job only', () => {
    const { jobs, news, work } = listWithClock();
    const broken = new Error('broken');
    jobs.add({
      id: 1,
      rank: 0,
      work: (function* (): Generator<number, string, void> {
        throw broken;
      })(),
    });
    jobs.add({ id: 2, rank: 0, work: work('b', 1) });
    while (!jobs.isIdle) jobs.run(5);
    expect(news).toEqual([
      { kind: 'error', id: 1, error: broken },
      { kind: 'answer', id: 2, answer: 'b done' },
    ]);
  });
});

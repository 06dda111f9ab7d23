/** One line of the bench's table: a time over another time, and the most that it may be. Never bare milliseconds: machines differ. */
export interface BenchRow {
  readonly name: string;
  /** What the time is divided by. */
  readonly against: string;
  readonly ratio: number;
  readonly limit: number;
  readonly ok: boolean;
}

/** What a file tests/bench/*.bench.ts exports. */
export interface Bench {
  readonly run: () => Promise<BenchRow[]>;
}

const median = (numbers: number[]): number => numbers.sort((a, b) => a - b)[Math.floor(numbers.length / 2)]!;

/** Median time of one call in milliseconds, after `warmUps` calls that are not counted. The collector may work between calls. */
export async function medianTime(work: () => unknown, { warmUps, runs }: { warmUps: number; runs: number }): Promise<number> {
  const times: number[] = [];
  for (let i = 0; i < warmUps + runs; i++) {
    const from = performance.now();
    work();
    if (i >= warmUps) times.push(performance.now() - from);
    await new Promise((done) => setImmediate(done));
  }
  return median(times);
}

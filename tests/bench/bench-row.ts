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

export const median = (numbers: readonly number[]): number =>
  numbers.toSorted((a, b) => a - b)[Math.floor(numbers.length / 2)]!;

/**
 * Time of one call in milliseconds: the smallest of the medians of `batches` batches of `calls` calls, after one batch that is
 * not counted. Other programs on the machine only ever make a batch slower. The collector may work between calls.
 */
export async function quietTime(
  work: () => unknown,
  { batches, calls }: { batches: number; calls: number },
): Promise<number> {
  const medians: number[] = [];
  for (let batch = 0; batch <= batches; batch++) {
    const times: number[] = [];
    for (let call = 0; call < calls; call++) {
      const from = performance.now();
      work();
      times.push(performance.now() - from);
      await new Promise((done) => setImmediate(done));
    }
    if (batch > 0) medians.push(median(times));
  }
  return Math.min(...medians);
}

/** A piece of work under way. */
export interface Job<T> {
  readonly id: number;
  /** The least is worked first. */
  readonly rank: number;
  readonly work: Generator<number, T, void>;
}

export type JobNews<T> =
  | { readonly kind: 'progress'; readonly id: number; readonly done: number }
  | { readonly kind: 'answer'; readonly id: number; readonly answer: T }
  | { readonly kind: 'error'; readonly id: number; readonly error: unknown };

/**
 * Work in pieces, so that whoever runs it hears of cancelled jobs in between. Jobs are worked by rank, those of one rank
 * in turn of asking; `now` tells milliseconds.
 */
export class JobList<T> {
  private jobs: Job<T>[] = [];
  private readonly tell: (news: JobNews<T>) => void;
  private readonly now: () => number;

  constructor(tell: (news: JobNews<T>) => void, now: () => number) {
    this.tell = tell;
    this.now = now;
  }

  get isIdle(): boolean {
    return this.jobs.length === 0;
  }

  add(job: Job<T>): void {
    const after = this.jobs.findIndex((other) => other.rank > job.rank);
    this.jobs.splice(after < 0 ? this.jobs.length : after, 0, job);
  }

  cancel(id: number): void {
    this.jobs = this.jobs.filter((job) => job.id !== id);
  }

  clear(): void {
    this.jobs = [];
  }

  /** Works on the first job for about `milliseconds`, or until it is done. */
  run(milliseconds: number): void {
    const [job] = this.jobs;
    if (!job) return;
    const until = this.now() + milliseconds;
    try {
      let step = job.work.next();
      while (!step.done && this.now() < until) step = job.work.next();
      if (!step.done) return this.tell({ kind: 'progress', id: job.id, done: step.value });
      this.cancel(job.id);
      this.tell({ kind: 'answer', id: job.id, answer: step.value });
    } catch (error) {
      this.cancel(job.id);
      this.tell({ kind: 'error', id: job.id, error });
    }
  }
}

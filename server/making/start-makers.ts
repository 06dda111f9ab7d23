import { Worker } from 'node:worker_threads';
import { AppError } from '../errors.ts';
import { toMakingError } from './making-error.ts';
import type { Makers, TaskAnswer, TaskKind } from './tasks.ts';

/** More waiting tasks than this are turned away. */
const LONGEST_QUEUE = 64;
/** What a task may take of the machine; one that wants more is given up and its worker replaced. */
export interface Caps {
  readonly timeMs: number;
  /** Of the JavaScript heap. */
  readonly memoryMb: number;
  /** What a person can do about a task that is given up. */
  readonly remedy: string;
}

const FRAME_CAPS: Caps = { timeMs: 60_000, memoryMb: 1024, remedy: 'A tracing with fewer vertices will do.' };
/** Somebody else's drawing: within these, the largest that is read takes a few seconds. */
export const DRAWING_CAPS: Caps = {
  timeMs: 30_000,
  memoryMb: 1024,
  remedy: 'Export only the lines that belong to the frames.',
};

interface Waiting {
  readonly kind: TaskKind;
  readonly input: unknown;
  readonly signal: AbortSignal | undefined;
  resolve(result: unknown): void;
  reject(error: unknown): void;
}

// Not written in place, where the builder would take it for something to bundle.
const SOURCES = './load-sources.mjs';

/** Starts a worker thread on built files as they are, and on sources through tsx. */
function startWorker(entry: URL, memoryMb: number): Worker {
  const fromSources = entry.pathname.endsWith('.ts');
  const first = fromSources ? new URL(SOURCES, import.meta.url) : entry;
  return new Worker(first, {
    workerData: entry.href,
    execArgv: [],
    resourceLimits: { maxOldGenerationSizeMb: memoryMb },
  });
}

/**
 * A pool of at most `size` worker threads running `entry`; each is started when it is first needed and does one task at a time.
 */
export function startMakers(entry: URL, size: number, caps: Caps = FRAME_CAPS): Makers {
  const queue: Waiting[] = [];
  const idle: Worker[] = [];
  const all = new Set<Worker>();
  let closed = false;

  const start = (): Worker => {
    const worker = startWorker(entry, caps.memoryMb);
    all.add(worker);
    worker.once('exit', () => {
      all.delete(worker);
      const at = idle.indexOf(worker);
      if (at >= 0) idle.splice(at, 1);
      // Its place is free: somebody may be waiting for it.
      next();
    });
    return worker;
  };

  const run = (worker: Worker, task: Waiting): void => {
    const settle = (act: () => void, again: boolean): void => {
      clearTimeout(cap);
      worker.off('message', answered).off('error', broke).off('exit', left);
      if (again && !closed) idle.push(worker);
      else void worker.terminate();
      act();
      next();
    };
    const answered = (answer: TaskAnswer): void => {
      settle(() => (answer.ok ? task.resolve(answer.result) : task.reject(toMakingError(task.kind, answer))), true);
    };
    const giveUp = (why: string, log: string): AppError =>
      new AppError('too-large', `${task.kind} ${log}`, { message: `${why} and was given up. ${caps.remedy}` });
    const broke = (error: Error & { code?: string }): void => {
      const reason =
        error.code === 'ERR_WORKER_OUT_OF_MEMORY'
          ? giveUp(`This takes more than ${caps.memoryMb} MB of memory to work out`, 'hit the memory cap')
          : new Error(`a worker broke down making ${task.kind}`, { cause: error });
      settle(() => task.reject(reason), false);
    };
    const left = (code: number): void =>
      settle(() => task.reject(new Error(`a worker ended with ${code} making ${task.kind}`)), false);
    const cap = setTimeout(() => {
      const reason = giveUp(`This takes longer than ${caps.timeMs / 1000} seconds to work out`, 'hit the time cap');
      settle(() => task.reject(reason), false);
    }, caps.timeMs);
    worker.on('message', answered).on('error', broke).on('exit', left);
    worker.postMessage({ kind: task.kind, input: task.input });
  };

  const next = (): void => {
    while (queue.length > 0 && (idle.length > 0 || all.size < size)) {
      const task = queue.shift()!;
      if (task.signal?.aborted) task.reject(task.signal.reason);
      else run(idle.pop() ?? start(), task);
    }
  };

  return {
    make: <K extends TaskKind>(kind: K, input: unknown, signal?: AbortSignal) =>
      new Promise<never>((resolve, reject) => {
        if (closed) throw new Error(`no ${kind} after closing`);
        if (queue.length >= LONGEST_QUEUE)
          throw new AppError('too-many-requests', `${queue.length} tasks are waiting`, { retryAfter: 10 });
        queue.push({ kind, input, signal, resolve: resolve as (result: unknown) => void, reject });
        next();
      }),
    async close() {
      closed = true;
      for (const task of queue.splice(0)) task.reject(new Error(`closed before ${task.kind} was made`));
      await Promise.all([...all].map((worker) => worker.terminate()));
    },
  };
}

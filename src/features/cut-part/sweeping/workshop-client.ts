import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { FromWorker, ToWorker } from './messages.ts';
import type { Answers, Wish } from './picture.ts';

/** A frame to be looked at, in the files that a profile makes of it. */
export interface FrameFiles {
  readonly worked: DrawnFrame;
  readonly profile: FileProfile;
}

/** The frame cannot be drawn, and why: for the person to mend. */
export class CannotCut extends Error {
  override readonly name = 'CannotCut';
}

/** The wish was given up: cancelled, or asked of a frame that has changed since. */
export class GivenUp extends Error {
  override readonly name = 'GivenUp';
}

interface Open {
  readonly resolve: (answer: never) => void;
  readonly reject: (error: Error) => void;
  readonly onProgress: (done: number) => void;
}

const startWorker = (): Worker => new Worker(new URL('./cut-part-worker.ts', import.meta.url), { type: 'module' });

/** The page's side of the worker, which is started with the first wish and knows one frame at a time. */
export class WorkshopClient {
  private worker: Worker | null = null;
  private frame: FrameFiles | null = null;
  private lastId = 0;
  private readonly open = new Map<number, Open>();
  private readonly start: () => Worker;

  constructor(start: () => Worker = startWorker) {
    this.start = start;
  }

  /** Asks about a frame; asking about another one gives up all that is open. Rejects with GivenUp when `signal` aborts, and with CannotCut. */
  ask<W extends Wish>(
    frame: FrameFiles,
    wish: W,
    onProgress: (done: number) => void,
    signal: AbortSignal,
  ): Promise<Answers[W['kind']]> {
    const worker = this.worker ?? this.begin();
    if (this.frame !== frame) {
      this.rejectAll(() => new GivenUp('the frame has changed'));
      this.frame = frame;
      this.post(worker, { kind: 'frame', ...frame });
    }
    const id = ++this.lastId;
    return new Promise((resolve, reject) => {
      if (signal.aborted) return reject(new GivenUp('cancelled'));
      this.open.set(id, { resolve, reject, onProgress });
      signal.addEventListener('abort', () => {
        if (!this.open.delete(id)) return;
        this.post(worker, { kind: 'cancel', id });
        reject(new GivenUp('cancelled'));
      });
      this.post(worker, { kind: 'ask', id, wish });
    });
  }

  /** Ends the worker; a later wish starts another. */
  end(): void {
    this.worker?.terminate();
    this.worker = null;
    this.frame = null;
    this.rejectAll(() => new GivenUp('ended'));
  }

  private begin(): Worker {
    const worker = this.start();
    worker.onmessage = ({ data }: MessageEvent<FromWorker>) => this.hear(data);
    worker.onerror = (event) => {
      this.rejectAll(() => new Error(event.message || 'the worker could not be started'));
      this.end();
    };
    this.worker = worker;
    return worker;
  }

  private post(worker: Worker, message: ToWorker): void {
    worker.postMessage(message);
  }

  private hear(data: FromWorker): void {
    const open = this.open.get(data.id);
    // Given up meanwhile.
    if (!open) return;
    if (data.kind === 'progress') return open.onProgress(data.done);
    this.open.delete(data.id);
    if (data.kind === 'answer') open.resolve(data.answer as never);
    else open.reject(data.kind === 'refused' ? new CannotCut(data.reason) : new Error(data.message));
  }

  private rejectAll(reason: () => Error): void {
    const all = [...this.open.values()];
    this.open.clear();
    for (const { reject } of all) reject(reason());
  }
}

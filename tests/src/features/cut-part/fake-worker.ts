import { vi } from 'vitest';
import type { Answer, FromWorker, ToWorker } from '../../../../src/features/cut-part/sweeping/messages.ts';
import type { Wish } from '../../../../src/features/cut-part/sweeping/picture.ts';
import { Workshop } from '../../../../src/features/cut-part/sweeping/workshop.ts';
import { runThrough } from '#shared/kernel/height-field/sweep-face.ts';

/** A worker that keeps what it is sent, for a test to answer by hand. */
export class FakeWorker {
  readonly sent: ToWorker[] = [];
  isEnded = false;
  onmessage: ((event: { data: FromWorker }) => void) | null = null;
  onerror: ((event: { message: string }) => void) | null = null;

  postMessage(message: ToWorker): void {
    this.sent.push(message);
  }
  terminate(): void {
    this.isEnded = true;
  }
  say(data: FromWorker): void {
    this.onmessage?.({ data });
  }
}

function answerTo(workshop: Workshop, wish: Wish): Answer {
  if (wish.kind === 'look') return runThrough(workshop.look(wish));
  if (wish.kind === 'slice') return runThrough(workshop.slice(wish));
  return wish.kind === 'relief' ? runThrough(workshop.relief(wish)) : runThrough(workshop.measure());
}

/** A worker that does the real work, a moment later; it never answers `held` kinds of wishes. */
export class WorkingWorker extends FakeWorker {
  static held: readonly Wish['kind'][] = [];
  private workshop: Workshop | null = null;

  override postMessage(message: ToWorker): void {
    super.postMessage(message);
    if (message.kind === 'frame') this.workshop = new Workshop(message.worked, message.profile);
    if (message.kind !== 'ask' || WorkingWorker.held.includes(message.wish.kind)) return;
    const { id, wish } = message;
    setTimeout(() => this.isEnded || this.say({ kind: 'answer', id, answer: answerTo(this.workshop!, wish) }), 0);
  }
}

/** The page's workers do their work without a thread of their own. */
export const useWorkingWorkers = (held: readonly Wish['kind'][] = []): void => {
  WorkingWorker.held = held;
  vi.stubGlobal('Worker', WorkingWorker);
};

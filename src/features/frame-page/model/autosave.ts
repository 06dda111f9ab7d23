import type { StaleDraft } from '#shared/contracts/frames.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { createStore, type Store } from './store.ts';

export type SavingState =
  | { readonly kind: 'saved' }
  /** Changes that wait for a pause in typing, or are on their way. */
  | { readonly kind: 'saving' }
  /** `retries`: it is tried again by itself. */
  | { readonly kind: 'not-saved'; readonly why: string; readonly retries: boolean }
  /** Somebody else saved meanwhile: a person must choose. `base` is the draft both started from. */
  | { readonly kind: 'stale'; readonly stale: StaleDraft; readonly base: Particulars };

export type SaveFailure =
  | { readonly kind: 'retry'; readonly why: string }
  | { readonly kind: 'give-up'; readonly why: string }
  | { readonly kind: 'stale'; readonly stale: StaleDraft };

interface AutosaveOptions {
  /** The draft as the server has it. */
  readonly version: number;
  readonly saved: Particulars;
  /** Sends a draft; answers the new version. */
  readonly save: (draft: { version: number; particulars: Particulars }) => Promise<{ version: number }>;
  /** What a failed save means. */
  readonly judge: (error: unknown) => SaveFailure;
}

export interface Autosave {
  readonly store: Store<SavingState>;
  /** The newest version that the server has, and what it holds. */
  readonly version: () => number;
  readonly saved: () => Particulars;
  /** Tells of a change; saved after a pause. */
  readonly change: (particulars: Particulars) => void;
  /** Saves at once. Answers true when everything is saved then. */
  readonly flush: () => Promise<boolean>;
  /** Goes on from a draft that somebody else saved, or that a release answered. */
  readonly goOnFrom: (version: number, saved: Particulars) => void;
  /** Tells of a failure met elsewhere, such as a release of a draft that somebody else changed. */
  readonly meet: (error: unknown) => void;
  /** Sends nothing by itself any more, or does again. What is under way goes on. */
  readonly stop: () => void;
  readonly start: () => void;
}

const SAVED: SavingState = { kind: 'saved' };
const SAVING: SavingState = { kind: 'saving' };

/** Pause in typing after which a draft is sent. */
const PAUSE_MS = 600;
const FIRST_RETRY_MS = 1_000;
const LAST_RETRY_MS = 30_000;

/** Sends drafts one after the other, never two at once, and keeps trying while the server cannot be reached. */
export function createAutosave({ save, judge, ...start }: AutosaveOptions): Autosave {
  const store = createStore(SAVED);
  let version = start.version;
  let saved = start.saved;
  let wanted = start.saved;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let running: Promise<void> | null = null;
  let retryIn = FIRST_RETRY_MS;
  let stopped = false;

  function sendAfter(ms: number): void {
    clearTimeout(timer);
    if (stopped) return;
    timer = setTimeout(() => void send(), ms);
  }

  function fail(error: unknown): void {
    const failure = judge(error);
    if (failure.kind === 'stale') return store.set({ kind: 'stale', stale: failure.stale, base: saved });
    store.set({ kind: 'not-saved', why: failure.why, retries: failure.kind === 'retry' });
    if (failure.kind === 'give-up') return;
    sendAfter(retryIn);
    retryIn = Math.min(2 * retryIn, LAST_RETRY_MS);
  }

  async function sendOne(): Promise<void> {
    const sent = wanted;
    store.set(SAVING);
    try {
      const answer = await save({ version, particulars: sent });
      version = answer.version;
      saved = sent;
      retryIn = FIRST_RETRY_MS;
    } catch (error) {
      fail(error);
      return;
    }
    if (wanted === sent) store.set(SAVED);
    else sendAfter(PAUSE_MS);
  }

  function send(): Promise<void> {
    clearTimeout(timer);
    if (wanted === saved) return running ?? Promise.resolve();
    running ??= sendOne().finally(() => {
      running = null;
    });
    return running;
  }

  return {
    store,
    version: () => version,
    saved: () => saved,
    change(particulars) {
      wanted = particulars;
      if (store.get().kind === 'stale') return;
      if (wanted === saved && running === null) {
        clearTimeout(timer);
        store.set(SAVED);
        return;
      }
      store.set(SAVING);
      if (running === null) sendAfter(PAUSE_MS);
    },
    async flush() {
      if (store.get().kind === 'stale') return false;
      await send();
      // What was under way may have been older than what is wanted.
      if (store.get().kind === 'saving') await send();
      return wanted === saved;
    },
    goOnFrom(newVersion, newSaved) {
      clearTimeout(timer);
      version = newVersion;
      saved = newSaved;
      wanted = newSaved;
      store.set(SAVED);
    },
    meet: fail,
    stop() {
      stopped = true;
      clearTimeout(timer);
    },
    start() {
      stopped = false;
    },
  };
}

import { createStore, type Store } from './store.ts';

/** Pause after a change: the faces are painted by then, and the next keystroke is not there yet. */
const PAUSE_MS = 50;

/** A store that takes over another one's value a moment late. */
export function settle<T>(store: Store<T>): Store<T> {
  const settled = createStore(store.get());
  let changed = 0;
  let isWaiting = false;
  // One timer for a whole run of changes: setting it anew with each costs more than asking the time.
  function wait(ms: number): void {
    isWaiting = true;
    setTimeout(() => {
      const left = changed + PAUSE_MS - performance.now();
      if (left > 0) return wait(left);
      isWaiting = false;
      settled.set(store.get());
    }, ms);
  }
  store.subscribe(() => {
    changed = performance.now();
    if (!isWaiting) wait(PAUSE_MS);
  });
  return settled;
}

import { createStore, type Store } from './store.ts';

/** Pause after a change: the faces are painted by then, and the next keystroke is not there yet. */
const PAUSE_MS = 50;

/** A store that takes over another one's value a moment late. */
export function settle<T>(store: Store<T>): Store<T> {
  const settled = createStore(store.get());
  let timer: ReturnType<typeof setTimeout> | undefined;
  store.subscribe(() => {
    clearTimeout(timer);
    timer = setTimeout(() => settled.set(store.get()), PAUSE_MS);
  });
  return settled;
}

import { useSyncExternalStore } from 'react';

/** A value that components follow in part: only those whose part changed are drawn again. */
export interface Store<T> {
  readonly get: () => T;
  readonly set: (next: T) => void;
  readonly subscribe: (listener: () => void) => () => void;
}

export function createStore<T>(initial: T): Store<T> {
  let value = initial;
  const listeners = new Set<() => void>();
  return {
    get: () => value,
    set(next) {
      if (Object.is(next, value)) return;
      value = next;
      for (const listener of [...listeners]) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

/** The part of a store's value that `select` picks; it must give the same object for the same value. */
export function useStore<T, Part>(store: Store<T>, select: (value: T) => Part): Part {
  const part = () => select(store.get());
  return useSyncExternalStore(store.subscribe, part, part);
}

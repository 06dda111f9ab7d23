import { useEffect, useState } from 'react';
import { useDesk } from './desk.ts';
import type { EditorState } from './frame-editor.ts';
import type { Store } from './store.ts';

/** Pause after a change: the faces are painted by then, and the next keystroke is not there yet. */
const PAUSE_MS = 50;

/**
 * Part of the editor's state, a moment late: for words beside the drawing, which need not be repainted in the frame of the
 * keystroke. `select` must not change and must give the same object for the same value.
 */
export const useSettled = <Part>(select: (state: EditorState) => Part): Part => useSettledStore(useDesk().editor.store, select);

/** The same for any store. */
export function useSettledStore<T, Part>(store: Store<T>, select: (value: T) => Part): Part {
  const [part, setPart] = useState(() => select(store.get()));
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const follow = () => {
      clearTimeout(timer);
      timer = setTimeout(() => setPart(() => select(store.get())), PAUSE_MS);
    };
    follow();
    const off = store.subscribe(follow);
    return () => {
      clearTimeout(timer);
      off();
    };
  }, [store, select]);
  return part;
}

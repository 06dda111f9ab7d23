import { useDesk } from './desk.ts';
import type { EditorState } from './frame-editor.ts';
import { useStore } from './store.ts';

/**
 * Part of the editor's state, a moment late: for words beside the drawing, which need not be repainted in the frame of the
 * keystroke. `select` must give the same object for the same value.
 */
export const useSettled = <Part>(select: (state: EditorState) => Part): Part => useStore(useDesk().settled, select);

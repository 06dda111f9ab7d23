import { useEffect } from 'react';
import type { FrameEditor } from '../model/frame-editor.ts';

/** Ctrl+Z, Ctrl+Shift+Z and Ctrl+Y (⌘ alike) on the whole frame, wherever the keyboard is but in a dialog. */
export function useUndoKeys(editor: FrameEditor, readOnly: boolean): void {
  useEffect(() => {
    if (readOnly) return;
    const press = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      if (event.target instanceof Element && event.target.closest('dialog')) return;
      const key = event.key.toLowerCase();
      if (key !== 'z' && key !== 'y') return;
      event.preventDefault();
      if (key === 'z' && !event.shiftKey) editor.undo();
      else editor.redo();
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  }, [editor, readOnly]);
}

import type { ReactNode } from 'react';
import { Button } from '../../../ui/button.tsx';
import { useDesk, useEditor } from '../model/desk.ts';

/** Over the form: taking steps back and forth, and `children` at the far end. */
export function FormBar({ children }: { readonly children: ReactNode }) {
  const { editor, readOnly } = useDesk();
  const undoLabel = useEditor((s) => s.history.past.at(-1)?.label ?? '');
  const redoLabel = useEditor((s) => s.history.future[0]?.label ?? '');
  const hasWrong = useEditor((s) => s.wrong.size > 0);
  return (
    <div className="flex min-h-9 flex-wrap items-center gap-x-3.5 border-b border-rule px-4 text-12 print:hidden">
      {readOnly ? (
        <span className="text-pencil">to read only</span>
      ) : (
        <>
          <Button
            kind="quiet"
            disabled={undoLabel === '' && !hasWrong}
            title={undoLabel && `Undo: ${undoLabel} (Ctrl+Z)`}
            onClick={editor.undo}
          >
            Undo
          </Button>
          <Button
            kind="quiet"
            disabled={redoLabel === ''}
            title={redoLabel && `Redo: ${redoLabel} (Ctrl+Shift+Z)`}
            onClick={editor.redo}
          >
            Redo
          </Button>
        </>
      )}
      <span className="ml-auto flex gap-x-3.5">{children}</span>
    </div>
  );
}

import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

interface UndoNoticeProps {
  /** What was done, with the thing's name. */
  readonly children: string;
  readonly onUndo: () => void;
  readonly busy?: boolean;
}

/** Says what was done and takes it back. */
export function UndoNotice({ children, onUndo, busy = false }: UndoNoticeProps) {
  return (
    <Notice
      level="note"
      word="Done"
      live
      action={
        <Button onClick={onUndo} busy={busy ? 'Undoing' : ''}>
          Undo
        </Button>
      }
    >
      {children}
    </Notice>
  );
}

import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

interface AskUnsavedProps {
  /** What is not saved. */
  readonly name: string;
  /** What can be done and what would be lost; left out where staying is for saving. */
  readonly children?: string;
  readonly onStay: () => void;
  readonly onLeave: () => void;
}

/** Asks whether what was typed may be lost. Escape and the close button stay. */
export const AskUnsaved = ({ name, children, onStay, onLeave }: AskUnsavedProps) => (
  <Dialog
    title={`${name} is not saved`}
    onClose={onStay}
    actions={
      <>
        <Button kind="main" onClick={onStay}>
          Stay
        </Button>
        <Button onClick={onLeave}>Leave without saving</Button>
      </>
    }
  >
    <p>{children ?? 'Stay and save it, or leave and lose what was typed since.'}</p>
  </Dialog>
);

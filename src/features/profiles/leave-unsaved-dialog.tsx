import { useEffect } from 'react';
import { useBlocker } from 'react-router';
import { Button } from '../../ui/button.tsx';
import { Dialog } from '../../ui/dialog.tsx';

interface LeaveUnsavedDialogProps {
  readonly name: string;
  readonly unsaved: boolean;
}

/** Asks before unsaved changes are left behind, by a link here or by closing the window. */
export function LeaveUnsavedDialog({ name, unsaved }: LeaveUnsavedDialogProps) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      unsaved && currentLocation.pathname + currentLocation.search !== nextLocation.pathname + nextLocation.search,
  );
  useEffect(() => {
    if (!unsaved) return;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [unsaved]);
  if (blocker.state !== 'blocked') return null;
  return (
    <Dialog
      title={`${name} is not saved`}
      onClose={() => blocker.reset()}
      actions={
        <>
          <Button kind="main" onClick={() => blocker.reset()}>
            Stay
          </Button>
          <Button onClick={() => blocker.proceed()}>Leave without saving</Button>
        </>
      }
    >
      <p>Stay and save it, or leave and lose what was changed since it was saved.</p>
    </Dialog>
  );
}

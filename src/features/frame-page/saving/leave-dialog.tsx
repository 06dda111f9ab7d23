import { useSyncExternalStore } from 'react';
import { useBlocker } from 'react-router';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import type { Autosave } from '../model/autosave.ts';

/** Asks before a step to another page while the draft cannot be saved. */
export function LeaveDialog({ autosave, copyKept }: { readonly autosave: Autosave; readonly copyKept: boolean }) {
  const state = useSyncExternalStore(autosave.store.subscribe, autosave.store.get);
  const isStuck = state.kind === 'not-saved' || state.kind === 'stale';
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => isStuck && currentLocation.pathname !== nextLocation.pathname,
  );
  if (blocker.state !== 'blocked') return null;
  return (
    <Dialog
      title="The last changes are not saved"
      onClose={() => blocker.reset()}
      actions={
        <>
          <Button kind="main" onClick={() => blocker.reset()}>
            Stay
          </Button>
          <Button onClick={() => blocker.proceed()}>Leave</Button>
        </>
      }
    >
      {state.kind === 'not-saved' && <p className="mb-2">{state.why}</p>}
      <p>
        {copyKept
          ? 'A copy is kept in this browser and offered when this frame is opened here again.'
          : 'No copy could be kept in this browser: leaving loses them.'}
      </p>
    </Dialog>
  );
}

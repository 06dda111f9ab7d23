import { useEffect } from 'react';
import { useBlocker } from 'react-router';
import { AskUnsaved } from './ask-unsaved.tsx';

interface LeaveUnsavedDialogProps {
  readonly name: string;
  readonly unsaved: boolean;
  /** See AskUnsaved. */
  readonly children?: string;
}

/** Asks before unsaved changes are left behind, by a link here or by closing the window. */
export function LeaveUnsavedDialog({ name, unsaved, children }: LeaveUnsavedDialogProps) {
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
    <AskUnsaved name={name} onStay={() => blocker.reset()} onLeave={() => blocker.proceed()}>
      {children}
    </AskUnsaved>
  );
}

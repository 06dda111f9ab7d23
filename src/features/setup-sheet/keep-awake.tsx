import { useState } from 'react';
import { Button } from '../../ui/button.tsx';
import { useWakeLock, type WakeState } from './use-wake-lock.ts';

const WORDS: Record<WakeState, string> = {
  asleep: 'Screen may sleep',
  awake: 'Screen stays awake',
  unavailable: 'This browser lets the screen sleep',
  refused: 'The device would not keep the screen awake',
};

/** Says whether the screen stays on, and switches it. */
export function KeepAwake() {
  const [wanted, setWanted] = useState(true);
  const state = useWakeLock(wanted);
  return (
    <div className="flex flex-wrap items-center gap-x-4 text-12 print:hidden">
      <span role="status" className="text-pencil">
        {WORDS[state]}
      </span>
      {state !== 'unavailable' && (
        <Button kind="quiet" onClick={() => setWanted(!wanted)}>
          {wanted ? 'Let it sleep' : 'Keep it awake'}
        </Button>
      )}
    </div>
  );
}

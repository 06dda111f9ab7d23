import { useState } from 'react';
import { Button } from '../../ui/button.tsx';
import { TitleCell } from '../../ui/title-block.tsx';
import { useWakeLock, type WakeState } from './use-wake-lock.ts';

const WORDS: Record<WakeState, string> = {
  asleep: 'may sleep',
  awake: 'stays awake',
  unavailable: 'may sleep in this browser',
  refused: 'sleeps: the device insists',
};

/** Says whether the screen stays on, and switches it. */
export function KeepAwake() {
  const [wanted, setWanted] = useState(true);
  const state = useWakeLock(wanted);
  return (
    <TitleCell
      label="Screen"
      detail={
        state !== 'unavailable' && (
          <Button kind="quiet" onClick={() => setWanted(!wanted)}>
            {wanted ? 'Let it sleep' : 'Keep it awake'}
          </Button>
        )
      }
    >
      <span role="status">{WORDS[state]}</span>
    </TitleCell>
  );
}

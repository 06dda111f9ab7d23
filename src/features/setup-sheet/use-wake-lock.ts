import { useEffect, useState } from 'react';

/** asleep: not wanted; awake: the screen stays on; unavailable: this browser cannot; refused: it would not, for the reason given (battery). */
export type WakeState = 'asleep' | 'awake' | 'unavailable' | 'refused';

/** Keeps the screen on while `wanted` and the page is in view. The browser lets go when the page is hidden; coming back asks again. */
export function useWakeLock(wanted: boolean): WakeState {
  const available = 'wakeLock' in navigator;
  const [state, setState] = useState<WakeState>('asleep');

  useEffect(() => {
    if (!wanted || !available) return;
    let over = false;
    let lock: WakeLockSentinel | null = null;
    async function ask() {
      if (over || lock !== null || document.visibilityState !== 'visible') return;
      try {
        const held = await navigator.wakeLock.request('screen');
        if (over) return void held.release();
        lock = held;
        held.addEventListener('release', () => {
          lock = null;
          if (!over) setState('asleep');
        });
        setState('awake');
      } catch {
        // The only answer to a refusal is to say so: battery savers and policies give no way around.
        if (!over) setState('refused');
      }
    }
    const askAgain = () => void ask();
    askAgain();
    document.addEventListener('visibilitychange', askAgain);
    return () => {
      over = true;
      document.removeEventListener('visibilitychange', askAgain);
      void lock?.release();
      setState('asleep');
    };
  }, [wanted, available]);

  return available ? state : 'unavailable';
}

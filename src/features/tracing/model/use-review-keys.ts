import { useEffect, useEffectEvent } from 'react';

const TYPED = 'input:not([type=checkbox], [type=radio]), textarea, dialog *';

/** Ctrl+Z, Ctrl+Shift+Z and Ctrl+Y (⌘ alike) on the roles, but not from within a text, which has its own. */
export function useReviewKeys(onUndo: () => void, onRedo: () => void): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    if (event.target instanceof Element && event.target.matches(TYPED)) return;
    const key = event.key.toLowerCase();
    if (key !== 'z' && key !== 'y') return;
    event.preventDefault();
    if (key === 'z' && !event.shiftKey) onUndo();
    else onRedo();
  });
  useEffect(() => {
    const listen = (event: KeyboardEvent) => press(event);
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, []);
}

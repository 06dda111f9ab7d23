import type { KeyboardEvent } from 'react';
import { useDesk } from '../model/desk.ts';
import { pickPlace, stepPlace, toggleMeasuring } from '../model/measure.ts';
import { snapPoints } from '../model/snap-points.ts';
import { panView, zoomView, ZOOM_STEP } from '../model/view.ts';
import { pressOnSelected } from '../on-drawing/press-key.ts';
import { toggleWalking } from '../on-drawing/select-feature.ts';

const STEP_PX = 40;
const LONG_STEP_PX = 200;

const ARROWS: Readonly<Record<string, { readonly right: number; readonly up: number }>> = {
  ArrowRight: { right: 1, up: 0 },
  ArrowLeft: { right: -1, up: 0 },
  ArrowUp: { right: 0, up: 1 },
  ArrowDown: { right: 0, up: -1 },
};

/**
 * The spread by keyboard. Arrows move over the board, or from place to place while measuring, or from opening to member while
 * one of them is selected; with Shift they move over the board also then.
 */
export function useSpreadKeys() {
  const desk = useDesk();

  function press(event: KeyboardEvent<HTMLElement>): boolean {
    const measuring = desk.measuring.get();
    const view = desk.shown.get();
    const worked = desk.editor.store.get().drawn;
    const arrow = ARROWS[event.key];
    const isSelecting = desk.selection.get() !== null;
    if (isSelecting && !(arrow && event.shiftKey) && pressOnSelected(desk, event.key)) return true;
    if (arrow && measuring) {
      desk.measuring.set(
        stepPlace(measuring, snapPoints(worked), worked[measuring.face].placement, arrow.right, arrow.up),
      );
      return true;
    }
    if (arrow) {
      const step = event.shiftKey ? LONG_STEP_PX : STEP_PX;
      // The window moves over the board, so the board goes the other way.
      desk.view.set(panView(view, worked.front.placement, -arrow.right * step, arrow.up * step));
      return true;
    }
    switch (event.key) {
      case '+':
      case '=':
        desk.view.set(zoomView(view, ZOOM_STEP));
        return true;
      case '-':
        desk.view.set(zoomView(view, 1 / ZOOM_STEP));
        return true;
      case '0':
      case 'f':
      case 'F':
        desk.view.set(null);
        return true;
      case 'm':
      case 'M':
        toggleMeasuring(desk);
        return true;
      case 'o':
      case 'O':
        toggleWalking(desk);
        return true;
      case 'Enter':
      case ' ':
        if (!measuring?.at) return false;
        desk.measuring.set(pickPlace(measuring, measuring.at));
        return true;
      case 'Escape':
        if (!measuring) return false;
        desk.measuring.set(null);
        return true;
      default:
        return false;
    }
  }

  return (event: KeyboardEvent<HTMLElement>) => {
    if (event.ctrlKey || event.metaKey || event.altKey || event.target !== event.currentTarget) return;
    if (press(event)) event.preventDefault();
  };
}

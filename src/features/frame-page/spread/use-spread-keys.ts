import type { KeyboardEvent } from 'react';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { useDesk } from '../model/desk.ts';
import { pickPlace, stepPlace } from '../model/measure.ts';
import { snapPoints } from '../model/snap-points.ts';
import { panView, zoomView, type View } from '../model/view.ts';

export const KEY_ZOOM = 1.25;
const STEP_PX = 40;
const LONG_STEP_PX = 200;

const ARROWS: Readonly<Record<string, { readonly right: number; readonly up: number }>> = {
  ArrowRight: { right: 1, up: 0 },
  ArrowLeft: { right: -1, up: 0 },
  ArrowUp: { right: 0, up: 1 },
  ArrowDown: { right: 0, up: -1 },
};

/** The spread by keyboard. Arrows move over the board, or from place to place while measuring. */
export function useSpreadKeys(worked: WorkedFrame, view: View) {
  const desk = useDesk();
  const toggleMeasuring = () => desk.measuring.set(desk.measuring.get() ? null : { face: 'front', picked: [], at: null });

  function press(event: KeyboardEvent<HTMLElement>): boolean {
    const measuring = desk.measuring.get();
    const arrow = ARROWS[event.key];
    if (arrow && measuring) {
      desk.measuring.set(stepPlace(measuring, snapPoints(worked), worked[measuring.face].placement, arrow.right, arrow.up));
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
        desk.view.set(zoomView(view, KEY_ZOOM));
        return true;
      case '-':
        desk.view.set(zoomView(view, 1 / KEY_ZOOM));
        return true;
      case '0':
      case 'f':
      case 'F':
        desk.view.set(null);
        return true;
      case 'm':
      case 'M':
        toggleMeasuring();
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

  return {
    toggleMeasuring,
    onKeyDown(event: KeyboardEvent<HTMLElement>) {
      if (event.ctrlKey || event.metaKey || event.altKey || event.target !== event.currentTarget) return;
      if (press(event)) event.preventDefault();
    },
  };
}

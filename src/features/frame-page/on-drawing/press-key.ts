import type { Desk } from '../model/desk.ts';
import { removeSelected, selectedNow, splitSelected } from './edit-selected.ts';
import { focusPanel, type PanelEntry } from './focus-panel.ts';
import { selectionOf } from './select-feature.ts';
import { stepFeature } from './step-feature.ts';

/** Opens the panel and puts the keyboard into one of its entries. */
function openAt(desk: Desk, entry: PanelEntry): boolean {
  const selection = desk.selection.get();
  if (!selection) return false;
  desk.selection.set({ ...selection, open: true });
  focusPanel(entry);
  return true;
}

/** Walks to the neighbour to the right (left, −1) or up (down, −1) as the page shows it. Without one, stays. */
function walk(desk: Desk, right: number, up: number): boolean {
  const selection = desk.selection.get();
  const selected = selectedNow(desk);
  if (!selection || !selected) return false;
  const { drawn } = desk.editor.store.get();
  const { sx, sy } = drawn[selection.face].placement;
  const step = stepFeature(drawn.contours, selected.feature, selection.at, right * sx, up * sy);
  if (step) desk.selection.set(selectionOf(step.feature, selection.face, selection.open, step.at));
  return true;
}

/** A key pressed on the spread while an opening or member is selected. Answers false when it means nothing there. */
export function pressOnSelected(desk: Desk, key: string): boolean {
  switch (key.length === 1 ? key.toLowerCase() : key) {
    case 'ArrowRight':
      return walk(desk, 1, 0);
    case 'ArrowLeft':
      return walk(desk, -1, 0);
    case 'ArrowUp':
      return walk(desk, 0, 1);
    case 'ArrowDown':
      return walk(desk, 0, -1);
    case 'Enter':
    case ' ':
      return openAt(desk, 'first');
    case 'l':
      return openAt(desk, 'label');
    case 's':
      return openAt(desk, 'size');
    case 'a':
      return openAt(desk, 'arch');
    case 'c':
      return splitSelected(desk, 'columns');
    case 'r':
      return splitSelected(desk, 'rows');
    case 'Delete':
    case 'Backspace':
      return removeSelected(desk);
    case 'Escape': {
      const selection = desk.selection.get();
      desk.selection.set(selection?.open ? { ...selection, open: false, problem: '' } : null);
      return true;
    }
    default:
      return false;
  }
}

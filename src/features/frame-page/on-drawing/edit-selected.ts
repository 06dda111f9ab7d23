import type { LayoutPath } from '#shared/kernel/frame/members.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { layoutEdits } from '../form/use-layout-edits.ts';
import type { Desk } from '../model/desk.ts';
import { findSelected, openingAt, type Selected } from '../model/selection.ts';
import { selectionOf } from './select-feature.ts';

const presentOf = ({ editor }: Desk): Particulars => editor.store.get().history.present;

/** What is selected now; null when nothing is, or when it is gone. */
export function selectedNow(desk: Desk): Selected | null {
  const selection = desk.selection.get();
  return selection && findSelected(desk.editor.store.get().drawn.contours, presentOf(desk), selection);
}

/** Changes of the selected opening's place in the layout. What comes of it is selected next; what went wrong is said in the panel. */
function changeLayout(
  desk: Desk,
  change: (edits: ReturnType<typeof layoutEdits>, path: LayoutPath) => string,
): boolean {
  const selection = desk.selection.get();
  const selected = selectedNow(desk);
  // A part that is not there as entered, or is traced, has no field.
  if (desk.readOnly || !selection || selected?.kind !== 'opening' || selected.field === '' || !selected.feature.path)
    return false;
  const edits = layoutEdits(desk.editor, (_layout, place) => {
    const opening = openingAt(desk.editor.store.get().drawn.contours, place);
    desk.selection.set(opening ? selectionOf(opening, selection.face, selection.open) : null);
  });
  const problem = change(edits, selected.feature.path);
  if (problem !== '') desk.selection.set({ ...selection, open: true, problem });
  return true;
}

/** Splits the selected opening in two; the new one is selected. Answers false when there is nothing to split. */
export const splitSelected = (desk: Desk, into: 'columns' | 'rows'): boolean =>
  changeLayout(desk, (edits, path) => edits.split(path, into));

/** Removes the selected opening; the one that takes its room is selected. The only opening of a frame stays. */
export const removeSelected = (desk: Desk): boolean =>
  changeLayout(desk, (edits, path) => (path.length > 0 ? edits.remove(path) : 'at least one opening in a frame'));

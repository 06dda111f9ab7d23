import type { LayoutPath } from '#shared/kernel/frame/members.ts';
import { addPart } from '#shared/kernel/particulars/add-part.ts';
import { childrenOf, partAt, partField } from '#shared/kernel/particulars/layout-parts.ts';
import type { LayoutPart } from '#shared/kernel/particulars/particulars.ts';
import { removePart } from '#shared/kernel/particulars/remove-part.ts';
import { splitPart } from '#shared/kernel/particulars/split-part.ts';
import { useDesk } from '../model/desk.ts';
import { goToEntry } from '../model/find-entry.ts';
import type { FrameEditor } from '../model/frame-editor.ts';

/** First width between parts anywhere in the layout: what a new one most likely is. */
function betweenIn(part: LayoutPart): number | undefined {
  if ('opening' in part) return undefined;
  return (
    part.between ??
    childrenOf(part)
      .map(betweenIn)
      .find((between) => between !== undefined)
  );
}

/**
 * Changes of the layout tree, each a step of its own; each answers '' or what it could not take. `after` gets the new layout
 * and the place in it where the change was made.
 */
export function layoutEdits(editor: FrameEditor, after: (layout: LayoutPart, place: LayoutPath) => void) {
  function change(edit: (layout: LayoutPart) => LayoutPart, label: string, place: LayoutPath): string {
    const { present } = editor.store.get().history;
    if (present.outline.kind !== 'members') throw new Error('a traced outline has no layout');
    const layout = edit(present.outline.layout);
    const problem = editor.apply({ ...present, outline: { ...present.outline, layout } }, label);
    if (problem === '') after(layout, place);
    return problem;
  }

  const layoutNow = (): LayoutPart => {
    const { outline } = editor.store.get().history.present;
    if (outline.kind !== 'members') throw new Error('a traced outline has no layout');
    return outline.layout;
  };

  return {
    split(path: LayoutPath, into: 'columns' | 'rows'): string {
      const inches = editor.store.get().history.present.unit === 'in';
      const between = betweenIn(layoutNow()) ?? (inches ? 1.5 : 38);
      return change((layout) => splitPart(layout, path, into, between), `Split into ${into}`, [...path, 1]);
    },
    add: (path: LayoutPath): string =>
      change((layout) => addPart(layout, path), 'Add opening', [...path, childrenOf(partAt(layoutNow(), path)).length]),
    remove(path: LayoutPath): string {
      const left = childrenOf(partAt(layoutNow(), path.slice(0, -1))).length - 1;
      const focusOn = left > 1 ? [...path.slice(0, -1), Math.min(path.at(-1)!, left - 1)] : path.slice(0, -1);
      return change((layout) => removePart(layout, path), 'Remove opening', focusOn);
    },
  };
}

/** The same by button in the form; afterwards the keyboard is where the change was made. */
export function useLayoutEdits() {
  const { editor } = useDesk();
  return layoutEdits(editor, (layout, place) => requestAnimationFrame(() => goToEntry(partField(layout, place))));
}

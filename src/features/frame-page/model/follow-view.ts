import type { EditorState } from './frame-editor.ts';
import type { Store } from './store.ts';
import { boardInFrameView, fitTo, type PageSize, type View } from './view.ts';

interface Followed {
  readonly editor: Store<EditorState>;
  /** Null: the board is fitted to the pages. */
  readonly view: Store<View | null>;
  readonly page: Store<PageSize>;
  readonly shown: Store<View>;
}

/** Keeps `shown` at the view that a person chose, or at one that fits the board as it is drawn now. */
export function followView({ editor, view, page, shown }: Followed): void {
  const fit = () => shown.set(view.get() ?? fitTo(boardInFrameView(editor.get().drawn), page.get()));
  let { drawn } = editor.get();
  editor.subscribe(() => {
    const now = editor.get().drawn;
    if (now === drawn) return;
    drawn = now;
    if (view.get() === null) fit();
  });
  view.subscribe(fit);
  page.subscribe(fit);
  fit();
}

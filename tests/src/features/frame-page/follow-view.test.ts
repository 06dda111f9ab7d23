import { expect, test } from 'vitest';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { createFrameEditor } from '../../../../src/features/frame-page/model/frame-editor.ts';
import { followView } from '../../../../src/features/frame-page/model/follow-view.ts';
import { createStore } from '../../../../src/features/frame-page/model/store.ts';
import { boardInFrameView, fitTo, type View } from '../../../../src/features/frame-page/model/view.ts';

const page = { width: 400, height: 300 };

function follow() {
  const editor = createFrameEditor(newFrame('in', 'Base'));
  const stores = {
    editor: editor.store,
    view: createStore<View | null>(null),
    page: createStore(page),
    shown: createStore<View>({ scale: 1, centre: { x: 0, y: 0 } }),
  };
  followView(stores);
  return { ...stores, edit: editor.edit };
}

test('When the frame grows, then the view goes on fitting the whole board', () => {
  const { editor, shown, edit } = follow();
  const before = shown.get();
  edit('outline.width', 60);
  expect(shown.get()).toEqual(fitTo(boardInFrameView(editor.get().drawn), page));
  expect(shown.get().scale).toBeLessThan(before.scale);
});

test('When a person has chosen a view, then it stays while the frame grows, until the board is fitted again', () => {
  const { editor, view, shown, edit } = follow();
  const chosen = { scale: 20, centre: { x: 3, y: 4 } };
  view.set(chosen);
  edit('outline.width', 60);
  expect(shown.get()).toBe(chosen);
  view.set(null);
  expect(shown.get()).toEqual(fitTo(boardInFrameView(editor.get().drawn), page));
});

test('When the page gets another size, then the board is fitted to that', () => {
  const stores = follow();
  stores.page.set({ width: 800, height: 600 });
  expect(stores.shown.get()).toEqual(fitTo(boardInFrameView(stores.editor.get().drawn), { width: 800, height: 600 }));
});

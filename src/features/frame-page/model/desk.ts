import { createContext, useContext } from 'react';
import type { Extents, Point } from '#shared/kernel/contour/contour.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { followFindings } from './follow-findings.ts';
import { followView } from './follow-view.ts';
import type { EditorState, FrameEditor } from './frame-editor.ts';
import type { Selection } from './selection.ts';
import { settle } from './settle.ts';
import { createStore, useStore, type Store } from './store.ts';
import type { PageSize, View } from './view.ts';

/** What is lit up on both pages. */
export interface Lit {
  readonly features: readonly FeatureId[];
  /** A place in frame view that a finding means. */
  readonly places: readonly Extents[];
}

export const NOTHING_LIT: Lit = { features: [], places: [] };

/** Measuring between two places of frame view. */
export interface Measuring {
  /** The page whose places the arrow keys walk. */
  readonly face: Face;
  readonly picked: readonly Point[];
  /** Where the next pick would be. */
  readonly at: Point | null;
}

/** What the parts of the frame page share. Each part follows only what it shows. */
export interface Desk {
  readonly editor: FrameEditor;
  /** The editor's state a moment late, see use-settled.ts. */
  readonly settled: Store<EditorState>;
  /** What the checks say, a moment late. */
  readonly findings: Store<readonly Finding[]>;
  readonly readOnly: boolean;
  readonly lit: Store<Lit>;
  /** Null: the board is fitted to the pages, whatever its size. */
  readonly view: Store<View | null>;
  /** The view as drawn now. */
  readonly shown: Store<View>;
  readonly settledView: Store<View>;
  /** Room that each page has for drawing; the smaller one where they differ. */
  readonly page: Store<PageSize>;
  /** Line sets that are switched off, by lineSetKey. */
  readonly hidden: Store<ReadonlySet<string>>;
  /** Null: not measuring. */
  readonly measuring: Store<Measuring | null>;
  /** The opening or member picked on the drawing; null: none. */
  readonly selection: Store<Selection | null>;
}

export function createDesk(editor: FrameEditor, readOnly: boolean): Desk {
  const shown = createStore<View>({ scale: 1, centre: { x: 0, y: 0 } });
  const view = createStore<View | null>(null);
  const page = createStore<PageSize>({ width: 400, height: 400 });
  followView({ editor: editor.store, view, page, shown });
  const settled = settle(editor.store);
  return {
    editor,
    settled,
    findings: followFindings(settled),
    readOnly,
    lit: createStore(NOTHING_LIT),
    view,
    shown,
    settledView: settle(shown),
    page,
    hidden: createStore<ReadonlySet<string>>(new Set()),
    measuring: createStore<Measuring | null>(null),
    selection: createStore<Selection | null>(null),
  };
}

const deskContext = createContext<Desk | null>(null);

export const DeskProvider = deskContext.Provider;

export function useDesk(): Desk {
  const desk = useContext(deskContext);
  if (desk === null) throw new Error('no frame is open here');
  return desk;
}

/** Part of the editor's state; it must be the same object for the same value. */
export const useEditor = <Part>(select: (state: EditorState) => Part): Part => useStore(useDesk().editor.store, select);

const sameList = (a: readonly unknown[], b: readonly unknown[]): boolean =>
  a.length === b.length && a.every((v, i) => v === b[i]);

/** Lights features up; the same ones again change nothing. */
export function light(lit: Store<Lit>, features: readonly FeatureId[], places: readonly Extents[] = []): void {
  const now = lit.get();
  if (!sameList(now.features, features) || !sameList(now.places, places)) lit.set({ features, places });
}

import type { FieldError } from '#shared/contracts/error-codes.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import { openingParts } from '#shared/kernel/particulars/layout-parts.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { drawFrame, type FrameLines } from '#shared/kernel/draw-frame.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { describeField } from './describe-field.ts';
import { entrySchema } from './entry-schema.ts';
import { closeEntry, record, redo, startHistory, undo, type History } from './history.ts';
import { createStore, type Store } from './store.ts';

export interface EditorState {
  readonly history: History;
  /** The lines that follow from the particulars. */
  readonly lines: FrameLines;
  /** What the spread shows: the newest lines of which none is missing. */
  readonly drawn: DrawnFrame;
  /** Goes up whenever the particulars change other than by typing into an entry: texts being typed are then dropped. */
  readonly epoch: number;
  /** Entries whose text could not be taken, by path, with what they take. */
  readonly wrong: ReadonlyMap<string, string>;
}

/** One frame under work: every change goes through here, is held against the contract, worked out and can be taken back. */
export interface FrameEditor {
  readonly store: Store<EditorState>;
  /** Sets an entry. Answers '' or, when it was not taken, what the entry takes. */
  readonly edit: (path: string, value: unknown) => string;
  /** Notes that an entry's text cannot be read, or ('') that it can again. */
  readonly setWrong: (path: string, takes: string) => void;
  /** Puts changed particulars in place as one step, such as a removed dado. Answers '' or what is wrong with them. */
  readonly apply: (next: Particulars, label: string) => string;
  readonly leaveEntry: () => void;
  readonly undo: () => void;
  readonly redo: () => void;
}

/** Whether every opening could be laid out: where members do not add up some are missing, and the last good drawing stays. */
const isDrawable = ({ particulars: { outline }, contours }: DrawnFrame): boolean =>
  contours.openings.length ===
  (outline.kind === 'members' ? openingParts(outline.layout).length : outline.openings.length);

/** What the contract finds wrong with the entry at `path` and what belongs together with it. '' reads all. */
function errorsNear(candidate: Particulars, path: string): FieldError[] {
  const keys = path === '' ? [] : path.split('.');
  const near = entrySchema(contract, keys, candidate);
  const prefix = keys.slice(0, near.keys).join('.');
  const value: unknown = prefix === '' ? candidate : readField(candidate, prefix);
  const read = near.schema.safeParse(value);
  if (read.success) return [];
  return fieldErrors(read.error, value).map((error) => ({
    ...error,
    path: [prefix, error.path].filter((part) => part !== '').join('.'),
  }));
}

const NOTHING_WRONG: ReadonlyMap<string, string> = new Map();

export function createFrameEditor(initial: Particulars): FrameEditor {
  const first = drawFrame(initial);
  const store = createStore<EditorState>({
    history: startHistory(initial),
    lines: first,
    drawn: first,
    epoch: 0,
    wrong: NOTHING_WRONG,
  });

  /** What is wrong with particulars, said for the entry at `path`; '' when nothing is. */
  function problem(candidate: Particulars, path: string): string {
    const errors = errorsNear(candidate, path);
    const [first] = errors;
    if (first === undefined) return '';
    const own = errors.find((error) => error.path === path);
    return own ? own.takes : `what fits “${describeField(candidate, first.path)}”: that takes ${first.takes}`;
  }

  function put(history: History, typed: boolean): void {
    const now = store.get();
    if (history === now.history) return;
    const same = history.present === now.history.present;
    const lines = same ? now.lines : drawFrame(history.present);
    store.set({
      history,
      lines,
      drawn: isDrawable(lines) ? lines : now.drawn,
      epoch: typed ? now.epoch : now.epoch + 1,
      wrong: typed ? now.wrong : NOTHING_WRONG,
    });
  }

  /** A wrong text that changed nothing is what a person takes back first. */
  function dropWrong(): boolean {
    const now = store.get();
    if (now.wrong.size === 0 || now.wrong.has(now.history.open)) return false;
    store.set({ ...now, wrong: NOTHING_WRONG, epoch: now.epoch + 1 });
    return true;
  }

  return {
    store,
    edit(path, value) {
      const { history } = store.get();
      const next = setField(history.present, path, value);
      const takes = next === history.present ? '' : problem(next, path);
      if (takes === '') put(record(history, next, describeField(next, path), path), true);
      return takes;
    },
    setWrong(path, takes) {
      const now = store.get();
      if ((now.wrong.get(path) ?? '') === takes) return;
      const wrong = new Map(now.wrong);
      if (takes === '') wrong.delete(path);
      else wrong.set(path, takes);
      store.set({ ...now, wrong });
    },
    apply(next, label) {
      const takes = problem(next, '');
      if (takes === '') put(record(store.get().history, next, label), false);
      return takes;
    },
    leaveEntry: () => put(closeEntry(store.get().history), true),
    undo() {
      if (!dropWrong()) put(undo(store.get().history), false);
    },
    redo: () => put(redo(store.get().history), false),
  };
}

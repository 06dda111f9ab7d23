import { useEffect, useMemo, useRef, useState } from 'react';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { useDesk, useEditor } from '../model/desk.ts';
import type { EditorState } from '../model/frame-editor.ts';
import { useFormFacts } from './form-facts.ts';

export type ReadText = { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly takes: string };

interface Typed {
  readonly text: string;
  /** The entry's value when this was typed, or what it became by it. */
  readonly value: unknown;
  readonly epoch: number;
  /** '' or what the entry takes. */
  readonly takes: string;
}

export interface Entry {
  readonly value: unknown;
  readonly text: string;
  /** Said after a pause in typing or on leaving; '' while nothing is wrong. */
  readonly error: string;
  readonly change: (text: string) => void;
  readonly leave: () => void;
}

/** How long a person may stop within an unfinished entry, such as "30 1/", before it is called wrong. */
const PATIENCE_MS = 700;

/** Reads one field of the editor's frame; of the many on a page only those beside the one that is typed in look it up anew. */
function fieldOf(path: string): (state: EditorState) => unknown {
  const branch = path.split('.')[0] as keyof Particulars;
  let known: { readonly at: unknown; readonly value: unknown } | null = null;
  return ({ history: { present } }) => {
    if (known === null || known.at !== present[branch])
      known = { at: present[branch], value: readField(present, path) };
    return known.value;
  };
}

/**
 * One typed entry of the particulars. Each keystroke that can be read and fits the contract goes to the frame at
 * once; a wrong text stays as typed and changes nothing. Undo, import and the like put the frame's value in its place.
 */
export function useEntry(path: string, read: (text: string) => ReadText, format: (value: unknown) => string): Entry {
  const { editor } = useDesk();
  const value = useEditor(useMemo(() => fieldOf(path), [path]));
  const { epoch } = useFormFacts();
  const [typed, setTyped] = useState<Typed | null>(null);
  const [settled, setSettled] = useState(true);

  const kept = typed !== null && typed.epoch === epoch && Object.is(typed.value, value) ? typed : null;
  const takes = kept?.takes ?? '';

  const wrong = takes === '' ? null : kept;
  useEffect(() => {
    if (takes === '' || settled) return;
    const timer = setTimeout(() => setSettled(true), PATIENCE_MS);
    return () => clearTimeout(timer);
    // Only a wrong text is waited for: what was typed well sets nothing off.
  }, [takes, settled, wrong]);

  // The same entry may stand in the form and on the drawing: each takes back only what it said itself.
  const isWrong = useRef(false);
  useEffect(
    () => () => {
      if (isWrong.current) editor.setWrong(path, '');
      isWrong.current = false;
    },
    [editor, path],
  );

  function change(text: string) {
    const now = read(text);
    const problem = now.ok ? editor.edit(path, now.value) : now.takes;
    editor.setWrong(path, problem);
    isWrong.current = problem !== '';
    setTyped({ text, value: now.ok && problem === '' ? now.value : value, epoch, takes: problem });
    setSettled(false);
  }

  function leave() {
    setSettled(true);
    if (takes === '') setTyped(null);
    editor.leaveEntry();
  }

  return {
    value,
    text: kept?.text ?? format(value),
    error:
      takes !== '' && settled ? `Got ${kept?.text.trim() ? `“${kept.text.trim()}”` : 'nothing'}; takes ${takes}.` : '',
    change,
    leave,
  };
}

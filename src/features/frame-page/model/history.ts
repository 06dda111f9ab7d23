import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

/** How many steps can be taken back. */
const LONGEST = 300;

interface Step {
  readonly particulars: Particulars;
  /** What was done next, as in "Undo: Width". */
  readonly label: string;
}

/** A frame's particulars, with what they were before and what was taken back. */
export interface History {
  readonly present: Particulars;
  /** Oldest first. */
  readonly past: readonly Step[];
  /** Next one first. */
  readonly future: readonly Step[];
  /** The entry whose further keystrokes still belong to the newest step; '' when none. */
  readonly open: string;
}

export const startHistory = (present: Particulars): History => ({ present, past: [], future: [], open: '' });

/**
 * One change. Keystrokes in one entry (`key`) make one step until that entry is left; '' makes a step of its own.
 * What was taken back before is gone.
 */
export function record(history: History, next: Particulars, label: string, key = ''): History {
  if (next === history.present) return history;
  const goesOn = key !== '' && history.open === key;
  const past = goesOn ? history.past : [...history.past, { particulars: history.present, label }].slice(-LONGEST);
  return { present: next, past, future: [], open: key };
}

/** Ends the entry that was being typed: what comes next is a step of its own. */
export const closeEntry = (history: History): History => (history.open === '' ? history : { ...history, open: '' });

export function undo(history: History): History {
  const step = history.past.at(-1);
  if (step === undefined) return history;
  return {
    present: step.particulars,
    past: history.past.slice(0, -1),
    future: [{ particulars: history.present, label: step.label }, ...history.future],
    open: '',
  };
}

export function redo(history: History): History {
  const [step, ...future] = history.future;
  if (step === undefined) return history;
  return {
    present: step.particulars,
    past: [...history.past, { particulars: history.present, label: step.label }],
    future,
    open: '',
  };
}

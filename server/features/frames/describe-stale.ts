import type { StaleDraft } from '#shared/contracts/frames.ts';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';

const MOST_CHANGES = 200;
const LONGEST_TEXT = 60;

/** A value as a person may read it in a list of changes. */
function inWords(value: unknown): string {
  if (value === undefined) return 'nothing';
  if (typeof value === 'string') return value;
  const text = JSON.stringify(value);
  return text.length > LONGEST_TEXT ? `${text.slice(0, LONGEST_TEXT - 1)}…` : text;
}

/**
 * What the second of two editors is told, entry by entry: what the draft was when they began, what it is now, and what
 * they have. Where the version they began with is no longer kept, their own draft is held against the one that stands.
 */
export function describeChanges(
  base: Particulars | null,
  theirs: Particulars,
  yours: Particulars | null,
): StaleDraft['changes'] {
  const from = base ?? yours ?? theirs;
  return listChanges(from, theirs)
    .slice(0, MOST_CHANGES)
    .map(({ path, from: was, to }) => ({
      path,
      yours: inWords(yours === null ? was : readField(yours, path)),
      theirs: inWords(to),
      ...(base !== null && { was: inWords(was) }),
    }));
}

import { listChanges } from './list-changes.ts';
import { readField } from './read-field.ts';
import { setField } from './set-field.ts';
import type { Particulars } from './particulars.ts';

export interface Merged {
  readonly particulars: Particulars;
  /** Paths of my changes that were left out, because theirs changed the same entry or something that holds it. */
  readonly leftOut: readonly string[];
}

const holds = (outer: string, inner: string): boolean => outer === inner || inner.startsWith(`${outer}.`);

/**
 * Two people's work on one draft: `theirs`, with my changes since `base` in every entry that theirs did not touch.
 * Entries are those of list-changes.ts. The result may break a rule that spans entries: hold it against the contract.
 */
export function mergeParticulars(base: Particulars, mine: Particulars, theirs: Particulars): Merged {
  const touched = listChanges(base, theirs).map((change) => change.path);
  const leftOut: string[] = [];
  let particulars = theirs;
  for (const { path, to } of listChanges(base, mine)) {
    if (Object.is(readField(theirs, path), to)) continue;
    if (touched.some((t) => holds(t, path) || holds(path, t))) leftOut.push(path);
    else particulars = setField(particulars, path, to);
  }
  return { particulars, leftOut };
}

import type { Particulars } from './particulars.ts';

/** One entry that differs; `undefined` where it is absent. Divided parts and lists of another length count as one entry. */
export interface Change {
  readonly path: string;
  readonly from: unknown;
  readonly to: unknown;
}

const isList = (v: unknown): v is readonly unknown[] => Array.isArray(v);
const isRecord = (v: unknown): v is Record<string, unknown> => v !== null && typeof v === 'object' && !isList(v);

/** Entries by which two kinds of the same thing are told apart: another kind is another thing, not some other fields. */
const KIND_KEYS = ['kind', 'style', 'opening', 'columns', 'rows'] as const;
const sameKind = (a: Record<string, unknown>, b: Record<string, unknown>): boolean =>
  KIND_KEYS.every((key) =>
    key === 'kind' || key === 'style' ? a[key] === b[key] : (a[key] === undefined) === (b[key] === undefined),
  );

function collect(from: unknown, to: unknown, path: string, into: Change[]): void {
  if (Object.is(from, to)) return;
  const under = (key: string | number): string => (path === '' ? `${key}` : `${path}.${key}`);
  if (isList(from) && isList(to) && from.length === to.length) {
    from.forEach((value, i) => collect(value, to[i], under(i), into));
  } else if (isRecord(from) && isRecord(to) && sameKind(from, to)) {
    for (const key of new Set([...Object.keys(from), ...Object.keys(to)]))
      collect(from[key], to[key], under(key), into);
  } else {
    into.push({ path, from, to });
  }
}

/** What was changed from one state of a frame's particulars to another, entry by entry; none when they are alike. */
export function listChanges(from: Particulars, to: Particulars): Change[] {
  const changes: Change[] = [];
  collect(from, to, '', changes);
  return changes;
}

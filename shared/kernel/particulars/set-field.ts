import type { Particulars } from './particulars.ts';

const missing = (path: string): Error => new Error(`no such entry in the particulars: ${path}`);

function set(at: unknown, keys: readonly string[], value: unknown, path: string): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  if (at === null || typeof at !== 'object') throw missing(path);
  if (Array.isArray(at)) {
    const index = Number(key);
    if (!Number.isInteger(index) || index < 0 || index >= at.length) throw missing(path);
    const changed = set(at[index], rest, value, path);
    return Object.is(changed, at[index]) ? at : at.with(index, changed);
  }
  const from = at as Record<string, unknown>;
  // Entries that a frame file may leave out are made where they end, not on the way there.
  if (rest.length > 0 && from[key] === undefined) throw missing(path);
  const changed = set(from[key], rest, value, path);
  if (Object.is(changed, from[key])) return at;
  if (changed !== undefined) return { ...from, [key]: changed };
  const { [key]: _dropped, ...kept } = from;
  return kept;
}

/**
 * The particulars with one entry changed. `path` is as in findings and field errors: 'dados.0.depth'.
 * `undefined` takes an optional entry out. What lies beside the path keeps its identity, and a value
 * that is there already gives the same object back. Does not check the value: that is the contract's work.
 * Throws when the path leads nowhere.
 */
export const setField = (particulars: Particulars, path: string, value: unknown): Particulars =>
  set(particulars, path.split('.'), value, path) as Particulars;

import type { Particulars } from './particulars.ts';

/** What stands at a path such as 'dados.0.depth'; `undefined` where nothing stands. */
export function readField(particulars: Particulars, path: string): unknown {
  let at: unknown = particulars;
  for (const key of path.split('.')) {
    if (at === null || typeof at !== 'object') return undefined;
    at = (at as Record<string, unknown>)[key];
  }
  return at;
}

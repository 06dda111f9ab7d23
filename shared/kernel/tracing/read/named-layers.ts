import type { NameTable } from './name-table.ts';

/** Tells of a layer's number whether it is one of these names, whatever their case; names that the file has not are no matter. */
export function namedLayers({ names }: NameTable, wanted: readonly string[]): Pick<ReadonlySet<number>, 'has'> {
  const keys = new Set(wanted.map((name) => name.toUpperCase()));
  const known: boolean[] = [];
  return { has: (layer) => (known[layer] ??= keys.has(names[layer]!.toUpperCase())) };
}

import type { CensusRow } from '../found-drawing.ts';
import { fateOf, type Reason } from './entity-reasons.ts';
import { PLACES_KEPT } from './read-limits.ts';

interface Row {
  readonly type: number;
  readonly layer: number;
  readonly reason: Reason | null;
  count: number;
  readonly lines: number[];
}

/** Counts entities by type, layer and why, by their numbers in the name tables. */
export class EntityCensus {
  total = 0;
  readonly #rows = new Map<number, Map<string, Row>>();
  #last: Row | null = null;

  add(type: number, layer: number, reason: Reason | null, line: number): void {
    this.total++;
    let row = this.#last;
    if (row === null || row.type !== type || row.layer !== layer || row.reason !== reason)
      this.#last = row = this.#find(type, layer, reason);
    row.count++;
    // A block's line is there once, however often the block is put somewhere.
    if (row.lines.length < PLACES_KEPT && !row.lines.includes(line)) row.lines.push(line);
  }

  /** The rows in the order of their first entity. */
  rows(typeNames: readonly string[], layerNames: readonly string[]): CensusRow[] {
    const all = [...this.#rows.values()].flatMap((byReason) => [...byReason.values()]);
    all.sort((one, other) => one.lines[0]! - other.lines[0]!);
    return all.map(({ type, layer, reason, count, lines }) => ({
      type: typeNames[type]!.toUpperCase(),
      layer: layerNames[layer]!,
      fate: fateOf(reason),
      reason,
      count,
      lines,
    }));
  }

  #find(type: number, layer: number, reason: Reason | null): Row {
    // Far fewer than 2^26 names fit a file that is read.
    const key = layer * 2 ** 26 + type;
    let byReason = this.#rows.get(key);
    if (byReason === undefined) this.#rows.set(key, (byReason = new Map()));
    let row = byReason.get(reason ?? '');
    if (row === undefined) byReason.set(reason ?? '', (row = { type, layer, reason, count: 0, lines: [] }));
    return row;
  }
}

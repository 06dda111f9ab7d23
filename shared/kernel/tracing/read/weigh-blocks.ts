import type { Block } from './index-blocks.ts';

/** What it comes to when a block is put somewhere once, with all that is in it. May be far more than could ever be read. */
export interface BlockWeight {
  readonly entities: number;
  readonly bytes: number;
  /** Blocks within blocks, 1 for one that holds none. */
  readonly nesting: number;
  /** It holds itself, or a block that does: the names on the way round. */
  readonly cycle: readonly string[] | null;
}

interface Visit {
  readonly id: number;
  readonly block: Block;
  next: number;
}

/**
 * Weighs every block, those within first, without going into any twice: so that a drawing that would unfold into
 * millions of entities is known before the first is read. Without recursion, however deep the file nests.
 */
export function weighBlocks(blocks: ReadonlyMap<number, Block>): Map<number, BlockWeight> {
  const weights = new Map<number, BlockWeight>();
  // Where each block of the present path stands on it.
  const onPath = new Map<number, number>();
  const cycles = new Map<number, readonly string[]>();
  for (const [rootId, root] of blocks) {
    if (weights.has(rootId)) continue;
    const path: Visit[] = [{ id: rootId, block: root, next: 0 }];
    onPath.set(rootId, 0);
    while (path.length > 0) {
      const visit = path[path.length - 1]!;
      const insert = visit.block.inserts[visit.next++];
      if (insert === undefined) {
        weights.set(visit.id, weigh(visit, weights, cycles.get(visit.id) ?? null));
        onPath.delete(visit.id);
        path.pop();
        continue;
      }
      const inner = blocks.get(insert.block);
      if (inner === undefined || weights.has(insert.block)) continue;
      const from = onPath.get(insert.block);
      if (from !== undefined) {
        if (!cycles.has(visit.id)) cycles.set(visit.id, namesRound(path, from));
        continue;
      }
      onPath.set(insert.block, path.length);
      path.push({ id: insert.block, block: inner, next: 0 });
    }
  }
  return weights;
}

/** A name or two show a long way round well enough. */
const NAMES_SHOWN = 6;

function namesRound(path: readonly Visit[], from: number): string[] {
  const names = path.slice(from, from + NAMES_SHOWN).map((visit) => visit.block.name);
  if (path.length - from > NAMES_SHOWN) names.push('…');
  return [...names, path[from]!.block.name];
}

function weigh(
  { block }: Visit,
  weights: ReadonlyMap<number, BlockWeight>,
  ownCycle: readonly string[] | null,
): BlockWeight {
  let { entities, bytes } = block;
  let nesting = 1;
  let cycle = ownCycle;
  for (const insert of block.inserts) {
    const inner = weights.get(insert.block);
    if (inner === undefined) continue;
    entities += insert.times * inner.entities;
    bytes += insert.times * inner.bytes;
    nesting = Math.max(nesting, inner.nesting + 1);
    cycle ??= inner.cycle;
  }
  return { entities, bytes, nesting, cycle };
}

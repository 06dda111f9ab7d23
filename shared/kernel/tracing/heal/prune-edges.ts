import { incidenceOf, otherEnd, type Network } from './network.ts';

/**
 * Edges that bound no area: those that hang by a free end, and bridges between parts that do. Marked 1 in the answer, one
 * entry an edge. What is left has two ways to each of its nodes.
 */
export function edgesBoundingNothing(network: Network): Uint8Array {
  const gone = new Uint8Array(network.edges.count);
  markHanging(network, gone);
  if (hasBranches(network, gone)) markBridges(network, gone);
  return gone;
}

function markHanging(network: Network, gone: Uint8Array): void {
  const { edges, nodes } = network;
  const { start, list } = incidenceOf(network);
  const degree = new Int32Array(nodes.count);
  const free: number[] = [];
  for (let n = 0; n < nodes.count; n++) {
    degree[n] = start[n + 1]! - start[n]!;
    if (degree[n] === 1) free.push(n);
  }
  for (let n = free.pop(); n !== undefined; n = free.pop()) {
    for (let i = start[n]!; i < start[n + 1]!; i++) {
      const e = list[i]!;
      if (gone[e]) continue;
      gone[e] = 1;
      const next = otherEnd(edges, e, n);
      if (--degree[next]! === 1) free.push(next);
    }
  }
}

/** Whether more than two edges meet anywhere. */
function hasBranches({ nodes, edges }: Network, gone: Uint8Array): boolean {
  const degree = new Int32Array(nodes.count);
  for (let e = 0; e < edges.count; e++) {
    if (gone[e]) continue;
    if (++degree[edges.from[e]!]! > 2 || ++degree[edges.to[e]!]! > 2) return true;
  }
  return false;
}

/** Bridges by depth-first search: an edge is one when nothing beyond it leads back to before it (Tarjan 1974). Without recursion: chains may be long. */
function markBridges(network: Network, gone: Uint8Array): void {
  const { edges, nodes } = network;
  const { start, list } = incidenceOf(network, gone);
  const seen = new Int32Array(nodes.count);
  const low = new Int32Array(nodes.count);
  const cursor = start.slice(0, nodes.count);
  const cameBy = new Int32Array(nodes.count).fill(-1);
  let clock = 0;
  for (let root = 0; root < nodes.count; root++) {
    if (seen[root] || start[root] === start[root + 1]) continue;
    const path = [root];
    seen[root] = low[root] = ++clock;
    while (path.length > 0) {
      const n = path[path.length - 1]!;
      if (cursor[n]! < start[n + 1]!) {
        const e = list[cursor[n]!++]!;
        if (e === cameBy[n]) continue;
        const next = otherEnd(edges, e, n);
        if (seen[next]) {
          low[n] = Math.min(low[n]!, seen[next]!);
        } else {
          cameBy[next] = e;
          seen[next] = low[next] = ++clock;
          path.push(next);
        }
        continue;
      }
      path.pop();
      const e = cameBy[n]!;
      if (e < 0) continue;
      const before = otherEnd(edges, e, n);
      low[before] = Math.min(low[before]!, low[n]!);
      if (low[n]! > seen[before]!) gone[e] = 1;
    }
  }
}

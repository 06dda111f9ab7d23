import { startOf } from './half-edges.ts';
import { incidenceOf, type Network } from './network.ts';

/** Half-edges of each open chain among the edges marked in `only`: from one end or branch to the next. */
export function findChains(network: Network, only: Uint8Array): number[][] {
  const { edges, nodes } = network;
  const { start, list } = incidenceOf(
    network,
    only.map((marked) => 1 - marked),
  );
  const used = new Uint8Array(edges.count);
  const chains: number[][] = [];
  const follow = (node: number, edge: number) => {
    const chain: number[] = [];
    let e = edge;
    let n = node;
    while (!used[e]) {
      used[e] = 1;
      const half = edges.from[e]! === n ? 2 * e : 2 * e + 1;
      chain.push(half);
      n = startOf(network, half ^ 1);
      if (start[n + 1]! - start[n]! !== 2) break;
      e = list[start[n]!]! === e ? list[start[n]! + 1]! : list[start[n]!]!;
    }
    chains.push(chain);
  };
  for (let n = 0; n < nodes.count; n++) {
    if (start[n + 1]! - start[n]! === 2) continue;
    for (let i = start[n]!; i < start[n + 1]!; i++) if (!used[list[i]!]) follow(n, list[i]!);
  }
  return chains;
}

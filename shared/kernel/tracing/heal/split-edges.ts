import { FAR_LONGER } from './heal-tolerances.ts';
import { emptyEdges, type Network } from './network.ts';

/** Places where edges are to be cut in two: edge, share of its length, and the node that is there. */
export interface Cuts {
  readonly edge: number[];
  readonly share: number[];
  readonly node: number[];
}

export interface SplitNetwork {
  readonly network: Network;
  /** How many more edges there are now. */
  readonly splits: number;
  /** Pieces no longer than the gap of edges that are far longer. */
  readonly crumbs: readonly number[];
}

/** The edges cut into pieces. Cuts at an edge's own ends, or twice at one node, count for nothing. */
export function splitEdges(network: Network, cuts: Cuts, gap: number): SplitNetwork {
  if (cuts.edge.length === 0) return { network, splits: 0, crumbs: [] };
  const crumbs: number[] = [];
  const { nodes, edges } = network;
  const out = emptyEdges(edges.count + cuts.edge.length);
  const sorted = cuts.edge
    .map((_, i) => i)
    .sort((i, j) => cuts.edge[i]! - cuts.edge[j]! || cuts.share[i]! - cuts.share[j]!);
  const chordOf = (a: number, b: number) => Math.hypot(nodes.x[b]! - nodes.x[a]!, nodes.y[b]! - nodes.y[a]!);
  let next = 0;
  for (let e = 0; e < edges.count; e++) {
    const angle = Math.atan(edges.bulge[e]!);
    const last = edges.to[e]!;
    let from = edges.from[e]!;
    let gone = 0;
    const isLong = chordOf(from, last) > FAR_LONGER * gap;
    const put = (to: number, share: number) => {
      out.from[out.count] = from;
      out.to[out.count] = to;
      // A share of an arc has that share of its angle, and bulge = tan(angle / 4).
      out.bulge[out.count] = gone === 0 && share === 1 ? edges.bulge[e]! : Math.tan(angle * (share - gone));
      out.source[out.count] = edges.source[e]!;
      if (isLong && chordOf(from, to) <= gap) crumbs.push(out.count);
      out.count++;
      from = to;
      gone = share;
    };
    for (; next < sorted.length && cuts.edge[sorted[next]!] === e; next++) {
      const node = cuts.node[sorted[next]!]!;
      if (node !== from && node !== last) put(node, cuts.share[sorted[next]!]!);
    }
    put(last, 1);
  }
  return { network: { nodes, edges: out }, splits: out.count - edges.count, crumbs };
}

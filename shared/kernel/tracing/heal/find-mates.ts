import type { BoxTree } from './box-tree.ts';
import { distanceToCarrier } from './carrier-of.ts';
import type { HealLimits } from './heal-tolerances.ts';
import { edgeSegment, otherEnd, type Incidence, type Network } from './network.ts';
import { placeOnEdge } from './place-on-edge.ts';
import { makePointGrid } from './point-grid.ts';

/** What an open end may be joined to: another node, or the inside of an edge. */
export type Mate =
  | { readonly kind: 'node'; readonly node: number; readonly away: number }
  | { readonly kind: 'edge'; readonly edge: number; readonly share: number; readonly away: number };

const degree = ({ start }: Incidence, n: number) => start[n + 1]! - start[n]!;

/** Nodes of the end's own chain within the gap: a fine curve must not be joined to itself. */
function ownChain({ nodes, edges }: Network, { start, list }: Incidence, end: number, gap: number) {
  const ownNodes = new Set([end]);
  let node = end;
  let edge = list[start[end]!]!;
  for (;;) {
    node = otherEnd(edges, edge, node);
    if (ownNodes.has(node)) break;
    ownNodes.add(node);
    const away = Math.hypot(nodes.x[node]! - nodes.x[end]!, nodes.y[node]! - nodes.y[end]!);
    if (away > gap || start[node + 1]! - start[node]! !== 2) break;
    edge = list[start[node]!]! === edge ? list[start[node]! + 1]! : list[start[node]!]!;
  }
  return ownNodes;
}

/** One node for each place: candidates that edges between them join are one place, its open node, or else its nearest, stands for it. */
function onePerPlace(network: Network, incidence: Incidence, nodes: readonly number[], away: (n: number) => number) {
  if (nodes.length < 2) return nodes;
  const places: number[] = [];
  const left = new Set(nodes);
  for (const first of nodes) {
    if (!left.delete(first)) continue;
    let best = first;
    const walk = [first];
    for (let n = walk.pop(); n !== undefined; n = walk.pop()) {
      const openness = Number(degree(incidence, n) === 1) - Number(degree(incidence, best) === 1);
      if (openness > 0 || (openness === 0 && away(n) < away(best))) best = n;
      for (let i = incidence.start[n]!; i < incidence.start[n + 1]!; i++) {
        const next = otherEnd(network.edges, incidence.list[i]!, n);
        if (left.delete(next)) walk.push(next);
      }
    }
    places.push(best);
  }
  return places;
}

/**
 * For each open end (a node with one edge) that has any, all the places within the gap to which it might be joined, itself and its
 * own chain excepted. An edge counts where its inside is near but neither of its ends is.
 */
export function findMates(
  network: Network,
  incidence: Incidence,
  tree: BoxTree,
  { gap }: HealLimits,
): Map<number, readonly Mate[]> {
  const { nodes, edges } = network;
  const mates = new Map<number, readonly Mate[]>();
  const open: number[] = [];
  for (let n = 0; n < nodes.count; n++) if (degree(incidence, n) === 1) open.push(n);
  if (open.length === 0) return mates;
  const grid = makePointGrid(nodes.x.subarray(0, nodes.count), nodes.y.subarray(0, nodes.count), 4 * gap);
  for (let n = 0; n < nodes.count; n++) if (degree(incidence, n) > 0) grid.add(n);

  // Set before each search: these run for every open end, and most find nothing but the end itself.
  let end = 0;
  let nearNodes: number[] = [];
  let nearEdges: number[] = [];
  const addNode = (n: number) => {
    if (n !== end) nearNodes.push(n);
  };
  const addEdge = (edge: number) => {
    if (edges.from[edge] !== end && edges.to[edge] !== end) nearEdges.push(edge);
  };
  const away = (n: number) => Math.hypot(nodes.x[n]! - nodes.x[end]!, nodes.y[n]! - nodes.y[end]!);
  for (end of open) {
    const x = nodes.x[end]!;
    const y = nodes.y[end]!;
    if (nearNodes.length > 0) nearNodes = [];
    if (nearEdges.length > 0) nearEdges = [];
    grid.eachNear(x, y, gap, addNode);
    tree.eachMeeting(x - gap, y - gap, x + gap, y + gap, addEdge);
    if (nearNodes.length === 0 && nearEdges.length === 0) continue;
    const ownNodes = ownChain(network, incidence, end, gap);
    const others = nearNodes.filter((n) => !ownNodes.has(n));
    const found: Mate[] = onePerPlace(network, incidence, others, away).map((node) => ({
      kind: 'node',
      node,
      away: away(node),
    }));
    for (const edge of nearEdges) {
      if (away(edges.from[edge]!) <= gap || away(edges.to[edge]!) <= gap) continue;
      const share = placeOnEdge(network, edge, x, y, gap);
      if (share > 0 && share < 1)
        found.push({ kind: 'edge', edge, share, away: distanceToCarrier(edgeSegment(network, edge), x, y) });
    }
    if (found.length > 0) mates.set(end, found);
  }
  return mates;
}

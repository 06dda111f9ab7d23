import { emptyEdges, incidenceOf, type Network } from './network.ts';

/**
 * The network without edges whose chord is no longer than `sliver`; the two ends of each become one node, that with more edges.
 * Never two slivers in a
 * row, so that a curve of many tiny lines does not shrink to a point.
 */
export function dropSlivers(network: Network, sliver: number): { network: Network; slivers: number } {
  const { nodes, edges } = network;
  if (!hasSliver(network, sliver)) return { network, slivers: 0 };
  const { start } = incidenceOf(network);
  const becomes = Int32Array.from({ length: nodes.count }, (_, n) => n);
  const merged = new Uint8Array(nodes.count);
  const gone = new Uint8Array(edges.count);
  for (let e = 0; e < edges.count; e++) {
    const a = edges.from[e]!;
    const b = edges.to[e]!;
    const chord = Math.hypot(nodes.x[b]! - nodes.x[a]!, nodes.y[b]! - nodes.y[a]!);
    if (chord > sliver || (a !== b && (merged[a] || merged[b]))) continue;
    gone[e] = 1;
    if (a === b) continue;
    if (start[a + 1]! - start[a]! < start[b + 1]! - start[b]!) becomes[a] = b;
    else becomes[b] = a;
    merged[a] = 1;
    merged[b] = 1;
  }
  const kept = emptyEdges(edges.count);
  for (let e = 0; e < edges.count; e++) {
    const from = becomes[edges.from[e]!]!;
    const to = becomes[edges.to[e]!]!;
    if (gone[e] || from === to) continue;
    const at = kept.count++;
    kept.from[at] = from;
    kept.to[at] = to;
    kept.bulge[at] = edges.bulge[e]!;
    kept.source[at] = edges.source[e]!;
  }
  return { network: { nodes, edges: kept }, slivers: edges.count - kept.count };
}

function hasSliver({ nodes, edges }: Network, sliver: number): boolean {
  for (let e = 0; e < edges.count; e++) {
    const dx = nodes.x[edges.from[e]!]! - nodes.x[edges.to[e]!]!;
    const dy = nodes.y[edges.from[e]!]! - nodes.y[edges.to[e]!]!;
    if (dx * dx + dy * dy <= sliver * sliver) return true;
  }
  return false;
}

import { COPY_SHARE, type HealLimits } from './heal-tolerances.ts';
import { distanceToCarrier } from './carrier-of.ts';
import { edgesWithout, edgeSegment, type Network } from './network.ts';
import { makePointGrid } from './point-grid.ts';

export interface Dropped {
  readonly network: Network;
  readonly dropped: number;
  /** How many segments of the drawing the dropped edges came of: less than `dropped` where an arc is two edges. */
  readonly sources: number;
}

/**
 * The network without second copies of an edge, run either way: both ends and the middle lie within the gap (for short edges
 * within a share of their length, so that neighbours in a fine curve are no copies). The first of the copies stays.
 * Edges that lie on one line or circle but begin or end apart are no copies: they overlap, which cutting tells exactly.
 */
export function dropCopies(network: Network, limits: HealLimits): Dropped {
  const { nodes, edges } = network;
  const middleX = new Float64Array(edges.count);
  const middleY = new Float64Array(edges.count);
  const grid = makePointGrid(middleX, middleY, 4 * limits.gap);
  const gone = new Uint8Array(edges.count);
  const near = (n: number, m: number, reach: number) =>
    n === m || Math.hypot(nodes.x[n]! - nodes.x[m]!, nodes.y[n]! - nodes.y[m]!) <= reach;
  const asClose = (other: number, e: number, reach: number) => {
    const a = edges.from[e]!;
    const b = edges.to[e]!;
    const c = edges.from[other]!;
    const d = edges.to[other]!;
    return (near(a, c, reach) && near(b, d, reach)) || (near(a, d, reach) && near(b, c, reach));
  };
  const sameCarrier = (other: number, e: number) => {
    const carrier = edgeSegment(network, other);
    return [edges.from[e]!, edges.to[e]!].every(
      (n) => distanceToCarrier(carrier, nodes.x[n]!, nodes.y[n]!) <= limits.weld,
    );
  };
  // One function for all edges, set before each search: this is an inner loop.
  let edge = 0;
  let reach = 0;
  let copied = false;
  const compare = (other: number) => {
    copied = asClose(other, edge, reach) && (asClose(other, edge, limits.weld) || !sameCarrier(other, edge));
    return copied;
  };
  let dropped = 0;
  let sources = 0;
  let lastSource = -1;
  for (edge = 0; edge < edges.count; edge++) {
    const a = edges.from[edge]!;
    const b = edges.to[edge]!;
    const dx = nodes.x[b]! - nodes.x[a]!;
    const dy = nodes.y[b]! - nodes.y[a]!;
    reach = Math.max(limits.weld, Math.min(limits.gap, Math.sqrt(dx * dx + dy * dy) * COPY_SHARE));
    const half = edges.bulge[edge]! / 2;
    const mx = (nodes.x[a]! + nodes.x[b]!) / 2 + dy * half;
    const my = (nodes.y[a]! + nodes.y[b]!) / 2 - dx * half;
    copied = false;
    // The grid holds the middles of edges that stay.
    grid.eachNear(mx, my, reach, compare);
    if (!copied) {
      middleX[edge] = mx;
      middleY[edge] = my;
      grid.add(edge);
      continue;
    }
    gone[edge] = 1;
    dropped++;
    // Pieces of one segment follow each other.
    if (edges.source[edge]! !== lastSource) sources++;
    lastSource = edges.source[edge]!;
  }
  return { network: dropped === 0 ? network : { nodes, edges: edgesWithout(edges, gone) }, dropped, sources };
}

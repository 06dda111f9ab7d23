import type { SizedPlace } from './close-gaps.ts';
import { leavingAngle } from './half-edges.ts';
import { NEARLY_PARALLEL, type HealLimits } from './heal-tolerances.ts';
import { moveNodes } from './move-nodes.ts';
import { incidenceOf, type Incidence, type Network } from './network.ts';

export interface Contracted {
  readonly network: Network;
  readonly slivers: number;
  /** Where something moved: a line that ran a little past a corner, or two junctions that became one. */
  readonly moved: readonly SizedPlace[];
  /** Nodes from which a free end went: corners, no junctions. */
  readonly corners: ReadonlySet<number>;
}

/** In how many directions edges lie at a node, both ways of a line being one. */
function directionsAt(network: Network, { start, list }: Incidence, n: number): number {
  const lines: number[] = [];
  for (let i = start[n]!; i < start[n + 1]!; i++) {
    const e = list[i]!;
    const angle = leavingAngle(network, network.edges.from[e]! === n ? 2 * e : 2 * e + 1, 0);
    if (lines.every((line) => Math.abs(Math.sin(angle - line)) > NEARLY_PARALLEL)) lines.push(angle);
  }
  return lines.length;
}

/**
 * The network with crumbs taken out: pieces within the gap that were cut off the end of a longer edge. Both ends of a crumb become
 * one node: that where more directions meet, so that a corner stays where it is and a place along a line gives way.
 */
export function contractCrumbs(network: Network, crumbs: readonly number[], { gap, weld }: HealLimits): Contracted {
  const { nodes, edges } = network;
  const incidence = incidenceOf(network);
  const becomes = new Map<number, number>();
  const lastOf = (n: number): number => {
    let last = n;
    for (let next = becomes.get(last); next !== undefined; next = becomes.get(last)) last = next;
    return last;
  };
  const moved: SizedPlace[] = [];
  const corners = new Set<number>();
  const degree = (n: number) => incidence.start[n + 1]! - incidence.start[n]!;
  for (const e of crumbs) {
    const [a, b] = [lastOf(edges.from[e]!), lastOf(edges.to[e]!)];
    const size = Math.hypot(nodes.x[a]! - nodes.x[b]!, nodes.y[a]! - nodes.y[b]!);
    if (a === b || size > gap) continue;
    const [ways, otherWays] = [directionsAt(network, incidence, a), directionsAt(network, incidence, b)];
    const [stays, goes] = ways > otherWays || (ways === otherWays && degree(a) >= degree(b)) ? [a, b] : [b, a];
    becomes.set(goes, stays);
    const isFree = degree(goes) === 1;
    if (isFree) corners.add(stays);
    if (size > weld && (isFree || Math.min(ways, otherWays) > 1))
      moved.push({ x: nodes.x[stays]!, y: nodes.y[stays]!, size });
  }
  const final = new Map([...becomes.keys()].map((n) => [n, lastOf(n)]));
  return { ...moveNodes(network, final, new Map(), weld), moved, corners };
}

import { startOf } from './half-edges.ts';
import type { Network } from './network.ts';

/** Length along half-edges; an arc of chord c and bulge b is R · 4·atan|b| long, with R = c(1 + b²)/(4|b|). */
export function ringLength(network: Network, halves: readonly number[]): number {
  const { nodes, edges } = network;
  let length = 0;
  for (const h of halves) {
    const a = startOf(network, h);
    const b = startOf(network, h ^ 1);
    const chord = Math.hypot(nodes.x[b]! - nodes.x[a]!, nodes.y[b]! - nodes.y[a]!);
    const bulge = Math.abs(edges.bulge[h >> 1]!);
    length += bulge === 0 ? chord : (chord * (1 + bulge * bulge) * Math.atan(bulge)) / bulge;
  }
  return length;
}

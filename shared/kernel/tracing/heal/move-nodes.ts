import type { Point } from '../../contour/contour.ts';
import { edgeSegment, emptyEdges, type Network } from './network.ts';

const turn = 2 * Math.PI;
/** The angle brought into (−π, π]. */
const wrap = (angle: number) => angle - turn * Math.ceil((angle - Math.PI) / turn);

/**
 * A network in which nodes become others or get new places. An arc whose ends still lie on its circle stays on that circle; else
 * it keeps its angle. Edges of which nothing is left are taken out and counted as slivers.
 */
export function moveNodes(
  network: Network,
  becomes: ReadonlyMap<number, number>,
  places: ReadonlyMap<number, Point>,
  weld: number,
): { network: Network; slivers: number } {
  if (becomes.size === 0 && places.size === 0) return { network, slivers: 0 };
  const { nodes, edges } = network;
  const x = nodes.x.slice();
  const y = nodes.y.slice();
  for (const [n, p] of places) {
    x[n] = p.x;
    y[n] = p.y;
  }
  const kept = emptyEdges(edges.count);
  for (let e = 0; e < edges.count; e++) {
    const [a, b] = [edges.from[e]!, edges.to[e]!];
    const from = becomes.get(a) ?? a;
    const to = becomes.get(b) ?? b;
    if (from === to) continue;
    const at = kept.count++;
    kept.from[at] = from;
    kept.to[at] = to;
    kept.source[at] = edges.source[e]!;
    const bent = edges.bulge[e] !== 0 && (from !== a || to !== b || places.has(a) || places.has(b));
    kept.bulge[at] = bent
      ? bulgeBetween(network, e, { x: x[from]!, y: y[from]! }, { x: x[to]!, y: y[to]! }, weld)
      : edges.bulge[e]!;
  }
  return { network: { nodes: { count: nodes.count, x, y }, edges: kept }, slivers: edges.count - kept.count };
}

/** Bulge of an arc between its new ends. */
function bulgeBetween(network: Network, edge: number, a: Point, b: Point, weld: number): number {
  const s = edgeSegment(network, edge);
  const bulge = network.edges.bulge[edge]!;
  if (s.kind === 'line') return 0;
  const off = (p: Point) => Math.abs(Math.hypot(p.x - s.centre.x, p.y - s.centre.y) - s.radius);
  if (off(a) > weld || off(b) > weld) return bulge;
  const angle = (p: Point) => Math.atan2(p.y - s.centre.y, p.x - s.centre.x);
  const sweep = s.sweep + wrap(angle(b) - s.start - s.sweep) - wrap(angle(a) - s.start);
  return Math.sign(sweep) === Math.sign(s.sweep) && Math.abs(sweep) < turn ? Math.tan(sweep / 4) : bulge;
}

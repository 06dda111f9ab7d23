import { carrierOf } from './carrier-of.ts';
import { directionAt, type Segment } from '../../contour/segments.ts';
import { intersectCarriers } from '../../contour/intersect-carriers.ts';
import type { BoxTree } from './box-tree.ts';
import { MOST_CROSSINGS, TOUCHING, type HealLimits } from './heal-tolerances.ts';
import { edgeMiddle, edgeSegment, type Network } from './network.ts';
import { placeOnEdge } from './place-on-edge.ts';
import type { Cuts } from './split-edges.ts';

export interface Crossing {
  readonly x: number;
  readonly y: number;
  readonly edges: readonly [number, number];
}

export interface Pairs {
  /** Where an end lies on the inside of another edge, within the weld. */
  readonly cuts: Cuts;
  /** Nodes of the cuts that are junctions; at the others an edge begins or ends to run along another. */
  readonly junctions: ReadonlySet<number>;
  /** Where two edges cross, ends excepted; no more than MOST_CROSSINGS. */
  readonly crossings: readonly Crossing[];
}

/** Looks at each two edges whose rectangles meet. */
export function comparePairs(network: Network, tree: BoxTree, { weld }: HealLimits): Pairs {
  const { nodes, edges } = network;
  const cuts: Cuts = { edge: [], share: [], node: [] };
  const crossings: Crossing[] = [];
  const junctions = new Set<number>();

  const nearEnd = (e: number, x: number, y: number) =>
    [edges.from[e]!, edges.to[e]!].some((n) => Math.hypot(nodes.x[n]! - x, nodes.y[n]! - y) <= 2 * weld);

  /** Whether edge f, one end of which is on e, runs along it: f's middle is on e, or an end of e is on f's inside. */
  const runsAlong = (e: number, f: number): boolean => {
    const [mx, my] = edgeMiddle(network, f);
    if (placeOnEdge(network, e, mx, my, 2 * weld) >= 0) return true;
    return [edges.from[e]!, edges.to[e]!].some((n) => {
      const [x, y] = [nodes.x[n]!, nodes.y[n]!];
      return !nearEnd(f, x, y) && placeOnEdge(network, f, x, y, 2 * weld) >= 0;
    });
  };

  /** Cuts edge e where node n, an end of edge f, lies on its inside. */
  const cutAt = (e: number, n: number, f: number): boolean => {
    const a = edges.from[e]!;
    const b = edges.to[e]!;
    if (n === a || n === b) return false;
    const share = placeOnEdge(network, e, nodes.x[n]!, nodes.y[n]!, weld);
    if (share < 0) return false;
    cuts.edge.push(e);
    cuts.share.push(share);
    cuts.node.push(n);
    if (!runsAlong(e, f)) junctions.add(n);
    return true;
  };
  const addCrossing = (x: number, y: number, e: number, f: number) => {
    if (crossings.length < MOST_CROSSINGS) crossings.push({ x, y, edges: [e, f] });
  };

  const comparePair = (e: number, f: number) => {
    const a = edges.from[e]!;
    const b = edges.to[e]!;
    const c = edges.from[f]!;
    const d = edges.to[f]!;
    const straight = edges.bulge[e] === 0 && edges.bulge[f] === 0;
    const shared = a === c || a === d || b === c || b === d;
    const ax = nodes.x[a]!;
    const ay = nodes.y[a]!;
    const cx = nodes.x[c]!;
    const cy = nodes.y[c]!;
    const ux = nodes.x[b]! - ax;
    const uy = nodes.y[b]! - ay;
    const vx = nodes.x[d]! - cx;
    const vy = nodes.y[d]! - cy;
    const cross = ux * vy - uy * vx;
    // Most pairs are neighbours at a corner, which have nothing else in common.
    if (straight && shared && Math.abs(cross) > TOUCHING * (Math.abs(ux * vx) + Math.abs(uy * vy) + Math.abs(cross)))
      return;
    let cut = cutAt(e, c, f);
    cut = cutAt(e, d, f) || cut;
    cut = cutAt(f, a, e) || cut;
    cut = cutAt(f, b, e) || cut;
    if (!straight) {
      crossArcs(e, f);
      return;
    }
    if (cut || shared || cross === 0) return;
    const t = ((cx - ax) * vy - (cy - ay) * vx) / cross;
    const s = ((cx - ax) * uy - (cy - ay) * ux) / cross;
    if (t > 0 && t < 1 && s > 0 && s < 1) addCrossing(ax + t * ux, ay + t * uy, e, f);
  };

  const crossArcs = (e: number, f: number) => {
    const s = edgeSegment(network, e);
    const t = edgeSegment(network, f);
    for (const { x, y } of intersectCarriers(carrierOf(s), carrierOf(t))) {
      if (nearEnd(e, x, y) || nearEnd(f, x, y)) continue;
      if (placeOnEdge(network, e, x, y, weld) < 0 || placeOnEdge(network, f, x, y, weld) < 0) continue;
      if (sineAt(s, t, x, y) > TOUCHING) addCrossing(x, y, e, f);
    }
  };

  tree.eachPair(weld, comparePair);
  return { cuts, junctions, crossings };
}

const directionOn = (s: Segment, x: number, y: number) =>
  s.kind === 'line' ? directionAt(s, 'start') : { x: (s.centre.y - y) / s.radius, y: (x - s.centre.x) / s.radius };

/** Sine of the angle at which two segments meet in a point. */
function sineAt(s: Segment, t: Segment, x: number, y: number): number {
  const d = directionOn(s, x, y);
  const e = directionOn(t, x, y);
  return Math.abs(d.x * e.y - d.y * e.x);
}

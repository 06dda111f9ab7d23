import { incidenceOf, type Network } from './network.ts';

/** Each edge e as two half-edges: 2e from its `from` to its `to`, 2e + 1 back. */
export interface HalfEdges {
  /** The half-edge that follows round the area on the left; −1 for edges that are gone. */
  readonly next: Int32Array;
  /** How many edges meet at each node. */
  readonly degree: Int32Array;
}

export const startOf = ({ edges }: Network, half: number): number =>
  half % 2 === 0 ? edges.from[half >> 1]! : edges.to[half >> 1]!;

/** Bulge of an edge run as the half-edge says. */
export const bulgeOf = ({ edges }: Network, half: number): number => {
  const bulge = edges.bulge[half >> 1]!;
  return half % 2 === 0 || bulge === 0 ? bulge : -bulge;
};

/**
 * Angle, seen from its start, of the place where a half-edge leaves a small circle of radius `reach` about it. Edges that leave
 * in one direction are told apart by how they curve. An arc of radius R has run asin(reach / 2R) to its side there.
 */
export function leavingAngle(network: Network, half: number, reach: number): number {
  const { nodes } = network;
  const a = startOf(network, half);
  const b = startOf(network, half ^ 1);
  const dx = nodes.x[b]! - nodes.x[a]!;
  const dy = nodes.y[b]! - nodes.y[a]!;
  const bulge = bulgeOf(network, half);
  const chord = Math.atan2(dy, dx);
  if (bulge === 0) return chord;
  // The tangent lies half the arc's angle, 2·atan(bulge), to the right of the chord.
  const radius = (Math.hypot(dx, dy) * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
  const tangent = chord - 2 * Math.atan(bulge);
  const angle = tangent + Math.sign(bulge) * Math.asin(Math.min(1, reach / (2 * radius)));
  return Math.atan2(Math.sin(angle), Math.cos(angle));
}

/** Links half-edges round their areas, so that a bounded area is run counter-clockwise. */
export function linkHalfEdges(network: Network, gone: Uint8Array): HalfEdges {
  const { nodes, edges } = network;
  const { start, list } = incidenceOf(network, gone);
  const next = new Int32Array(2 * edges.count).fill(-1);
  const degree = new Int32Array(nodes.count);
  /** The half-edge of e that leaves n. */
  const leaving = (e: number, n: number) => (edges.from[e]! === n ? 2 * e : 2 * e + 1);
  for (let n = 0; n < nodes.count; n++) {
    const count = start[n + 1]! - start[n]!;
    degree[n] = count;
    if (count === 0) continue;
    if (count === 2) {
      const p = leaving(list[start[n]!]!, n);
      const q = leaving(list[start[n]! + 1]!, n);
      next[p ^ 1] = q;
      next[q ^ 1] = p;
      continue;
    }
    const halves = Array.from(list.subarray(start[n]!, start[n + 1]!), (e) => leaving(e, n));
    const reach = Math.min(...halves.map((h) => chordOf(network, h))) / 2;
    const angles = new Map(halves.map((h) => [h, leavingAngle(network, h, reach)]));
    halves.sort((p, q) => angles.get(p)! - angles.get(q)!);
    // Whoever arrives turns as far left as there is: on to the edge before his own, counter-clockwise.
    halves.forEach((h, i) => {
      next[h ^ 1] = halves[i === 0 ? count - 1 : i - 1]!;
    });
  }
  return { next, degree };
}

function chordOf(network: Network, half: number): number {
  const { nodes } = network;
  const a = startOf(network, half);
  const b = startOf(network, half ^ 1);
  return Math.hypot(nodes.x[b]! - nodes.x[a]!, nodes.y[b]! - nodes.y[a]!);
}

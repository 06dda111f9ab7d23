import { bulgeOf, linkHalfEdges, startOf } from './half-edges.ts';
import type { Network } from './network.ts';

/** A closed way along half-edges. */
export interface Ring {
  readonly halves: readonly number[];
  /** Twice its signed area, counter-clockwise positive. */
  readonly twiceArea: number;
  /** 'alone': touches no other ring; 'cell': one of several areas that hang together; 'outline': round several cells. */
  readonly kind: 'alone' | 'cell' | 'outline';
}

/** Twice the area that half-edges go round: polygon of the chords and the arcs' circular segments, R²(θ − sin θ). */
function twiceAreaOf(network: Network, halves: readonly number[]): number {
  const { x, y } = network.nodes;
  const first = startOf(network, halves[0]!);
  let twice = 0;
  for (const h of halves) {
    const a = startOf(network, h);
    const b = startOf(network, h ^ 1);
    // From the ring's own first node, so that no digits are lost.
    const [ax, ay, bx, by] = [x[a]! - x[first]!, y[a]! - y[first]!, x[b]! - x[first]!, y[b]! - y[first]!];
    twice += ax * by - bx * ay;
    const bulge = bulgeOf(network, h);
    if (bulge === 0) continue;
    const angle = 4 * Math.atan(bulge);
    const radius = (Math.hypot(bx - ax, by - ay) * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
    twice += radius * radius * (angle - Math.sin(angle));
  }
  return twice;
}

/** A walk that passes a node more than once, taken apart into rings that do not. */
function simpleRings(network: Network, walk: readonly number[], mark: Int32Array): number[][] {
  const rings: number[][] = [];
  const path: number[] = [];
  for (const h of walk) {
    const n = startOf(network, h);
    if (mark[n]! >= 0) {
      const ring = path.splice(mark[n]!);
      for (const r of ring) mark[startOf(network, r)] = -1;
      rings.push(ring);
    }
    mark[n] = path.length;
    path.push(h);
  }
  for (const r of path) mark[startOf(network, r)] = -1;
  if (path.length > 0) rings.push(path);
  return rings;
}

/** The same for any two rings along the same edges, whichever way they run. */
const nameOf = (halves: readonly number[]): string =>
  halves
    .map((h) => h >> 1)
    .sort((a, b) => a - b)
    .join();

/**
 * Calls `visit` with each ring of a network without the edges that are gone. Where rings hang together each bounded area is a cell, and the line round
 * several of them an outline, unless it is the line of one cell.
 */
export function findRings(network: Network, gone: Uint8Array, visit: (ring: Ring) => void): void {
  const { next, degree } = linkHalfEdges(network, gone);
  const seen = new Uint8Array(next.length);
  const mark = new Int32Array(network.nodes.count).fill(-1);
  const outlines: Ring[] = [];
  const cells = new Set<string>();
  for (let first = 0; first < next.length; first++) {
    if (seen[first] || next[first]! < 0) continue;
    const walk: number[] = [];
    let branches = false;
    for (let h = first; !seen[h]; h = next[h]!) {
      seen[h] = 1;
      walk.push(h);
      if (degree[startOf(network, h)]! > 2) branches = true;
    }
    if (!branches) {
      for (const h of walk) seen[h ^ 1] = 1;
      visit({ halves: walk, twiceArea: twiceAreaOf(network, walk), kind: 'alone' });
      continue;
    }
    for (const halves of simpleRings(network, walk, mark)) {
      const twiceArea = twiceAreaOf(network, halves);
      if (twiceArea <= 0) {
        outlines.push({ halves, twiceArea, kind: 'outline' });
        continue;
      }
      cells.add(nameOf(halves));
      visit({ halves, twiceArea, kind: 'cell' });
    }
  }
  for (const outline of outlines) if (!cells.has(nameOf(outline.halves))) visit(outline);
}

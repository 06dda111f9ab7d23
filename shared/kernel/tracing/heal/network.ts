import { makeSegment, type Segment } from '../../contour/segments.ts';

/**
 * Lines and arcs as edges between nodes, drawing units about the drawing's local origin. No arc is over a half circle. Nodes are never taken out; some
 * may have no edge. Typed arrays, since there may be hundreds of thousands.
 */
export interface Network {
  readonly nodes: Nodes;
  readonly edges: Edges;
}

export interface Nodes {
  readonly count: number;
  readonly x: Float64Array;
  readonly y: Float64Array;
}

export interface Edges {
  readonly count: number;
  readonly from: Int32Array;
  readonly to: Int32Array;
  /** tan(arc angle / 4) from `from` to `to`, 0 for a line. */
  readonly bulge: Float64Array;
  /** Which segment of the found curves it came of. */
  readonly source: Uint32Array;
}

export const emptyEdges = (room: number): { -readonly [K in keyof Edges]: Edges[K] } => ({
  count: 0,
  from: new Int32Array(room),
  to: new Int32Array(room),
  bulge: new Float64Array(room),
  source: new Uint32Array(room),
});

/** The edges without those whose `gone` is set, in their order. */
export function edgesWithout(edges: Edges, gone: Uint8Array): Edges {
  let left = edges.count;
  for (const mark of gone) left -= mark;
  const kept = emptyEdges(left);
  for (let e = 0; e < edges.count; e++) {
    if (gone[e]) continue;
    const at = kept.count++;
    kept.from[at] = edges.from[e]!;
    kept.to[at] = edges.to[e]!;
    kept.bulge[at] = edges.bulge[e]!;
    kept.source[at] = edges.source[e]!;
  }
  return kept;
}

/** An edge as a segment of the contour kernel. */
export function edgeSegment({ nodes, edges }: Network, edge: number): Segment {
  const a = edges.from[edge]!;
  const b = edges.to[edge]!;
  return makeSegment({ x: nodes.x[a]!, y: nodes.y[a]! }, { x: nodes.x[b]!, y: nodes.y[b]! }, edges.bulge[edge]!);
}

/** Middle of an edge, on the arc where it is one: the chord's middle moved by the sagitta, bulge · c/2, to the right. */
export function edgeMiddle({ nodes, edges }: Network, edge: number): [x: number, y: number] {
  const a = edges.from[edge]!;
  const b = edges.to[edge]!;
  const half = edges.bulge[edge]! / 2;
  const dx = nodes.x[b]! - nodes.x[a]!;
  const dy = nodes.y[b]! - nodes.y[a]!;
  return [(nodes.x[a]! + nodes.x[b]!) / 2 + dy * half, (nodes.y[a]! + nodes.y[b]!) / 2 - dx * half];
}

/** For every node the edges that end there: those of node n are `list[start[n]] … list[start[n + 1] − 1]`. */
export interface Incidence {
  readonly start: Int32Array;
  readonly list: Int32Array;
}

/** Edges by node; those whose `gone` is set are passed over. */
export function incidenceOf({ nodes, edges }: Network, gone?: Uint8Array): Incidence {
  const start = new Int32Array(nodes.count + 1);
  for (let e = 0; e < edges.count; e++) {
    if (gone?.[e]) continue;
    start[edges.from[e]! + 1]!++;
    start[edges.to[e]! + 1]!++;
  }
  for (let n = 0; n < nodes.count; n++) start[n + 1]! += start[n]!;
  const fill = start.slice(0, nodes.count);
  const list = new Int32Array(start[nodes.count]!);
  for (let e = 0; e < edges.count; e++) {
    if (gone?.[e]) continue;
    list[fill[edges.from[e]!]!++] = e;
    list[fill[edges.to[e]!]!++] = e;
  }
  return { start, list };
}

export const otherEnd = (edges: Edges, edge: number, node: number): number =>
  edges.from[edge]! === node ? edges.to[edge]! : edges.from[edge]!;

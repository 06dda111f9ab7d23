import type { Point } from '../../contour/contour.ts';
import { intersectCarriers } from '../../contour/intersect-carriers.ts';
import { directionAt, type Segment } from '../../contour/segments.ts';
import type { BoxTree } from './box-tree.ts';
import { carrierOf } from './carrier-of.ts';
import { findMates, type Mate } from './find-mates.ts';
import { NEARLY_PARALLEL, type HealLimits } from './heal-tolerances.ts';
import { edgeSegment, incidenceOf, type Incidence, type Network } from './network.ts';
import { placeOnEdge } from './place-on-edge.ts';
import { moveNodes } from './move-nodes.ts';
import { splitEdges, type Cuts } from './split-edges.ts';

/** A place of a problem and its size, drawing units about the local origin. */
export interface SizedPlace extends Point {
  readonly size: number;
}

export interface ClosedGaps {
  readonly network: Network;
  readonly closed: readonly SizedPlace[];
  /** Ends with more than one place to go to, or whose only one has; `size` is the distance to the nearest. They stay open. */
  readonly ambiguous: readonly SizedPlace[];
  /** How many of the closed gaps were between an end and the inside of an edge. */
  readonly junctions: number;
  readonly splits: number;
  /** Edges of which nothing was left between the joined ends. */
  readonly slivers: number;
}

/** Where two segments meet when they are made longer or shorter at two ends by no more than the gap; else undefined. */
function meetingOf(s: Segment, t: Segment, p: Point, q: Point, gap: number): Point | undefined {
  if (s.kind === 'line' && t.kind === 'line') {
    const d = directionAt(s, 'start');
    const e = directionAt(t, 'start');
    if (Math.abs(d.x * e.y - d.y * e.x) < NEARLY_PARALLEL) return undefined;
  }
  let best: Point | undefined;
  let least = gap;
  for (const point of intersectCarriers(carrierOf(s), carrierOf(t))) {
    const away = Math.max(Math.hypot(point.x - p.x, point.y - p.y), Math.hypot(point.x - q.x, point.y - q.y));
    if (away > least) continue;
    least = away;
    best = point;
  }
  return best;
}

/** The place of an edge that is nearest to a point beside it. */
function footOn(s: Segment, p: Point): Point {
  if (s.kind === 'arc') {
    const away = Math.hypot(p.x - s.centre.x, p.y - s.centre.y);
    const k = s.radius / away;
    return { x: s.centre.x + (p.x - s.centre.x) * k, y: s.centre.y + (p.y - s.centre.y) * k };
  }
  const d = directionAt(s, 'start');
  const along = (p.x - s.a.x) * d.x + (p.y - s.a.y) * d.y;
  return { x: s.a.x + along * d.x, y: s.a.y + along * d.y };
}

/** Whether an end may be joined: it has one place to go to, and an open end there has no other place than this end. */
function isSure(end: number, mates: ReadonlyMap<number, readonly Mate[]>, isOpen: (node: number) => boolean): boolean {
  const own = mates.get(end)!;
  const [mate] = own;
  if (own.length !== 1 || mate === undefined) return false;
  if (mate.kind === 'edge' || !isOpen(mate.node)) return true;
  const theirs = mates.get(mate.node) ?? [];
  const [back] = theirs;
  return theirs.length === 1 && back?.kind === 'node' && back.node === end;
}

/**
 * Joins open ends to what lies within the gap: two ends where their lines or circles truly meet, when that is within the gap of
 * both, else halfway; an end beside an edge on that edge, which is cut there. What is ambiguous stays as it is.
 */
export function closeGaps(network: Network, tree: BoxTree, limits: HealLimits): ClosedGaps {
  const incidence = incidenceOf(network);
  const mates = findMates(network, incidence, tree, limits);
  const { nodes } = network;
  const becomes = new Map<number, number>();
  const places = new Map<number, Point>();
  const cuts: Cuts = { edge: [], share: [], node: [] };
  const closed: SizedPlace[] = [];
  const ambiguous: SizedPlace[] = [];
  let junctions = 0;
  const isOpen = (n: number) => incidence.start[n + 1]! - incidence.start[n]! === 1;
  const at = (n: number): Point => ({ x: nodes.x[n]!, y: nodes.y[n]! });

  for (const [end, own] of mates) {
    const [mate] = own;
    if (mate === undefined || becomes.has(end) || places.has(end)) continue;
    if (!isSure(end, mates, isOpen)) {
      ambiguous.push({ ...at(end), size: Math.min(...own.map((m) => m.away)) });
      continue;
    }
    let place: Point;
    if (mate.kind === 'edge') {
      place = junctionPlace(network, incidence, end, mate.edge, limits.gap);
      places.set(end, place);
      cuts.edge.push(mate.edge);
      cuts.share.push(placeOnEdge(network, mate.edge, place.x, place.y, limits.gap));
      cuts.node.push(end);
      junctions++;
    } else if (isOpen(mate.node)) {
      const [p, q] = [at(end), at(mate.node)];
      const [s, t] = [onlySegment(network, incidence, end), onlySegment(network, incidence, mate.node)];
      place = meetingOf(s, t, p, q, limits.gap) ?? { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 };
      places.set(end, place);
      becomes.set(mate.node, end);
    } else {
      place = at(mate.node);
      becomes.set(end, mate.node);
    }
    closed.push({ ...place, size: mate.away });
  }
  // Cut while the edges are where they were found; then their ends move.
  const split = splitEdges(network, cuts, limits.gap);
  const moved = moveNodes(split.network, becomes, places, limits.weld);
  return { network: moved.network, closed, ambiguous, junctions, splits: split.splits, slivers: moved.slivers };
}

const onlySegment = (network: Network, { start, list }: Incidence, end: number) =>
  edgeSegment(network, list[start[end]!]!);

/** Where an end meets the edge beside it: along its own line or circle when that is within the gap, else straight across. */
function junctionPlace(network: Network, incidence: Incidence, end: number, edge: number, gap: number): Point {
  const p = { x: network.nodes.x[end]!, y: network.nodes.y[end]! };
  const t = edgeSegment(network, edge);
  const point = meetingOf(onlySegment(network, incidence, end), t, p, p, gap);
  return point && placeOnEdge(network, edge, point.x, point.y, gap) >= 0 ? point : footOn(t, p);
}

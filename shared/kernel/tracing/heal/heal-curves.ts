import type { Contour } from '../../contour/contour.ts';
import type { Unit } from '../../units/unit.ts';
import type { FoundCurves } from '../found-drawing.ts';
import { makeBoxTree } from './box-tree.ts';
import { closeGaps, type SizedPlace } from './close-gaps.ts';
import { comparePairs, type Crossing } from './compare-pairs.ts';
import { contractCrumbs } from './contract-crumbs.ts';
import { contourOfHalves } from './contour-of-halves.ts';
import { dropCopies } from './drop-copies.ts';
import { edgesBoundingNothing } from './prune-edges.ts';
import { findChains } from './find-chains.ts';
import { findRings, type Ring } from './find-rings.ts';
import { healLimits, MOST_CROSSINGS, USUAL_GAP_MM, type HealLimits } from './heal-tolerances.ts';
import type { HealCounts, HealedDrawing, HealedLoop, HealProblem, HealProblemCode } from './healed-drawing.ts';
import { healProblem } from './list-problems.ts';
import { mergeRuns } from './merge-runs.ts';
import type { Network } from './network.ts';
import { recogniseArcs } from './recognise-arcs.ts';
import { ringLength } from './ring-length.ts';
import { splitEdges } from './split-edges.ts';
import { weldEnds } from './weld-ends.ts';

export interface HealOptions {
  readonly unit: Unit;
  /** Greatest gap that is closed, in millimetres whatever the unit; 0.05 when absent. */
  readonly gap?: number;
  /** Turns runs of many short lines into arcs where they lie within this of one, in millimetres. Not done when absent. */
  readonly arcsFromLines?: { readonly tolerance: number };
}

interface Joined {
  readonly network: Network;
  readonly crossings: readonly Crossing[];
  readonly closed: readonly SizedPlace[];
  readonly ambiguous: readonly SizedPlace[];
  readonly counts: Pick<HealCounts, 'slivers' | 'duplicates' | 'splits' | 'overlaps' | 'tJunctions'>;
}

/** Copies out, edges cut where others end on them, gaps closed. */
function joinEdges(welded: ReturnType<typeof weldEnds>, limits: HealLimits): Joined {
  const copies = dropCopies(welded.network, limits);
  let { network } = copies;
  let tree = makeBoxTree(network);
  let pairs = comparePairs(network, tree, limits);
  let splits = welded.halved - (copies.dropped - copies.sources);
  let slivers = welded.slivers;
  let overlaps = 0;
  const junctions = new Set(pairs.junctions);
  let trimmed: readonly SizedPlace[] = [];
  const cut = splitEdges(network, pairs.cuts, limits.gap);
  if (cut.splits > 0) {
    const whole = contractCrumbs(cut.network, cut.crumbs, limits);
    const pieces = dropCopies(whole.network, limits);
    for (const n of whole.corners) junctions.delete(n);
    trimmed = whole.moved;
    splits += cut.splits;
    slivers += whole.slivers;
    overlaps += pieces.dropped;
    network = pieces.network;
    tree = makeBoxTree(network);
  }
  const gaps = closeGaps(network, tree, limits);
  if (gaps.closed.length > 0) {
    const pieces = dropCopies(gaps.network, limits);
    splits += gaps.splits;
    slivers += gaps.slivers;
    overlaps += pieces.dropped;
    network = pieces.network;
  }
  // An edge that was cut, or whose ends have moved, may cross what it did not, or no longer.
  if (cut.splits > 0 || gaps.closed.length > 0) pairs = comparePairs(network, makeBoxTree(network), limits);
  return {
    network,
    // An end that runs a little over is one that could not be joined, and is listed as such.
    crossings: pairs.crossings.filter(
      ({ x, y }) => !gaps.ambiguous.some((end) => Math.hypot(end.x - x, end.y - y) <= limits.gap),
    ),
    closed: [...trimmed, ...gaps.closed],
    ambiguous: gaps.ambiguous,
    counts: {
      slivers,
      duplicates: copies.sources,
      splits,
      overlaps,
      tJunctions: junctions.size + gaps.junctions,
    },
  };
}

/** Sources of half-edges, rising, each once; or what `map` makes of them. */
function sourcesOf({ edges }: Network, halves: readonly number[], map?: Uint32Array): number[] {
  const all: number[] = [];
  for (const h of halves) all.push(map ? map[edges.source[h >> 1]!]! : edges.source[h >> 1]!);
  all.sort((a, b) => a - b);
  let count = 0;
  for (let i = 0; i < all.length; i++) if (i === 0 || all[i] !== all[count - 1]) all[count++] = all[i]!;
  all.length = count;
  return all;
}

/**
 * Heals somebody's lines and arcs into closed loops: slivers and copies out, edges cut where others end on them, gaps closed,
 * areas that share edges told apart. What was done, and what could not be, is counted and listed with its place. The empty
 * drawing gives no loops. Throws for a gap that is not between 0 and 1 mm, an arc tolerance not above 0, or numbers that are none.
 */
export function healCurves(curves: FoundCurves, options: HealOptions): HealedDrawing {
  const { unit, arcsFromLines } = options;
  const limits = healLimits(options.gap ?? USUAL_GAP_MM, unit);
  const welded = weldEnds(curves, limits);
  const { network, crossings, closed, ambiguous, counts } = joinEdges(welded, limits);
  const problems: HealProblem[] = [];
  const say = (code: HealProblemCode, x: number, y: number, size: number) =>
    problems.push(healProblem(code, x, y, size, unit));
  for (const { x, y, size } of closed) say('gap-closed', x, y, size);
  for (const { x, y, size } of ambiguous) say('gap-ambiguous', x, y, size);
  for (const { x, y } of crossings) say('crosses-itself', x, y, 0);
  if (crossings.length === MOST_CROSSINGS) say('crossings-not-listed', crossings[0]!.x, crossings[0]!.y, 0);

  let verticesMerged = 0;
  let arcsRecognised = 0;
  const tidy = (contour: Contour): Contour => {
    const merged = mergeRuns(contour, limits.weld);
    verticesMerged += contour.vertices.length - merged.vertices.length;
    if (!arcsFromLines) return merged;
    const found = recogniseArcs(merged, arcsFromLines.tolerance, unit);
    arcsRecognised += found.arcs;
    return found.contour;
  };

  const gone = edgesBoundingNothing(network);
  const crossed = new Set(crossings.flatMap(({ edges }) => edges));
  const bounds = new Uint8Array(network.edges.count);
  const loops: HealedLoop[] = [];
  findRings(network, gone, (ring) => {
    const width = Math.abs(ring.twiceArea) / ringLength(network, ring.halves);
    // Lobes of a loop that crosses itself may cancel out: it is no thin one.
    if (width <= limits.gap && !ring.halves.some((h) => crossed.has(h >> 1))) {
      const [x, y] = placeOf(network, ring);
      say('loop-too-thin', x, y, width);
      return;
    }
    for (const h of ring.halves) bounds[h >> 1] = 1;
    loops.push({
      contour: tidy(contourOfHalves(network, ring.halves, true, ring.twiceArea < 0)),
      kind: ring.kind,
      segments: sourcesOf(network, ring.halves),
      entities: sourcesOf(network, ring.halves, curves.entityOf),
    });
  });
  const inOpen = countMarked(gone);
  const open = (inOpen === 0 ? [] : findChains(network, gone)).map((halves) =>
    tidy(contourOfHalves(network, halves, false, false)),
  );
  for (const { vertices } of open) {
    const [a, b] = [vertices[0]!, vertices.at(-1)!];
    say('left-open', a.x, a.y, Math.hypot(b.x - a.x, b.y - a.y));
  }
  const inLoops = countMarked(bounds);
  const edges = network.edges.count;
  return {
    unit,
    origin: welded.origin,
    loops,
    open,
    problems,
    counts: {
      segments: curves.count,
      ...counts,
      edges,
      inLoops,
      inOpen,
      leftOut: edges - inLoops - inOpen,
      gapsClosed: closed.length,
      gapsAmbiguous: ambiguous.length,
      crossings: crossings.length,
      verticesMerged,
      arcsRecognised,
    },
  };
}

function countMarked(marks: Uint8Array): number {
  let count = 0;
  for (const mark of marks) count += mark;
  return count;
}

const placeOf = ({ nodes, edges }: Network, { halves }: Ring): [number, number] => {
  const n = edges.from[halves[0]! >> 1]!;
  return [nodes.x[n]!, nodes.y[n]!];
};

import type { FoundCurves } from '../found-drawing.ts';
import type { Point } from '../../contour/contour.ts';
import { FAR_AWAY, FLAT_SHARE, WELDS_A_CELL, type HealLimits } from './heal-tolerances.ts';
import { dropSlivers } from './drop-slivers.ts';
import { emptyEdges, type Network } from './network.ts';
import { makePointGrid } from './point-grid.ts';

export interface Welded {
  readonly network: Network;
  /** Place in the drawing that is 0, 0 of the network; whole numbers, 0, 0 unless the drawing lies far away. */
  readonly origin: Point;
  /** Segments left out because they are no longer than a sliver. */
  readonly slivers: number;
  /** Arcs over a half circle, each of which became two edges. */
  readonly halved: number;
}

/**
 * Where the network's 0, 0 lies. Far from the origin floats are coarse, and products of coordinates coarser still; whole numbers
 * of that size are subtracted without any rounding. Throws for a segment whose numbers are no numbers: readers refuse those.
 */
function originOf({ count, segments, entityOf }: FoundCurves): Point {
  if (segments.length < 5 * count || entityOf.length < count)
    throw new RangeError(`curves: got ${count} with ${segments.length} numbers and ${entityOf.length} entities`);
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (let at = 0; at < 5 * count; at += 5) {
    const ax = segments[at]!;
    const ay = segments[at + 1]!;
    const bx = segments[at + 2]!;
    const by = segments[at + 3]!;
    // A sum of finite numbers of any sensible size is finite, and any that is none makes it none.
    if (!Number.isFinite(ax + ay + bx + by + segments[at + 4]!))
      throw new RangeError(`segment ${at / 5}: got ${[...segments.subarray(at, at + 5)].join(', ')}`);
    minX = Math.min(minX, ax, bx);
    minY = Math.min(minY, ay, by);
    maxX = Math.max(maxX, ax, bx);
    maxY = Math.max(maxY, ay, by);
  }
  const far = Math.max(-minX, -minY, maxX, maxY);
  return far > FAR_AWAY ? { x: Math.floor(minX), y: Math.floor(minY) } : { x: 0, y: 0 };
}

/**
 * Segments with their ends welded into nodes: an end takes the node that lies within the weld, else makes one. Slivers are left
 * out.
 */
export function weldEnds(curves: FoundCurves, limits: HealLimits): Welded {
  const origin = originOf(curves);
  const { count, segments } = curves;
  let halved = 0;
  for (let i = 0; i < count; i++) if (Math.abs(segments[5 * i + 4]!) > 1) halved++;
  const x = new Float64Array(2 * count + halved);
  const y = new Float64Array(2 * count + halved);
  const grid = makePointGrid(x, y, limits.weld * WELDS_A_CELL);
  let nodes = 0;
  let found = -1;
  const take = (index: number) => {
    found = index;
    return true;
  };
  const nodeAt = (px: number, py: number): number => {
    found = -1;
    grid.eachNear(px, py, limits.weld, take);
    if (found >= 0) return found;
    x[nodes] = px;
    y[nodes] = py;
    grid.add(nodes);
    return nodes++;
  };
  const edges = emptyEdges(count + halved);
  const put = (from: number, to: number, bulge: number, source: number) => {
    edges.from[edges.count] = from;
    edges.to[edges.count] = to;
    const sagitta = (Math.hypot(x[to]! - x[from]!, y[to]! - y[from]!) * Math.abs(bulge)) / 2;
    edges.bulge[edges.count] = sagitta < limits.weld * FLAT_SHARE ? 0 : bulge;
    edges.source[edges.count] = source;
    edges.count++;
  };
  for (let i = 0; i < count; i++) {
    const ax = segments[5 * i]! - origin.x;
    const ay = segments[5 * i + 1]! - origin.y;
    const bx = segments[5 * i + 2]! - origin.x;
    const by = segments[5 * i + 3]! - origin.y;
    const bulge = segments[5 * i + 4]!;
    if (Math.abs(bulge) <= 1) {
      put(nodeAt(ax, ay), nodeAt(bx, by), bulge, i);
      continue;
    }
    const middle = nodeAt((ax + bx) / 2 + ((by - ay) * bulge) / 2, (ay + by) / 2 - ((bx - ax) * bulge) / 2);
    const half = Math.tan(Math.atan(bulge) / 2);
    put(nodeAt(ax, ay), middle, half, i);
    put(middle, nodeAt(bx, by), half, i);
  }
  return { ...dropSlivers({ nodes: { count: nodes, x, y }, edges }, limits.sliver), origin, halved };
}

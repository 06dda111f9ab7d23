import type { Network } from './network.ts';

const turn = 2 * Math.PI;

/**
 * Where along an edge a point lies, as a share of its length from 0 to 1; −1 when it is further than `reach` from the edge's
 * line or circle, or beside the edge's ends.
 */
export function placeOnEdge({ nodes, edges }: Network, edge: number, px: number, py: number, reach: number): number {
  const a = edges.from[edge]!;
  const b = edges.to[edge]!;
  const ax = nodes.x[a]!;
  const ay = nodes.y[a]!;
  const dx = nodes.x[b]! - ax;
  const dy = nodes.y[b]! - ay;
  const bulge = edges.bulge[edge]!;
  const square = dx * dx + dy * dy;
  if (bulge === 0) {
    const across = (px - ax) * dy - (py - ay) * dx;
    if (across * across > reach * reach * square) return -1;
    const along = ((px - ax) * dx + (py - ay) * dy) / square;
    return along >= 0 && along <= 1 ? along : -1;
  }
  // Centre and radius of an arc by its bulge: DXF Reference, group 42.
  const off = (1 - bulge * bulge) / (4 * bulge);
  const cx = ax + dx / 2 - dy * off;
  const cy = ay + dy / 2 + dx * off;
  const radius = (Math.sqrt(square) * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
  if (Math.abs(Math.hypot(px - cx, py - cy) - radius) > reach) return -1;
  const sweep = 4 * Math.atan(bulge);
  const gone = (Math.atan2(py - cy, px - cx) - Math.atan2(ay - cy, ax - cx)) * Math.sign(sweep);
  const share = (((gone % turn) + turn) % turn) / Math.abs(sweep);
  return share <= 1 ? share : -1;
}

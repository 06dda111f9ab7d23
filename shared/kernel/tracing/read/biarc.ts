/** Where the two arcs of a biarc meet, the direction there, and the bulges of both. */
export interface Biarc {
  readonly x: number;
  readonly y: number;
  readonly dx: number;
  readonly dy: number;
  readonly bulge0: number;
  readonly bulge1: number;
}

/**
 * Two arcs from one place and direction (a unit vector) to another that meet smoothly, with tangents of one length d at
 * both ends: |v − d(t0 + t1)| = 2d for the chord v (Bolton, Biarc curves, Computer-Aided Design 7, 1975). Null when there
 * are none.
 */
export function joinOfBiarc(
  x0: number,
  y0: number,
  t0x: number,
  t0y: number,
  x1: number,
  y1: number,
  t1x: number,
  t1y: number,
): Biarc | null {
  const vx = x1 - x0;
  const vy = y1 - y0;
  const sumX = t0x + t1x;
  const sumY = t0y + t1y;
  const square = vx * vx + vy * vy;
  const along = vx * sumX + vy * sumY;
  // d² (4 − |t0 + t1|²) + 2 d v·(t0 + t1) − v² = 0, solved for its root above 0 without cancellation.
  const lead = 4 - sumX * sumX - sumY * sumY;
  const root = along + Math.sqrt(Math.max(along * along + Math.max(lead, 0) * square, 0));
  const d = square / root;
  if (!(d > 0) || !Number.isFinite(d)) return null;
  const x = (x0 + x1 + d * (t0x - t1x)) / 2;
  const y = (y0 + y1 + d * (t0y - t1y)) / 2;
  const dx = vx - d * sumX;
  const dy = vy - d * sumY;
  const length = Math.hypot(dx, dy);
  if (!(length > 0)) return null;
  const bulge0 = bulgeBetween(t0x, t0y, x - x0, y - y0);
  // Seen from the other end, the other way round.
  const bulge1 = -bulgeBetween(-t1x, -t1y, x - x1, y - y1);
  return { x, y, dx: dx / length, dy: dy / length, bulge0, bulge1 };
}

/** Bulge of the arc that leaves along a unit tangent and spans a chord: tan of half the angle between them. */
function bulgeBetween(tx: number, ty: number, cx: number, cy: number): number {
  const cross = tx * cy - ty * cx;
  const dot = tx * cx + ty * cy;
  return cross / (Math.hypot(cx, cy) + dot);
}

import type { BeadedEdge } from '../particulars/particulars.ts';

/**
 * Depth of the entered bead section at y outward from the opening's edge: bead 0 ≤ y ≤ 2R at e + R − √(R² − (y − R)²),
 * quirk to 2R + q at e + R, then the face. Throws for y < 0, which is the opening.
 */
export function intendedDepth({ radius: R, drop: e, quirk: q }: BeadedEdge['bead'], y: number): number {
  if (y < 0) throw new RangeError(`y: got ${y}, takes 0 or more`);
  if (y <= 2 * R) return e + R - Math.sqrt(Math.max(0, R * R - (y - R) ** 2));
  return y <= 2 * R + q ? e + R : 0;
}

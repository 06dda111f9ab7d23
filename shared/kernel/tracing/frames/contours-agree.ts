import type { Contour } from '../../contour/contour.ts';
import { counterClockwise } from '../../contour/make-contour.ts';

/** Whether two closed contours have the same vertices and arcs in the same order within a length, wherever each begins and whichever way it runs. */
export function contoursAgree(a: Contour, b: Contour, within: number): boolean {
  const p = counterClockwise(a).vertices;
  const q = counterClockwise(b).vertices;
  if (p.length !== q.length) return false;
  return q.some((_, shift) =>
    p.every((v, i) => {
      const w = q[(i + shift) % q.length]!;
      const next = p[(i + 1) % p.length]!;
      // Two arcs on one chord are apart by the difference of their rises, bulge · chord / 2.
      const rise = (Math.abs(v.bulge - w.bulge) * Math.hypot(next.x - v.x, next.y - v.y)) / 2;
      return Math.abs(v.x - w.x) <= within && Math.abs(v.y - w.y) <= within && rise <= within;
    }),
  );
}

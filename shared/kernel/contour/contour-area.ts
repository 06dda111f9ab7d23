import type { Contour } from './contour.ts';

/**
 * Signed area of a closed contour, positive counter-clockwise: the polygon of the chords plus each arc's
 * circular segment, R²/2 · (θ − sin θ). Throws for an open contour.
 */
export function contourArea(contour: Contour): number {
  if (!contour.closed) throw new RangeError('an open contour has no area');
  const { vertices } = contour;
  let twice = 0;
  for (let i = 0; i < vertices.length; i++) {
    const a = vertices[i]!;
    const b = vertices[i + 1 === vertices.length ? 0 : i + 1]!;
    twice += a.x * b.y - b.x * a.y;
    if (a.bulge !== 0) {
      const chord = Math.hypot(b.x - a.x, b.y - a.y);
      const angle = 4 * Math.atan(a.bulge);
      const radius = (chord * (1 + a.bulge * a.bulge)) / (4 * Math.abs(a.bulge));
      twice += radius * radius * (angle - Math.sin(angle));
    }
  }
  return twice / 2;
}

import type { Cutter } from './cutter.ts';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/**
 * ρ(h): a cutter's radius at height h above its tip; 0 for h ≤ 0 but for a straight cutter, which is as wide at its tip.
 * Plane geometry of each profile; a tapered cutter's flank is tangent to its round nose at h = r(1 − sin a).
 */
export function radiusAtHeight(cutter: Cutter, h: number): number {
  switch (cutter.kind) {
    case 'straight':
      return h < 0 ? 0 : cutter.diameter / 2;
    case 'vee':
      return h <= 0 ? 0 : h * Math.tan(radians(cutter.includedAngle) / 2);
    case 'tapered': {
      if (h <= 0) return 0;
      const { tipRadius: r } = cutter;
      const a = radians(cutter.sideAngle);
      if (h < r * (1 - Math.sin(a))) return Math.sqrt(h * (2 * r - h));
      return r / Math.cos(a) + (h - r) * Math.tan(a);
    }
    case 'beading': {
      if (h < 0) return 0;
      const { profileRadius: R, tipFlat: t } = cutter;
      return h <= R ? t / 2 + R - Math.sqrt(R * R - h * h) : t / 2 + R;
    }
  }
}

import type { Cutter } from '../cutters/cutter.ts';
import { RadialDepth } from './radial-depth.ts';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** Stamps along a climb stand no further apart than this share of a cell. */
const STAMP_SHARE = 0.5;

/** A straight way of the tip: over `length` in the plane from depth `from` to depth `to`, both positive below the face. */
export interface Climb {
  readonly length: number;
  readonly from: number;
  readonly to: number;
}

/**
 * Depth that a cutter leaves at a place while its tip climbs (or sinks) along a straight way: the greatest of
 * tip(s) − h(distance to s) over the way. `along` is the place's foot on the way, `square` its squared distance from the
 * way's line in the plan.
 *
 * Closed forms: for a cylinder the end of the stretch that covers the place; for a cone and a round nose the stand where
 * h'(ρ) · (s − along)/ρ equals the way's slope, exact because h is convex there. A beading cutter's h is not: it is
 * stamped at steps of at most half a cell, so that the surface is nowhere further than step/2 · √(1 + slope²) from the true one.
 */
export type ClimbDepth = (way: Climb, along: number, square: number) => number;

export function climbDepth(cutter: Cutter, cell: number): ClimbDepth {
  const radial = new RadialDepth(cutter);
  const stand = (way: Climb, along: number, square: number, s: number): number => {
    const at = s < 0 ? 0 : s > way.length ? way.length : s;
    const tip = way.length === 0 ? Math.max(way.from, way.to) : way.from + ((way.to - way.from) * at) / way.length;
    return radial.at(square + (along - at) ** 2, tip);
  };
  const slope = (way: Climb) => (way.length === 0 ? 0 : (way.to - way.from) / way.length);
  switch (cutter.kind) {
    case 'straight': {
      const reach = (cutter.diameter / 2) ** 2;
      return (way, along, square) => {
        if (square > reach) return 0;
        const half = Math.sqrt(reach - square);
        const low = Math.max(0, along - half);
        const high = Math.min(way.length, along + half);
        if (low > high) return 0;
        const at = slope(way) > 0 ? high : low;
        return way.length === 0 ? Math.max(way.from, way.to) : way.from + slope(way) * at;
      };
    }
    case 'vee': {
      const flank = onFlank(1 / Math.tan(radians(cutter.includedAngle) / 2));
      return (way, along, square) => stand(way, along, square, flank(slope(way), along, square));
    }
    case 'tapered': {
      const r = cutter.tipRadius;
      const noseEnd = (r * Math.cos(radians(cutter.sideAngle))) ** 2;
      const flank = onFlank(1 / Math.tan(radians(cutter.sideAngle)));
      return (way, along, square) => {
        const m = slope(way);
        // On the nose, a sphere: (s − along)² = m² (r² − square)/(1 + m²).
        const ahead = (m * m * (r * r - square)) / (1 + m * m);
        const isOnNose = ahead >= 0 && square + ahead <= noseEnd;
        return stand(way, along, square, isOnNose ? along + Math.sign(m) * Math.sqrt(ahead) : flank(m, along, square));
      };
    }
    case 'beading':
      return (way, along, square) => {
        const steps = Math.max(1, Math.ceil(way.length / (STAMP_SHARE * cell)));
        let deepest = 0;
        for (let i = 0; i <= steps; i++)
          deepest = Math.max(deepest, stand(way, along, square, (way.length * i) / steps));
        return deepest;
      };
  }
}

/** Where a flank of steepness k touches best: (s − along)/ρ = m/k; a way steeper than the flank is deepest at its deep end. */
const onFlank = (k: number) => (m: number, along: number, square: number) => {
  if (Math.abs(m) >= k) return m > 0 ? Infinity : -Infinity;
  const lean = m / k;
  return along + (Math.sqrt(square) * lean) / Math.sqrt(1 - lean * lean);
};

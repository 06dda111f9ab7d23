import type { Cutter } from './cutter.ts';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** Whether a cutter narrows to a point, so that it can climb into a corner. */
export const canLift = (cutter: Cutter): boolean => cutter.kind === 'vee' || cutter.kind === 'tapered';

/**
 * h(ρ): the lowest height above the tip at which a cutter reaches radius ρ, the inverse of ρ(h); what the cutter leaves
 * standing at distance ρ from its axis begins there. Infinity where it never reaches that far. Throws for a negative radius.
 */
export function heightAtRadius(cutter: Cutter, radius: number): number {
  if (!(radius >= 0)) throw new RangeError(`radius: got ${radius}, takes 0 or more`);
  switch (cutter.kind) {
    case 'straight':
      return radius <= cutter.diameter / 2 ? 0 : Infinity;
    case 'vee':
      return radius / Math.tan(radians(cutter.includedAngle) / 2);
    case 'tapered': {
      const { tipRadius: r } = cutter;
      const a = radians(cutter.sideAngle);
      // Written without the difference r − √(r² − ρ²), which loses digits near the tip.
      if (radius < r * Math.cos(a)) return (radius * radius) / (r + Math.sqrt(r * r - radius * radius));
      return r + (radius - r / Math.cos(a)) / Math.tan(a);
    }
    case 'beading': {
      const { profileRadius: R, tipFlat: t } = cutter;
      const beyond = radius - t / 2;
      if (beyond <= 0) return 0;
      return beyond <= R ? Math.sqrt(beyond * (2 * R - beyond)) : Infinity;
    }
  }
}

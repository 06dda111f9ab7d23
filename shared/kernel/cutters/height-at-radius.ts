import type { Cutter } from './cutter.ts';

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** Whether a cutter narrows to a point, so that it can climb into a corner. */
export const canLift = (cutter: Cutter): boolean => cutter.kind === 'vee' || cutter.kind === 'tapered';

/** h(ρ): the height above the tip where a pointed or round-nosed cutter has radius ρ; the inverse of ρ(h). Throws for other kinds. */
export function heightAtRadius(cutter: Cutter, radius: number): number {
  if (!(radius >= 0)) throw new RangeError(`radius: got ${radius}, takes 0 or more`);
  switch (cutter.kind) {
    case 'vee':
      return radius / Math.tan(radians(cutter.includedAngle) / 2);
    case 'tapered': {
      const { tipRadius: r } = cutter;
      const a = radians(cutter.sideAngle);
      // Written without the difference r − √(r² − ρ²), which loses digits near the tip.
      if (radius < r * Math.cos(a)) return (radius * radius) / (r + Math.sqrt(r * r - radius * radius));
      return r + (radius - r / Math.cos(a)) / Math.tan(a);
    }
    default:
      throw new RangeError(`a ${cutter.kind} cutter has no height for a radius`);
  }
}

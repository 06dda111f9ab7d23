import type { Cutter } from '../cutters/cutter.ts';
import { heightAtRadius } from '../cutters/height-at-radius.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import { CLOSEST_STANDS } from '../tolerances.ts';

/** One stand of the cutter on its way up into a corner: its radius in the corner's plane, and its tip's height below that plane. */
export interface LiftSample {
  readonly radius: number;
  readonly height: number;
}

const SHARES = [0.25, 0.5, 0.75];

/** Greatest reach of the cutter beyond the corner's sides on the straight way between two samples. */
function overreach(cutter: Cutter, a: LiftSample, b: LiftSample): number {
  let most = 0;
  for (const s of SHARES) {
    const height = a.height + s * (b.height - a.height);
    most = Math.max(most, radiusAtHeight(cutter, height) - (a.radius + s * (b.radius - a.radius)));
  }
  return most;
}

/**
 * Stands from tip height `height` below the corner's plane up to 0, on h(ρ), dense enough that between two of them the cutter reaches at most `chord`
 * beyond the sides. A pointed cutter, and a tapered one's flank, need their ends only: there h(ρ) is straight.
 */
export function liftSamples(cutter: Cutter, height: number, chord: number): LiftSample[] {
  const at = (radius: number): LiftSample => ({ radius, height: heightAtRadius(cutter, radius) });
  const from = radiusAtHeight(cutter, height);
  const samples: LiftSample[] = [{ radius: from, height }];
  const divide = (a: LiftSample, b: LiftSample): void => {
    if (a.radius - b.radius > CLOSEST_STANDS && overreach(cutter, a, b) > chord) {
      const middle = at((a.radius + b.radius) / 2);
      divide(a, middle);
      divide(middle, b);
    } else samples.push(b);
  };
  const flankEnd = cutter.kind === 'tapered' ? cutter.tipRadius * Math.cos((cutter.sideAngle * Math.PI) / 180) : 0;
  const tip: LiftSample = { radius: 0, height: 0 };
  if (flankEnd > 0 && flankEnd < from) {
    const tangent = at(flankEnd);
    samples.push(tangent);
    divide(tangent, tip);
  } else divide(samples[0]!, tip);
  return samples;
}

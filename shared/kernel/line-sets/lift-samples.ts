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
 * Stands from tip height `height` below the corner's plane up to `end`, on h(ρ), dense enough that between two of them the
 * cutter reaches at most `chord` beyond the sides. A pointed cutter, and a tapered one's flank, need their ends only: there h(ρ) is straight.
 */
export function liftSamples(cutter: Cutter, height: number, chord: number, end = 0): LiftSample[] {
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
  const last: LiftSample = { radius: radiusAtHeight(cutter, end), height: end };
  if (flankEnd - last.radius > CLOSEST_STANDS && flankEnd < from) {
    const tangent = at(flankEnd);
    samples.push(tangent);
    divide(tangent, last);
  } else divide(samples[0]!, last);
  return samples;
}

import type { Point } from '../contour/contour.ts';
import type { Cutter } from '../cutters/cutter.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';

/** Chords that follow an arc of `radius` through `sweep` no further than `chord` from it: sagitta r(1 − cos(Δ/2)). */
function chordsFor(radius: number, sweep: number, chord: number): number {
  const step = chord >= 2 * radius ? Math.PI : 2 * Math.acos(1 - chord / radius);
  return Math.max(1, Math.ceil(sweep / step));
}

/** Heights at which an arc of the profile is sampled: equal steps of its angle, from `start` on; the last is `top`. */
function arcHeights(centre: number, radius: number, start: number, top: number, chord: number): number[] {
  const end = Math.asin(Math.min(1, (top - centre) / radius));
  const count = chordsFor(radius, end - start, chord);
  return Array.from({ length: count }, (_, i) =>
    i === count - 1 ? top : centre + radius * Math.sin(start + ((i + 1) / count) * (end - start)),
  );
}

/** Heights of the profile's vertices above the tip, after those on the tip itself. */
function heightsOf(cutter: Cutter, chord: number): number[] {
  const { fluteLength: flute } = cutter;
  switch (cutter.kind) {
    case 'straight':
    case 'vee':
      return [flute];
    case 'tapered': {
      const { tipRadius: r } = cutter;
      const tangent = r * (1 - Math.sin((cutter.sideAngle * Math.PI) / 180));
      const nose = arcHeights(r, r, -Math.PI / 2, Math.min(tangent, flute), chord);
      return flute > tangent ? [...nose, flute] : nose;
    }
    case 'beading': {
      const { profileRadius: R } = cutter;
      const cove = arcHeights(0, R, 0, Math.min(R, flute), chord);
      return flute > R ? [...cove, flute] : cove;
    }
  }
}

/**
 * One side of a cutter's shape, for a drawing: x its radius, y the height above the tip, from the axis at the tip out
 * and up to the end of the flute. Every vertex lies on the profile (radius-at-height.ts); arcs are chords no further
 * than `chord` from it, in the cutter's unit. Throws for a chord that is no length.
 */
export function cutterProfile(cutter: Cutter, chord: number): Point[] {
  if (!(chord > 0)) throw new RangeError(`chord tolerance: got ${chord}, takes a length above 0`);
  const flat = radiusAtHeight(cutter, 0);
  const tip =
    flat > 0
      ? [
          { x: 0, y: 0 },
          { x: flat, y: 0 },
        ]
      : [{ x: 0, y: 0 }];
  return [...tip, ...heightsOf(cutter, chord).map((y) => ({ x: radiusAtHeight(cutter, y), y }))];
}

/** Both sides of it as one closed outline, counter-clockwise: from the tip up the right and down the left, the tip's point once. */
export function cutterSilhouette(cutter: Cutter, chord: number): Point[] {
  const right = cutterProfile(cutter, chord);
  const left = right.slice(1).reverse();
  return [...right, ...left.map(({ x, y }) => ({ x: -x, y }))];
}

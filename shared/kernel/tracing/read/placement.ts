import { ROUND_PLACEMENT } from './read-tolerances.ts';

/** Where an entity's own coordinates lie in the drawing: x′ = a·x + c·y + e, y′ = b·x + d·y + f. */
export interface Placement {
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly d: number;
  readonly e: number;
  readonly f: number;
}

export const AS_DRAWN: Placement = { a: 1, b: 0, c: 0, d: 1, e: 0, f: 0 };

/** First `inner`, then `outer`. */
export const placeWithin = (outer: Placement, inner: Placement): Placement => ({
  a: outer.a * inner.a + outer.c * inner.b,
  b: outer.b * inner.a + outer.d * inner.b,
  c: outer.a * inner.c + outer.c * inner.d,
  d: outer.b * inner.c + outer.d * inner.d,
  e: outer.a * inner.e + outer.c * inner.f + outer.e,
  f: outer.b * inner.e + outer.d * inner.f + outer.f,
});

/**
 * From the coordinates of an entity whose extrusion is (0, 0, −1) to the drawing's: X runs backwards (DXF Reference,
 * Arbitrary axis algorithm: Ax = (0, 1, 0) × (0, 0, −1) = (−1, 0, 0), Ay = (0, 1, 0)).
 */
export const turnedOver = ({ a, b, c, d, e, f }: Placement): Placement => ({ a: -a, b: -b, c, d, e, f });

/** Whether circles stay circles: both axes as long, and square to each other. */
export function keepsCircles({ a, b, c, d }: Placement): boolean {
  const size = a * a + b * b + c * c + d * d;
  return (
    Math.abs(a * a + b * b - c * c - d * d) <= ROUND_PLACEMENT * size &&
    Math.abs(a * c + b * d) <= ROUND_PLACEMENT * size
  );
}

const QUADRANTS = [
  [1, 0],
  [0, 1],
  [-1, 0],
  [0, -1],
] as const;

/** Cosine and sine of an angle in degrees; exact at whole quadrants, where Math.cos(π / 2) is not. */
export function turn(degrees: number): readonly [cos: number, sin: number] {
  const quadrant = degrees / 90;
  if (Number.isInteger(quadrant)) return QUADRANTS[((quadrant % 4) + 4) % 4]!;
  const angle = ((degrees % 360) * Math.PI) / 180;
  return [Math.cos(angle), Math.sin(angle)];
}

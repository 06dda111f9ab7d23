import { describe, expect, test } from 'vitest';
import { followsArc } from '#shared/kernel/tracing/read/prove-arc.ts';

const on = (degrees: number, radius: number): number[] => [
  radius * Math.cos((degrees * Math.PI) / 180),
  radius * Math.sin((degrees * Math.PI) / 180),
  1,
];

/** The quarter circle from 1, 0 to 0, 1 with a curve of these control points. */
const follows = (tolerance: number, ...points: readonly number[][]): boolean =>
  followsArc(Float64Array.from(points.flat()), 1, 0, 0, 1, 0, 1, tolerance);

describe('When a curve is held against a quarter circle', () => {
  // The usual cubic for a quarter leaves the circle by 0.00027 at most (Goldapp, 1991); the proof, by coefficients, needs
  // some room above that.
  const kappa = (4 / 3) * (Math.SQRT2 - 1);
  const cubic = [
    [1, 0, 1],
    [1, kappa, 1],
    [kappa, 1, 1],
    [0, 1, 1],
  ];

  test('then one that keeps within the tolerance follows it, and one that does not, does not', () => {
    expect(follows(0.005, ...cubic)).toBe(true);
    expect(follows(0.0002, ...cubic)).toBe(false);
  });

  test('then the exact rational quarter follows it to rounding', () => {
    const w = Math.SQRT1_2;
    expect(follows(1e-14, [1, 0, 1], [w, w, w], [0, 1, 1])).toBe(true);
  });

  test('then one that keeps near the circle, but runs back along it first, does not', () => {
    // By evaluation it comes 0.47 below the arc’s beginning, and never further than 0.3 from the circle.
    const points = [on(0, 1), on(-50, 1.3), on(-20, 1.2), on(30, 1.1), on(90, 1)];
    const at = (t: number) =>
      points.reduce(
        ([x, y], [px, py], i) => {
          const share = [1, 4, 6, 4, 1][i]! * t ** i * (1 - t) ** (4 - i);
          return [x + share * px!, y + share * py!] as const;
        },
        [0, 0] as readonly [number, number],
      );
    const places = Array.from({ length: 201 }, (_, i) => at(i / 200));
    expect(Math.max(...places.map(([x, y]) => Math.abs(Math.hypot(x, y) - 1)))).toBeLessThan(0.3);
    expect(Math.min(...places.map(([, y]) => y))).toBeLessThan(-0.45);
    expect(follows(0.3, ...points)).toBe(false);
  });
});

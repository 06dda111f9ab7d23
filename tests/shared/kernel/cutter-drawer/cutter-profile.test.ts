import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import { cutterProfile, cutterSilhouette } from '#shared/kernel/cutter-drawer/cutter-profile.ts';
import { drawingChord } from '#shared/kernel/tolerances.ts';
import { arbitraryCutter } from './arbitrary-cutter.ts';

const sized = arbitraryCutter.map((cutter): [Cutter, number] => [
  cutter,
  Math.max(
    cutter.fluteLength,
    'tipRadius' in cutter ? cutter.tipRadius : 0,
    'profileRadius' in cutter ? cutter.profileRadius : 0,
  ) / 500,
]);

describe('When a cutter’s shape is drawn from its numbers', () => {
  test('then a straight one is a rectangle and a V runs to a point', () => {
    expect(cutterProfile({ kind: 'straight', diameter: 0.5, fluteLength: 1 }, 0.001)).toEqual([
      { x: 0, y: 0 },
      { x: 0.25, y: 0 },
      { x: 0.25, y: 1 },
    ]);
    const [tip, edge] = cutterProfile({ kind: 'vee', includedAngle: 90, fluteLength: 10 }, 0.02);
    expect(tip).toEqual({ x: 0, y: 0 });
    expect(edge!.x).toBeCloseTo(10, 9);
  });

  test('then a tapered one has its nose’s end, 0.062479 at 0.060864, among the points', () => {
    // The worked example of the specification: tip radius 1/16, 1.5° a side.
    const points = cutterProfile(
      { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 },
      drawingChord('in'),
    );
    const end = points.at(-2)!;
    expect(end.x).toBeCloseTo(0.062479, 6);
    expect(end.y).toBeCloseTo(0.060864, 6);
    expect(points.at(-1)!.y).toBe(1.25);
  });

  test('then a beading one goes from its tip flat along a quarter circle and straight up', () => {
    const points = cutterProfile(
      { kind: 'beading', profileRadius: 3, tipFlat: 1, fluteLength: 12 },
      drawingChord('mm'),
    );
    expect(points.slice(0, 2)).toEqual([
      { x: 0, y: 0 },
      { x: 0.5, y: 0 },
    ]);
    expect(points.slice(-2)).toEqual([
      { x: 3.5, y: 3 },
      { x: 3.5, y: 12 },
    ]);
    // The quarter circle’s centre lies on the tip’s height, at t/2 + R.
    for (const { x, y } of points.slice(1, -1)) expect(Math.hypot(x - 3.5, y)).toBeCloseTo(3, 9);
    expect(points.length).toBeGreaterThan(5);
  });

  test('then every point lies on the profile and heights only rise up to the flute’s end', () => {
    fc.assert(
      fc.property(sized, ([cutter, chord]) => {
        const points = cutterProfile(cutter, chord);
        expect(points[0]).toEqual({ x: 0, y: 0 });
        expect(points.at(-1)!.y).toBe(cutter.fluteLength);
        points.slice(1).forEach(({ x, y }, i) => {
          expect(x).toBe(radiusAtHeight(cutter, y));
          expect(y).toBeGreaterThanOrEqual(points[i]!.y);
        });
      }),
    );
  });

  test('then no chord is further from the profile than the tolerance', () => {
    fc.assert(
      fc.property(sized, ([cutter, chord]) => {
        const points = cutterProfile(cutter, chord);
        for (let i = 1; i < points.length; i++) {
          const [a, b] = [points[i - 1]!, points[i]!];
          const long = Math.hypot(b.x - a.x, b.y - a.y);
          if (b.y === a.y || long === 0) continue;
          for (let k = 1; k < 20; k++) {
            const y = a.y + ((b.y - a.y) * k) / 20;
            const x = radiusAtHeight(cutter, y);
            const off = Math.abs((x - a.x) * (b.y - a.y) - (y - a.y) * (b.x - a.x)) / long;
            expect(off).toBeLessThanOrEqual(chord * (1 + 1e-6));
          }
        }
      }),
    );
  });

  test('then both sides make one closed outline that mirrors about the axis and encloses its area once', () => {
    fc.assert(
      fc.property(sized, ([cutter, chord]) => {
        const outline = cutterSilhouette(cutter, chord);
        for (const { x, y } of outline) expect(outline.some((p) => p.x === -x && p.y === y) || x === 0).toBe(true);
        const twice = outline.reduce(
          (sum, p, i) => sum + p.x * outline[(i + 1) % outline.length]!.y - outline[(i + 1) % outline.length]!.x * p.y,
          0,
        );
        expect(twice).toBeGreaterThan(0);
        const profile = cutterProfile(cutter, chord);
        const half = profile
          .slice(1)
          .reduce((sum, p, i) => sum + ((p.x + profile[i]!.x) / 2) * (p.y - profile[i]!.y), 0);
        expect(twice / 2 / (2 * half)).toBeCloseTo(1, 9);
      }),
    );
  });

  test('then a chord that is no length is thrown out', () => {
    expect(() => cutterProfile({ kind: 'straight', diameter: 1, fluteLength: 1 }, 0)).toThrow('chord tolerance: got 0');
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { BeadingCutter, StraightCutter, TaperedCutter, VeeCutter } from '#shared/kernel/cutters/cutter.ts';
import { heightAtRadius } from '#shared/kernel/cutters/height-at-radius.ts';
import { passDepths } from '#shared/kernel/cutters/pass-depths.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import { throughDepth } from '#shared/kernel/cutters/tip-depth.ts';

const tan = (degrees: number) => Math.tan((degrees * Math.PI) / 180);
const cos = (degrees: number) => Math.cos((degrees * Math.PI) / 180);
const sin = (degrees: number) => Math.sin((degrees * Math.PI) / 180);

const straight: StraightCutter = { kind: 'straight', diameter: 0.375, fluteLength: 1.25 };
const vee: VeeCutter = { kind: 'vee', includedAngle: 60, fluteLength: 1 };
const tapered: TaperedCutter = { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 };
const beading: BeadingCutter = { kind: 'beading', profileRadius: 0.09375, tipFlat: 0.03125, fluteLength: 0.5 };

describe('When a cutter’s radius is asked for at a height above its tip', () => {
  test('then a straight one has half its diameter everywhere', () => {
    expect([0, 0.1, 1].map((h) => radiusAtHeight(straight, h))).toEqual([0.1875, 0.1875, 0.1875]);
  });

  test('then a V-cutter of 60° has h·tan 30°', () => {
    expect(radiusAtHeight(vee, 0.3)).toBeCloseTo(0.3 * tan(30), 12);
    expect(radiusAtHeight(vee, 0)).toBe(0);
  });

  test('then the nose of a tapered one is a circle of the tip radius about r above the tip', () => {
    for (const h of [0.01, 0.03, 0.06]) {
      expect(Math.hypot(radiusAtHeight(tapered, h), h - 0.0625)).toBeCloseTo(0.0625, 12);
    }
  });

  test('then its flank leans by the side angle and touches the nose’s circle', () => {
    const [low, high] = [radiusAtHeight(tapered, 0.2), radiusAtHeight(tapered, 1)];
    expect((high - low) / 0.8).toBeCloseTo(tan(1.5), 12);
    // Distance of the nose's centre from the flank's line is the tip radius: the line is tangent.
    expect((low + (0.0625 - 0.2) * tan(1.5)) * cos(1.5)).toBeCloseTo(0.0625, 12);
  });

  test('then there is no step where nose and flank meet', () => {
    const meet = 0.0625 * (1 - sin(1.5));
    expect(radiusAtHeight(tapered, meet + 1e-10)).toBeCloseTo(radiusAtHeight(tapered, meet - 1e-10), 8);
    expect(radiusAtHeight(tapered, meet)).toBeCloseTo(0.0625 * cos(1.5), 10);
  });

  test('then a beading one has its tip flat at the tip, and flat and radius above the profile', () => {
    expect(radiusAtHeight(beading, 0)).toBeCloseTo(0.015625, 12);
    expect(radiusAtHeight(beading, 0.09375)).toBeCloseTo(0.015625 + 0.09375, 12);
    expect(radiusAtHeight(beading, 0.4)).toBeCloseTo(0.015625 + 0.09375, 12);
    // The profile is a quarter circle of radius R about (t/2 + R, 0).
    expect(Math.hypot(radiusAtHeight(beading, 0.05) - 0.109375, 0.05)).toBeCloseTo(0.09375, 12);
  });
});

describe('When the height is asked for at a radius', () => {
  const anyTapered = fc.record({
    kind: fc.constant('tapered' as const),
    tipRadius: fc.double({ min: 0.01, max: 0.5, noNaN: true }),
    sideAngle: fc.double({ min: 0.5, max: 30, noNaN: true }),
    fluteLength: fc.constant(2),
  });
  const anyVee = fc.record({
    kind: fc.constant('vee' as const),
    includedAngle: fc.double({ min: 10, max: 150, noNaN: true }),
    fluteLength: fc.constant(2),
  });

  test('then it is the inverse of the radius at a height', () => {
    fc.assert(
      fc.property(fc.oneof(anyTapered, anyVee), fc.double({ min: 1e-6, max: 2, noNaN: true }), (cutter, h) => {
        expect(Math.abs(heightAtRadius(cutter, radiusAtHeight(cutter, h)) - h)).toBeLessThan(1e-9);
      }),
      { numRuns: 1000 },
    );
  });

  test('then at radius 0 it is the tip', () => {
    expect(heightAtRadius(tapered, 0)).toBe(0);
    expect(heightAtRadius(vee, 0)).toBe(0);
  });

  test('of a straight cutter, then it is its tip within its radius, and beyond that none', () => {
    expect(heightAtRadius(straight, straight.diameter / 2)).toBe(0);
    expect(heightAtRadius(straight, straight.diameter / 2 + 1e-9)).toBe(Infinity);
  });

  test('at a radius below 0, then that throws', () => {
    expect(() => heightAtRadius(vee, -0.1)).toThrow(/-0\.1/);
  });
});

describe('When a cut goes through the board', () => {
  // Common practice, no source: the round nose passes the far face, a straight cutter goes into the spoilboard.
  test('then a tapered cutter’s tip is its tip radius below it, a straight one’s in the spoilboard', () => {
    expect(throughDepth(tapered, 0.75, 0.02)).toBeCloseTo(0.8125, 12);
    expect(throughDepth(straight, 0.75, 0.02)).toBeCloseTo(0.77, 12);
  });
});

describe('When a depth is cut in passes', () => {
  test.each<[number, number | undefined, number[]]>([
    [0.8125, 0.5, [0.5, 0.8125]],
    [0.75, 0.25, [0.25, 0.5, 0.75]],
    [0.25, 0.25, [0.25]],
    [0.25, 0.5, [0.25]],
    [0.25, undefined, [0.25]],
    [0, 0.5, []],
    // 0.1 + 0.1 + 0.1 is more than 0.3 by rounding: still three steps.
    [0.3, 0.1, [0.1, 0.2, 0.3]],
  ])('%d by at most %s, then they are %j', (depth, most, wanted) => {
    const passes = passDepths(depth, most);
    expect(passes).toHaveLength(wanted.length);
    passes.forEach((pass, i) => expect(pass).toBeCloseTo(wanted[i]!, 12));
  });

  test('then they rise, none takes more than it may, and the last is the depth itself', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 50, noNaN: true }),
        fc.double({ min: 0.05, max: 20, noNaN: true }),
        (depth, most) => {
          const passes = passDepths(depth, most);
          expect(passes.at(-1)).toBe(depth);
          const steps = passes.map((pass, i) => pass - (passes[i - 1] ?? 0));
          expect(Math.max(...steps)).toBeLessThanOrEqual(most + 1e-9);
          expect(Math.min(...steps)).toBeGreaterThan(0);
          expect(passes.length).toBe(Math.ceil(depth / most - 1e-9));
        },
      ),
    );
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import { RadialDepth } from '#shared/kernel/height-field/radial-depth.ts';

const size = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const cutters: fc.Arbitrary<Cutter> = fc.oneof(
  fc.record({ kind: fc.constant('straight' as const), diameter: size(0.05, 1), fluteLength: fc.constant(2) }),
  fc.record({ kind: fc.constant('vee' as const), includedAngle: size(10, 150), fluteLength: fc.constant(2) }),
  fc.record({
    kind: fc.constant('tapered' as const),
    tipRadius: size(0.01, 0.2),
    sideAngle: size(0.5, 20),
    fluteLength: fc.constant(2),
  }),
  fc.record({
    kind: fc.constant('beading' as const),
    profileRadius: size(0.03, 0.3),
    tipFlat: size(0.01, 0.2),
    fluteLength: fc.constant(2),
  }),
);

describe('When the depth that a cutter leaves is asked for at a distance from its axis', () => {
  test('then a cutter of any kind is as wide there, at the height of that depth, as its shape says', () => {
    // Against ρ(h) of the cutters' own table, which the kernel tests hold against plane geometry.
    fc.assert(
      fc.property(cutters, size(0.02, 1), size(0.001, 0.999), (cutter, tip, share) => {
        const height = share * tip;
        if (cutter.kind === 'straight' || (cutter.kind === 'beading' && height > cutter.profileRadius)) return;
        const radius = radiusAtHeight(cutter, height);
        expect(new RadialDepth(cutter).at(radius * radius, tip)).toBeCloseTo(tip - height, 9);
      }),
    );
  });

  test('then a straight one leaves its full depth up to its radius and nothing beyond', () => {
    const straight = new RadialDepth({ kind: 'straight', diameter: 0.375, fluteLength: 1 });
    expect(straight.at(0.1875 ** 2, 0.25)).toBe(0.25);
    expect(straight.at(0.18751 ** 2, 0.25)).toBe(0);
  });

  test('then a beading one leaves nothing beyond its profile', () => {
    const beading = new RadialDepth({ kind: 'beading', profileRadius: 3 / 32, tipFlat: 1 / 32, fluteLength: 1 });
    expect(beading.at(0, 0.2)).toBe(0.2);
    expect(beading.at((1 / 64) ** 2, 0.2)).toBe(0.2);
    expect(beading.at((1 / 64 + 3 / 32 + 0.0001) ** 2, 0.2)).toBe(0);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Point3 } from '#shared/kernel/contour/contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { heightAtRadius } from '#shared/kernel/cutters/height-at-radius.ts';
import { standsAlong } from '../../../builders/sweep.ts';
import { faceWith, layer, path, samples, sweep, Worst } from './fields.ts';

const place = fc.record({
  x: fc.double({ min: -0.3, max: 0.3, noNaN: true }),
  y: fc.double({ min: -0.3, max: 0.3, noNaN: true }),
  z: fc.double({ min: -0.5, max: -0.01, noNaN: true }),
});
const region = { minX: -0.6, minY: -0.6, maxX: 0.6, maxY: 0.6 };
const CELL = 0.05;

/** Independent of any closed form: the cutter's own shape stamped at every stand. */
const stamped = (stands: readonly Point3[], cutter: Cutter, x: number, y: number): number =>
  stands.reduce((most, s) => Math.max(most, -s.z - heightAtRadius(cutter, Math.hypot(x - s.x, y - s.y))), 0);

const exact: [string, Cutter][] = [
  ['V', { kind: 'vee', includedAngle: 30, fluteLength: 1 }],
  ['blunt V', { kind: 'vee', includedAngle: 120, fluteLength: 1 }],
  ['tapered', { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1 }],
  ['wide tapered', { kind: 'tapered', tipRadius: 0.1, sideAngle: 12, fluteLength: 1 }],
  ['straight', { kind: 'straight', diameter: 0.2, fluteLength: 1 }],
];

describe.each(exact)('When a %s cutter climbs', (_, cutter) => {
  test('then the surface it leaves is the envelope of all its stands', () => {
    const step = 0.004;
    const [above, below] = [new Worst(), new Worst()];
    fc.assert(
      fc.property(place, place, (a, b) => {
        const length = Math.hypot(b.x - a.x, b.y - a.y, b.z - a.z);
        const [ux, uy] = [(b.x - a.x) / length, (b.y - a.y) / length];
        const stands = standsAlong([a, b], step);
        for (const { x, y, depth } of samples(
          sweep(faceWith(layer(cutter, 0.5, { climbs: [[a, b]] })), region, CELL),
        )) {
          const brute = stamped(stands, cutter, x, y);
          above.take(brute - depth, () => `${x}, ${y}: got ${depth}, a stand goes to ${brute}`);
          // The best stand is at most half a step from one that was stamped: that one, moved there, goes as deep but for the climb.
          const moved = [-1, -0.5, 0, 0.5, 1].map((share) =>
            stamped(stands, cutter, x + share * step * ux, y + share * step * uy),
          );
          below.take(
            depth - Math.max(...moved) - step,
            () => `${x}, ${y}: got ${depth}, stands near by go to ${Math.max(...moved)}`,
          );
        }
      }),
      { numRuns: 12, seed: 7 },
    );
    expect(above.count).toBeGreaterThan(1000);
    expect(above.error, above.where).toBeLessThan(1e-6);
    expect(below.error, below.where).toBeLessThan(1e-6);
  });
});

describe('When a beading cutter climbs, which is stamped', () => {
  const cutter: Cutter = { kind: 'beading', profileRadius: 0.09, tipFlat: 0.03, fluteLength: 1 };

  test('then no place of the true surface is further than half a step along the way from the stamped one', () => {
    const [above, below] = [new Worst(), new Worst()];
    fc.assert(
      fc.property(place, place, (a, b) => {
        const level = Math.hypot(b.x - a.x, b.y - a.y);
        fc.pre(level > 0.02);
        const [ux, uy, slope] = [(b.x - a.x) / level, (b.y - a.y) / level, Math.abs(b.z - a.z) / level];
        const half = level / Math.ceil(level / (0.5 * CELL)) / 2;
        const stands = standsAlong([a, b], half / 20);
        for (const { x, y, depth } of samples(
          sweep(faceWith(layer(cutter, 0.5, { climbs: [[a, b]] })), region, CELL),
        )) {
          above.take(
            depth -
              Math.max(...[-0.1, 0, 0.1].map((d) => stamped(stands, cutter, x + d * half * ux, y + d * half * uy))) -
              half / 20,
            () => `${x}, ${y}: got ${depth}`,
          );
          // The true surface moved by up to half a step, either way, has a place at or above the stamped one.
          const around = Array.from({ length: 21 }, (_, i) => half * (i / 10 - 1)).map((d) =>
            stamped(stands, cutter, x + d * ux, y + d * uy),
          );
          below.take(
            Math.min(...around) - slope * half - depth,
            () => `${x}, ${y}: got ${depth}, least near by ${Math.min(...around)}`,
          );
        }
      }),
      { numRuns: 5, seed: 7 },
    );
    expect(above.count).toBeGreaterThan(1000);
    expect(above.error, above.where).toBeLessThan(1e-3);
    expect(below.error, below.where).toBeLessThan(1e-3);
  });
});

describe('When a cutter goes straight down', () => {
  test('then it leaves its own shape at the deeper end', () => {
    const vee: Cutter = { kind: 'vee', includedAngle: 90, fluteLength: 1 };
    for (const { x, y, depth } of samples(
      sweep(faceWith(layer(vee, 0.4, { climbs: [path([0, 0, -0.1], [0, 0, -0.4])] })), region, CELL),
    ))
      expect(depth).toBeCloseTo(Math.max(0, 0.4 - Math.hypot(x, y)), 6);
  });
});

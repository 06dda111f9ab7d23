import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour, Point } from '#shared/kernel/contour/contour.ts';
import { findCrossing } from '#shared/kernel/contour/find-crossing.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { reverseContour } from '#shared/kernel/contour/make-contour.ts';
import type { StraightCutter } from '#shared/kernel/cutters/cutter.ts';
import type { LayerLines } from '#shared/kernel/height-field/face-cut.ts';
import { arbitraryOutline } from '../../../builders/arbitrary-contour.ts';
import { signedDistance } from '../../../builders/sweep.ts';
import { closedLine, deepest, depthAt, faceWith, layer, openLine, samples, sweep, Worst } from './fields.ts';

const cutter: StraightCutter = { kind: 'straight', diameter: 0.375, fluteLength: 1 };
const r = 0.1875;
const beside = (side: LayerLines['side'], contours: Contour[], pocket = false) =>
  layer(cutter, 0.25, { side, beside: r, pocket, contours });

/** Chords of arcs, and how near to a border nothing is said about a sample. */
const CHORD = 1e-3;

/** Stands of a round cutter on a fine lattice, for brute force. */
function lattice(step: number, half: number): Point[] {
  const n = Math.ceil(half / step);
  return Array.from({ length: (2 * n + 1) ** 2 }, (_, k) => ({
    x: ((k % (2 * n + 1)) - n) * step,
    y: (Math.floor(k / (2 * n + 1)) - n) * step,
  }));
}

describe('When a pocket is cleared inside lines', () => {
  test('then all that a round cutter can reach is cleared, and nothing else: random outlines against brute force', () => {
    const radius = 0.5;
    const step = 0.12;
    const stands = lattice(step, 7.5);
    const worst = new Worst();
    let cleared = 0;
    fc.assert(
      fc.property(arbitraryOutline, fc.boolean(), (outline, reversed) => {
        fc.pre(findCrossing(outline) === undefined);
        const polygon = flattenContour(outline, CHORD);
        const lines = [reversed ? reverseContour(outline) : outline];
        const field = sweep(
          faceWith(
            layer({ ...cutter, diameter: 2 * radius }, 0.25, {
              side: 'inside',
              beside: radius,
              pocket: true,
              contours: lines,
            }),
          ),
          { minX: -7, minY: -7, maxX: 7, maxY: 7 },
          0.55,
        );
        // A cutter may stand where the lines are at least its radius away.
        const allowed = stands
          .map((p) => ({ ...p, clear: -signedDistance(polygon, p) - radius }))
          .filter((p) => p.clear >= -step);
        for (const { x, y, depth } of samples(field)) {
          const near = allowed.filter((p) => Math.abs(p.x - x) <= radius + step && Math.abs(p.y - y) <= radius + step);
          const sure = near.some((p) => p.clear >= CHORD && Math.hypot(p.x - x, p.y - y) <= radius - CHORD);
          // A stand between those of the lattice lies within step/√2 of one of them.
          const possible = near.some((p) => Math.hypot(p.x - x, p.y - y) <= radius + step * Math.SQRT1_2);
          worst.take(sure && depth !== 0.25 ? 1 : 0, () => `${x}, ${y} is within reach and left`);
          worst.take(!possible && depth !== 0 ? 1 : 0, () => `${x}, ${y} is out of reach and cleared`);
          if (depth > 0) cleared++;
        }
      }),
      { numRuns: 20, seed: 3 },
    );
    expect(cleared).toBeGreaterThan(500);
    expect(worst.error, worst.where).toBe(0);
  });

  test('then a square corner keeps r(√2 − 1) on its diagonal', () => {
    const field = sweep(
      faceWith(beside('inside', [closedLine([0, 0], [2, 0], [2, 1], [0, 1])], true)),
      { minX: 0, minY: 0, maxX: 0.2, maxY: 0.2 },
      0.001,
    );
    let first = Infinity;
    for (let d = 0.0005; d < 0.2; d += 0.001) if (depthAt(field, d, d) > 0) first = Math.min(first, d * Math.SQRT2);
    // Plane geometry of a circle tangent to both sides.
    expect(Math.abs(first - r * (Math.SQRT2 - 1))).toBeLessThan(0.001 * Math.SQRT2);
  });

  test('then an island is left standing, whichever way it is drawn', () => {
    const outer = closedLine([0, 0], [3, 0], [3, 3], [0, 3]);
    const island = closedLine([1, 1], [2, 1], [2, 2], [1, 2]);
    for (const drawn of [island, reverseContour(island)]) {
      const field = sweep(
        faceWith(beside('inside', [outer, drawn], true)),
        { minX: 0, minY: 0, maxX: 3, maxY: 3 },
        0.02,
      );
      expect(depthAt(field, 1.5, 1.5)).toBe(0);
      expect(depthAt(field, 1.03, 1.03)).toBe(0);
      expect(depthAt(field, 0.95, 1.5)).toBe(0.25);
      expect(depthAt(field, 0.5, 0.5)).toBe(0.25);
      // Its corners stay sharp: the cutter rolls about them.
      expect(depthAt(field, 0.97, 0.97)).toBe(0.25);
    }
  });

  test('then a slot as wide as the cutter is cleared, and a narrower one is not entered', () => {
    const slot = (width: number) =>
      sweep(
        faceWith(beside('inside', [closedLine([0, 0], [3, 0], [3, width], [0, width])], true)),
        { minX: 0, minY: 0, maxX: 3, maxY: 0.375 },
        0.01,
      );
    expect(depthAt(slot(0.375), 1.5, 0.19)).toBe(0.25);
    expect(deepest(slot(0.37))).toBe(0);
  });
});

describe('When a cutter runs outside a closed line', () => {
  const notched = closedLine([0, 0], [1, 0], [1, 1], [2, 1], [2, 0], [3, 0], [3, 3], [0, 3]);
  const field = sweep(faceWith(beside('outside', [notched])), { minX: -0.5, minY: -0.5, maxX: 3.5, maxY: 3.5 }, 0.01);
  const polygon = notched.vertices;

  test('then nothing inside the line is touched, and outside it a way of the cutter’s width is cut', () => {
    const worst = new Worst();
    for (const { x, y, depth } of samples(field)) {
      const away = signedDistance(polygon, { x, y });
      if (away < -1e-9) worst.take(depth, () => `${x}, ${y} is inside and cut`);
      // Beside the notch's own corners the way is round.
      const inNotch = x > 0.8 && x < 2.2 && y < 1.2;
      if (!inNotch && away > 1e-9 && away < 0.375 - 1e-9)
        worst.take(0.25 - depth, () => `${x}, ${y} is ${away} outside and left`);
      if (away > 0.375 + 1e-9 && !inNotch) worst.take(depth, () => `${x}, ${y} is ${away} outside and cut`);
    }
    expect(worst.count).toBeGreaterThan(100000);
    expect(worst.error, worst.where).toBeLessThan(1e-7);
  });

  test('then the inside corners of a notch keep the cutter’s radius', () => {
    const corner = (d: number) => depthAt(field, 1 + d, 1 - d);
    const left = r * (1 - Math.SQRT1_2);
    expect(corner(left - 0.012)).toBe(0);
    expect(corner(left + 0.012)).toBe(0.25);
  });
});

describe('When a cutter runs on the waste side', () => {
  test('then an open line is cut at the right of its direction', () => {
    const field = sweep(
      faceWith(beside('waste', [openLine([0, 1], [2, 1], [2, 3])])),
      { minX: 0, minY: 0, maxX: 3, maxY: 3 },
      0.01,
    );
    expect(depthAt(field, 1, 0.995)).toBe(0.25);
    expect(depthAt(field, 1, 0.64)).toBe(0.25);
    expect(depthAt(field, 1, 0.615)).toBe(0);
    expect(depthAt(field, 1, 1.005)).toBe(0);
    expect(depthAt(field, 2.005, 2)).toBe(0.25);
    expect(depthAt(field, 1.995, 2)).toBe(0);
    expect(depthAt(field, 1.995, 1.005)).toBe(0);
    const turned = sweep(
      faceWith(beside('waste', [openLine([2, 3], [2, 1], [0, 1])])),
      { minX: 0, minY: 0, maxX: 3, maxY: 3 },
      0.01,
    );
    expect(depthAt(turned, 1, 1.005)).toBe(0.25);
    expect(depthAt(turned, 1, 0.995)).toBe(0);
  });

  test('then a closed line is cut on its outside', () => {
    const field = sweep(
      faceWith(beside('waste', [closedLine([0, 0], [2, 0], [2, 2], [0, 2])])),
      { minX: -0.5, minY: -0.5, maxX: 2.5, maxY: 2.5 },
      0.01,
    );
    expect(depthAt(field, 1, -0.005)).toBe(0.25);
    expect(depthAt(field, 1, 0.005)).toBe(0);
  });
});

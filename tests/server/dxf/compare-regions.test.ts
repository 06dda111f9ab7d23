import { describe, expect, test } from 'vitest';
import { compareRegions } from '../../../server/dxf/compare-regions.ts';

const NEAR = 1e-6;
const box = (minX: number, minY: number, maxX: number, maxY: number) => ({ minX, minY, maxX, maxY });
const outline = (...places: readonly (readonly [number, number])[]) => places.map(([x, y]) => ({ x, y }));
const largest = (differences: number[]) => Math.max(0, ...differences.map(Math.abs));

/** Two bars that cross, and their outline. */
const cross = [box(4, 0, 6, 10), box(0, 4, 10, 6)];
const crossOutline = outline(
  [4, 0],
  [6, 0],
  [6, 4],
  [10, 4],
  [10, 6],
  [6, 6],
  [6, 10],
  [4, 10],
  [4, 6],
  [0, 6],
  [0, 4],
  [4, 4],
);

/** Four bars about a hole, and their outline with its island. */
const ring = [box(0, 0, 10, 2), box(0, 8, 10, 10), box(0, 0, 2, 10), box(8, 0, 10, 10)];
const ringOutlines = [outline([0, 0], [10, 0], [10, 10], [0, 10]), outline([2, 2], [2, 8], [8, 8], [8, 2])];

describe('When outlines cover what the rectangles cover', () => {
  test('then a cross does not differ', () => expect(largest(compareRegions([crossOutline], cross, NEAR))).toBe(0));
  test('then a ring with its island does not differ', () =>
    expect(largest(compareRegions(ringOutlines, ring, NEAR))).toBe(0));
  test('then rounding does not matter', () => {
    const rounded = crossOutline.map(({ x, y }, i) => ({ x: x + (i % 3) * 4e-7, y: y - (i % 2) * 4e-7 }));
    expect(largest(compareRegions([rounded], cross, NEAR))).toBeLessThanOrEqual(NEAR);
  });
  test('then nothing against nothing does not differ', () => expect(compareRegions([], [], NEAR)).toEqual([]));
});

describe('When they do not', () => {
  test('then the difference is told: an edge that is off', () => {
    const off = crossOutline.map((p) => (p.y === 10 ? { ...p, y: 10.003 } : p));
    expect(largest(compareRegions([off], cross, NEAR))).toBeCloseTo(0.003, 12);
  });
  test('then a notch too narrow to see is found', () => {
    const notched = outline([0, 0], [5, 0], [5, 1], [5.00001, 1], [5.00001, 0], [10, 0], [10, 2], [0, 2]);
    expect(largest(compareRegions([notched], [box(0, 0, 10, 2)], NEAR))).toBeGreaterThan(NEAR);
  });
  test('then a missing island, outline or rectangle is found', () => {
    expect(largest(compareRegions(ringOutlines.slice(0, 1), ring, NEAR))).toBe(Infinity);
    expect(largest(compareRegions([], ring, NEAR))).toBe(Infinity);
    expect(largest(compareRegions(ringOutlines, [], NEAR))).toBe(Infinity);
  });
  test('then a slanting edge is found', () => {
    const slanted = outline([0, 0], [10, 0.001], [10, 2], [0, 2]);
    expect(largest(compareRegions([slanted], [box(0, 0, 10, 2)], NEAR))).toBeGreaterThan(NEAR);
  });
});

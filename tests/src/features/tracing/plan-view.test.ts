import { describe, expect, it } from 'vitest';
import { nextPick, pickLoops } from '../../../../src/features/tracing/model/pick-loops.ts';
import { drawnLoops } from '../../../../src/features/tracing/model/loop-contours.ts';
import {
  fitPlan,
  fromPlan,
  keepDrawable,
  panPlan,
  toPlan,
  zoomPlan,
} from '../../../../src/features/tracing/model/plan-view.ts';

const PAGE = { width: 800, height: 600 };
const EXTENTS = { minX: 10, minY: -20, maxX: 110, maxY: 30 };

const square = (from: number, to: number) => ({
  vertices: [
    [from, from, 0],
    [to, from, 0],
    [to, to, 0],
    [from, to, 0],
  ] as [number, number, number][],
  kind: 'alone' as const,
  role: 'opening' as const,
});

describe('view of a drawing', () => {
  const fitted = fitPlan(EXTENTS, PAGE, 1);

  it('When a drawing is fitted, then all of it is on the page with its middle in the middle', () => {
    expect(fromPlan(fitted, PAGE, { x: 60, y: 5 })).toEqual({ x: 400, y: 300 });
    for (const [x, y] of [
      [10, -20],
      [110, 30],
    ] as const) {
      const p = fromPlan(fitted, PAGE, { x, y });
      expect(p.x).toBeGreaterThanOrEqual(0);
      expect(p.x).toBeLessThanOrEqual(PAGE.width);
      expect(p.y).toBeGreaterThanOrEqual(0);
      expect(p.y).toBeLessThanOrEqual(PAGE.height);
    }
  });

  it('When a place without size is shown, then it is in the middle and no scale is endless', () => {
    const view = fitPlan({ minX: 7, minY: 8, maxX: 7, maxY: 8 }, PAGE, 2);
    expect(fromPlan(view, PAGE, { x: 7, y: 8 })).toEqual({ x: 400, y: 300 });
    expect(view.scale).toBeLessThan(PAGE.width);
  });

  it('When it is zoomed about a place, then the place stays where it was on the page', () => {
    const about = { x: 42, y: 11 };
    const before = fromPlan(fitted, PAGE, about);
    const after = fromPlan(zoomPlan(fitted, 3.7, about), PAGE, about);
    expect(after.x).toBeCloseTo(before.x, 9);
    expect(after.y).toBeCloseTo(before.y, 9);
  });

  it('When it is moved by pixels, then a place of the drawing moves by as many', () => {
    const before = fromPlan(fitted, PAGE, { x: 42, y: 11 });
    const after = fromPlan(panPlan(fitted, 30, -12), PAGE, { x: 42, y: 11 });
    expect([after.x - before.x, after.y - before.y].map((n) => Math.round(n * 1e6) / 1e6)).toEqual([30, -12]);
  });

  it('When a pixel is turned into a place and back, then it is the same pixel', () => {
    const p = fromPlan(fitted, PAGE, toPlan(fitted, PAGE, { x: 123, y: 456 }));
    expect(p.x).toBeCloseTo(123, 9);
    expect(p.y).toBeCloseTo(456, 9);
  });

  it('When one zooms past the end, then the drawing stays where it is', () => {
    const far = zoomPlan(fitted, 1e-9, { x: 10, y: -20 });
    const kept = keepDrawable(far, fitted, fitted);
    expect(kept.centre).toEqual(fitted.centre);
    expect(kept.scale).toBeLessThan(fitted.scale);
    expect(kept.scale).toBeGreaterThan(far.scale);
  });
});

describe('picking a loop', () => {
  const loops = drawnLoops([square(0, 100), square(10, 90), square(20, 30)]);

  it('When several loops hold a place, then the smallest comes first, and those that do not hold it are left out', () => {
    expect(pickLoops(loops, { x: 25, y: 25 })).toEqual([2, 1, 0]);
    expect(pickLoops(loops, { x: 5, y: 50 })).toEqual([0]);
    expect(pickLoops(loops, { x: 500, y: 50 })).toEqual([]);
  });

  it('When one clicks there again, then the next larger loop is meant, and after the largest the smallest', () => {
    expect(nextPick([2, 1, 0], new Set())).toBe(2);
    expect(nextPick([2, 1, 0], new Set([2]))).toBe(1);
    expect(nextPick([2, 1, 0], new Set([0]))).toBe(2);
    expect(nextPick([2, 1, 0], new Set([2, 1]))).toBe(2);
    expect(nextPick([], new Set([2]))).toBeUndefined();
  });
});

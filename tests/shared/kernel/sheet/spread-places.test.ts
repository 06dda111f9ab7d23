import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { spreadPlaces } from '#shared/kernel/sheet/spread-places.ts';

const places = fc
  .array(fc.double({ min: 0, max: 100, noNaN: true }), { minLength: 1, maxLength: 30 })
  .map((list) => [...list].sort((a, b) => a - b));

/** The plain way, for comparison: each as far on as the one before pushes it. */
const pushedOn = (wanted: readonly number[], pitch: number) =>
  wanted.reduce<number[]>((out, place) => [...out, Math.max(place, (out[out.length - 1] ?? -Infinity) + pitch)], []);

const squares = (a: readonly number[], b: readonly number[]) => a.reduce((sum, v, i) => sum + (v - b[i]!) ** 2, 0);

describe('spreadPlaces', () => {
  test('When places are far enough apart, then they stay', () => {
    expect(spreadPlaces([1, 5, 9], 3, 0, 10)).toEqual([1, 5, 9]);
  });

  test('When three fall on one place, then the middle one stays', () => {
    expect(spreadPlaces([5, 5, 5], 2, 0, 10)).toEqual([3, 5, 7]);
  });

  test('When they would leave the line, then they are kept on it', () => {
    expect(spreadPlaces([0, 0], 2, 0, 10)).toEqual([0, 2]);
    expect(spreadPlaces([10, 10], 2, 0, 10)).toEqual([8, 10]);
  });

  test('When the line is too short, then there is no answer', () => {
    expect(spreadPlaces([1, 2, 3], 6, 0, 10)).toBeUndefined();
  });

  test('When there is nothing, then nothing comes back', () => {
    expect(spreadPlaces([], 3, 0, 10)).toEqual([]);
  });

  test('For any places: apart by the pitch, in order, on the line, and moved no more than by pushing on', () => {
    fc.assert(
      fc.property(places, (wanted) => {
        const pitch = 3;
        const spread = spreadPlaces(wanted, pitch, -200, 300)!;
        expect(spread).toHaveLength(wanted.length);
        for (let i = 1; i < spread.length; i++)
          expect(spread[i]! - spread[i - 1]!).toBeGreaterThanOrEqual(pitch - 1e-9);
        expect(squares(spread, wanted)).toBeLessThanOrEqual(squares(pushedOn(wanted, pitch), wanted) + 1e-9);
        const tight = spreadPlaces(wanted, pitch, 0, 100);
        expect(tight === undefined).toBe((wanted.length - 1) * pitch > 100);
        for (const place of tight ?? []) expect(place >= -1e-9 && place <= 100 + 1e-9).toBe(true);
      }),
    );
  });
});

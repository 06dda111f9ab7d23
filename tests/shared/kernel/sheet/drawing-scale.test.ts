import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { chooseScale, millimetresPerUnit, scaleText } from '#shared/kernel/sheet/drawing-scale.ts';

const room = { width: 180, height: 130 };
const length = fc.double({ min: 0.5, max: 10_000, noNaN: true });

/** Which reductions are to be had, found by asking for squares that just fit. */
const reached = (unit: 'in' | 'mm', upTo: number) =>
  new Set(
    Array.from({ length: upTo }, (_, i) =>
      chooseScale((130 * (i + 1) * 0.9999) / millimetresPerUnit(unit), 1 / 100, unit, { width: 130, height: 130 }),
    ),
  );

describe('chooseScale', () => {
  test('Every reduction that ISO 5455 recommends (from memory) is there: 2, 5, 10, 20, 50, 100', () => {
    for (const unit of ['in', 'mm'] as const)
      for (const n of [1, 2, 5, 10, 20, 50, 100]) expect(reached(unit, 101)).toContain(n);
  });

  test('When a 902 mm board has 180 mm, then it is drawn 1 : 6 in millimetres', () => {
    expect(chooseScale(902, 700, 'mm', room)).toBe(6);
  });

  test('When the same board is in inches, then 1 : 8 follows 1 : 6 where the height asks for it', () => {
    expect(chooseScale(35.5, 33, 'in', room)).toBe(8);
  });

  test('For any size the drawing fits, and at twice the size it would not', () => {
    fc.assert(
      fc.property(length, length, fc.constantFrom('in' as const, 'mm' as const), (width, height, unit) => {
        const mm = millimetresPerUnit(unit);
        const n = chooseScale(width, height, unit, room);
        const fits = (k: number) => (width * mm) / k <= room.width && (height * mm) / k <= room.height;
        expect(fits(n)).toBe(true);
        if (n > 1) expect(fits(n / 2)).toBe(false);
      }),
    );
  });

  test('When there is no room or no size, then it throws with the value', () => {
    expect(() => chooseScale(1, 1, 'in', { width: 0, height: 10 })).toThrow('got 0 × 10 mm');
    expect(() => chooseScale(Number.NaN, 1, 'in', room)).toThrow('got NaN × 1');
  });

  test('A scale is said as on drawings', () => {
    expect(scaleText(2.5)).toBe('1 : 2.5');
  });
});

import { describe, expect, test } from 'vitest';
import { entity, type DxfPair } from './dxf-text.ts';
import { areaOf, codesOf, expectRows, farthestOf, readEntities, rowsOf } from './found.ts';

type Place = readonly [number, number];

describe('When a spline has fit points only', () => {
  const through = (points: readonly Place[], ...more: readonly DxfPair[]): string =>
    entity(
      'SPLINE',
      [71, 3],
      ...more,
      ...points.flatMap(([x, y]): DxfPair[] => [
        [11, x],
        [21, y],
        [31, 0],
      ]),
    );

  test('then it passes each of them, smoothly, and that the shape is guessed is told', () => {
    const points: Place[] = [
      [0, 0],
      [30, 40],
      [80, 20],
      [120, 60],
    ];
    const found = readEntities(through(points));
    expect(farthestOf(rowsOf(found), points)).toBeLessThan(1e-6);
    expect(codesOf(found)).toEqual(['spline-through-points', 'spline-fitted']);
  });

  test('then two points are a line', () => {
    expectRows(
      readEntities(
        through([
          [1, 2],
          [30, 40],
        ]),
      ),
      [[1, 2, 30, 40, 0]],
    );
  });

  test('then directions at the ends (12, 13) are kept', () => {
    const rows = rowsOf(
      readEntities(
        through(
          [
            [0, 0],
            [100, 0],
          ],
          [12, 0],
          [22, 1],
          [13, 0],
          [23, -1],
        ),
      ),
    );
    // A cubic with unit tangents and parameter by chord length: Bézier points (0, 0), (0, 100/3), (100, 100/3), (100, 0).
    expect(areaOf(rows)).toBeCloseTo(-(100 * (100 / 3) * 3) / 5, 0);
  });

  test('then a closed one through places of a circle is nearly that circle', () => {
    const points: Place[] = Array.from({ length: 16 }, (_, i) => [
      50 * Math.cos((i * Math.PI) / 8),
      50 * Math.sin((i * Math.PI) / 8),
    ]);
    const rows = rowsOf(readEntities(through(points, [70, 11])));
    expect(rows[0]!.slice(0, 2)).toEqual(rows.at(-1)!.slice(2, 4));
    // A cubic leaves a circle of which each piece spans θ by about rθ⁴/384; common practice, no source.
    expect(Math.abs(areaOf(rows) / (Math.PI * 2500) - 1)).toBeLessThan((2 * (Math.PI / 8) ** 4) / 384 + 2e-4);
  });
});

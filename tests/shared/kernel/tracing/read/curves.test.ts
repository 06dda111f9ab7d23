import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { entity, type DxfPair } from './dxf-text.ts';
import {
  areaOf,
  codesOf,
  expectRows,
  farthestOf,
  lengthOf,
  placesAlong,
  readEntities,
  rowsOf,
  type Row,
} from './found.ts';

type Place = readonly [number, number];

const spline = (
  degree: number,
  knots: readonly number[],
  points: readonly Place[],
  weights: readonly number[] = [],
  ...more: readonly DxfPair[]
): string =>
  entity(
    'SPLINE',
    [70, weights.length > 0 ? 12 : 8],
    [71, degree],
    ...more,
    ...knots.map((knot): DxfPair => [40, knot]),
    ...weights.map((weight): DxfPair => [41, weight]),
    ...points.flatMap(([x, y]): DxfPair[] => [
      [10, x],
      [20, y],
      [30, 0],
    ]),
  );

/** A clamped knot vector with whole steps. */
const clamped = (count: number, degree: number): number[] =>
  Array.from({ length: count + degree + 1 }, (_, i) => Math.min(Math.max(i - degree, 0), count - degree));

/** The rational B-spline by its definition: basis functions of Cox and de Boor, summed (The NURBS Book, 2.5 and 4.2). */
function valueAt(
  degree: number,
  knots: readonly number[],
  points: readonly Place[],
  weights: readonly number[],
  u: number,
): Place {
  const basis = (i: number, p: number): number => {
    if (p === 0) {
      const last = u === knots[points.length] && knots[i + 1] === u && knots[i]! < u;
      return (u >= knots[i]! && u < knots[i + 1]!) || last ? 1 : 0;
    }
    const part = (top: number, bottom: number) => (bottom === 0 ? 0 : top / bottom);
    return (
      part(u - knots[i]!, knots[i + p]! - knots[i]!) * basis(i, p - 1) +
      part(knots[i + p + 1]! - u, knots[i + p + 1]! - knots[i + 1]!) * basis(i + 1, p - 1)
    );
  };
  let [x, y, w] = [0, 0, 0];
  points.forEach((point, i) => {
    const share = basis(i, degree) * (weights[i] ?? 1);
    x += share * point[0];
    y += share * point[1];
    w += share;
  });
  return [x / w, y / w];
}

/** Both ways: places of the curve lie by the arcs, and places of the arcs by chords along the curve. */
function expectNear(rows: readonly Row[], curve: (t: number) => Place, tolerance: number): void {
  const steps = 400;
  const places = Array.from({ length: steps + 1 }, (_, i) => curve(i / steps));
  expect(farthestOf(rows, places, tolerance)).toBeLessThanOrEqual(tolerance);
  const chords = places.slice(1).map(([x, y], i): Row => [...places[i]!, x, y, 0] as unknown as Row);
  const sag = Math.max(
    ...chords.map(([x0, y0, x1, y1], i) => {
      const [x, y] = curve((i + 0.5) / steps);
      return Math.hypot(x - (x0 + x1) / 2, y - (y0 + y1) / 2);
    }),
  );
  const ours = rows.flatMap((row) => placesAlong(row, 5));
  expect(farthestOf(chords, ours, tolerance + 2 * sag)).toBeLessThanOrEqual(tolerance + 2 * sag);
  expect(rows.slice(1).every((row, i) => row[0] === rows[i]![2] && row[1] === rows[i]![3])).toBe(true);
}

const coordinate = fc.integer({ min: -200, max: 200 });
const place = fc.tuple(coordinate, coordinate);

describe('When splines are read', () => {
  test('then any of them lies within the chord tolerance of its definition, rational or not', () => {
    const some = fc
      .integer({ min: 1, max: 5 })
      .chain((degree) =>
        fc.tuple(
          fc.constant(degree),
          fc.array(place, { minLength: degree + 1, maxLength: degree + 5 }),
          fc.boolean(),
          fc.array(fc.integer({ min: 1, max: 40 }), { minLength: 10, maxLength: 10 }),
          fc.constantFrom(0.01, 0.1, 1),
        ),
      );
    fc.assert(
      fc.property(some, ([degree, points, rational, tenths, tolerance]) => {
        const weights = rational ? points.map((_, i) => tenths[i]! / 10) : [];
        const knots = clamped(points.length, degree);
        const found = readEntities(spline(degree, knots, points, weights), { chordTolerance: tolerance });
        const rows = rowsOf(found);
        fc.pre(rows.length > 0);
        const end = knots.at(-1)!;
        expectNear(rows, (t) => valueAt(degree, knots, points, weights, t * end), tolerance * 1.0000001);
      }),
      { numRuns: 150 },
    );
  });

  test('then a circle of nine weighted control points is four quarter circles, exact', () => {
    // The NURBS Book, example 7.2: degree 2, weights 1 and √½ in turn.
    const w = Math.SQRT1_2;
    const corners: Place[] = [
      [5, 0],
      [5, 5],
      [0, 5],
      [-5, 5],
      [-5, 0],
      [-5, -5],
      [0, -5],
      [5, -5],
      [5, 0],
    ];
    const found = readEntities(spline(2, [0, 0, 0, 1, 1, 2, 2, 3, 3, 4, 4, 4], corners, [1, w, 1, w, 1, w, 1, w, 1]));
    const rows = rowsOf(found);
    expect(rows.length).toBeLessThanOrEqual(4);
    expect(lengthOf(rows)).toBeCloseTo(10 * Math.PI, 9);
    expect(areaOf(rows)).toBeCloseTo(25 * Math.PI, 9);
    expect(codesOf(found)).toEqual(['spline-fitted']);
  });

  test('then a periodic one without clamped knots runs round and meets its beginning', () => {
    const ring: Place[] = Array.from({ length: 8 }, (_, i) => [
      40 * Math.cos((i * Math.PI) / 4),
      30 * Math.sin((i * Math.PI) / 4),
    ]);
    const points = [...ring, ...ring.slice(0, 3)];
    const knots = Array.from({ length: points.length + 4 }, (_, i) => i);
    const rows = rowsOf(readEntities(spline(3, knots, points, [], [70, 11])));
    expect(rows[0]!.slice(0, 2)).toEqual(
      rows
        .at(-1)!
        .slice(2, 4)
        .map((value) => expect.closeTo(value, 9)),
    );
    expectNear(rows, (t) => valueAt(3, knots, points, [], 3 + t * 8), 0.01);
  });

  test('then degree 1 gives its lines and nothing else', () => {
    expectRows(
      readEntities(
        spline(1, clamped(3, 1), [
          [0, 0],
          [7, 1],
          [9, 8],
        ]),
      ),
      [
        [0, 0, 7, 1, 0],
        [7, 1, 9, 8, 0],
      ],
    );
  });

  test('then a curve with a cusp and a loop is followed through both', () => {
    const cusp: Place[] = [
      [0, 0],
      [100, 100],
      [0, 100],
      [100, 0],
    ];
    const loop: Place[] = [
      [0, 0],
      [150, 100],
      [-50, 100],
      [100, 0],
    ];
    for (const points of [cusp, loop]) {
      const rows = rowsOf(readEntities(spline(3, clamped(4, 3), points)));
      expectNear(rows, (t) => valueAt(3, clamped(4, 3), points, [], t), 0.01);
    }
  });

  test('then arcs are used, few of them, and a finer tolerance takes more', () => {
    const points: Place[] = [
      [0, 0],
      [100, 150],
      [200, -150],
      [300, 0],
    ];
    const count = (chordTolerance: number) =>
      readEntities(spline(3, clamped(4, 3), points), { chordTolerance }).curves.count;
    expect(count(0.01)).toBeLessThan(70);
    expect(count(1)).toBeLessThan(count(0.01));
    expect(rowsOf(readEntities(spline(3, clamped(4, 3), points))).every((row) => row[4] !== 0)).toBe(true);
  });

  test.each([
    [
      'too few knots',
      spline(3, clamped(4, 3).slice(1), [
        [0, 0],
        [1, 1],
        [2, 0],
        [3, 1],
      ]),
    ],
    [
      'knots that fall',
      spline(
        3,
        [0, 0, 0, 0, 1, 1, 0.5, 1],
        [
          [0, 0],
          [1, 1],
          [2, 0],
          [3, 1],
        ],
      ),
    ],
    [
      'weights for some points only',
      spline(
        3,
        clamped(4, 3),
        [
          [0, 0],
          [1, 1],
          [2, 0],
          [3, 1],
        ],
        [1, 1],
      ),
    ],
    [
      'a weight of 0',
      spline(
        3,
        clamped(4, 3),
        [
          [0, 0],
          [1, 1],
          [2, 0],
          [3, 1],
        ],
        [1, 0, 1, 1],
      ),
    ],
    [
      'more degree than points',
      spline(3, clamped(3, 3), [
        [0, 0],
        [1, 1],
        [2, 0],
      ]),
    ],
    ['degree 0', spline(0, [0, 1], [[0, 0]])],
    [
      'knots all alike',
      spline(
        1,
        [2, 2, 2, 2],
        [
          [0, 0],
          [1, 1],
        ],
      ),
    ],
    ['nothing at all', entity('SPLINE', [71, 3])],
  ])('then one with %s is refused', (_, text) => {
    const found = readEntities(text);
    expect(found.census).toMatchObject([{ fate: 'refused', reason: 'spline-data', count: 1 }]);
    expect(codesOf(found)).toEqual(['spline-data']);
  });

  test('then one marked closed whose ends do not meet is left open, and that is told', () => {
    const points: Place[] = [
      [0, 0],
      [9, 9],
      [20, 0],
    ];
    const found = readEntities(spline(2, clamped(3, 2), points, [], [70, 9]));
    expect(codesOf(found)).toEqual(['spline-left-open', 'spline-fitted']);
    const round = readEntities(spline(2, clamped(4, 2), [...points, [0, 0]], [], [70, 9]));
    expect(codesOf(round)).toEqual(['spline-fitted']);
  });

  test.each([
    ['millimetres', 4, {}, '0.01 mm'],
    ['inches', 1, {}, '0.01 mm'],
    ['no unit', 0, {}, '100,000th'],
    ['no unit, but a tolerance', 0, { chordTolerance: 0.25 }, '0.25 drawing units'],
  ] as const)('then in %s the notice says how far the arcs may be off', (_, unit, options, said) => {
    const text = spline(2, clamped(3, 2), [
      [0, 0],
      [9, 9],
      [20, 0],
    ]);
    const found = readEntities(text, options, [
      [9, '$INSUNITS'],
      [70, unit],
    ]);
    expect(found.problems.find(({ code }) => code === 'spline-fitted')?.message).toContain(said);
  });

  test('then one that leaves its plane is refused', () => {
    const text = spline(1, clamped(2, 1), [
      [0, 0],
      [1, 1],
    ]).replace('30\n0\n', '30\n5\n');
    expect(readEntities(text).census).toMatchObject([{ fate: 'refused', reason: 'not-flat' }]);
  });
});

describe('When the unit is not known', () => {
  test('then the tolerance follows the size: scaled by a thousand the same arcs come out', () => {
    const drawn = (size: number, unit: number) => {
      const text = entity('ELLIPSE', [10, 0], [20, 0], [11, 10 * size], [21, 0], [40, 0.3]);
      return rowsOf(
        readEntities(text, {}, [
          [9, '$INSUNITS'],
          [70, unit],
        ]),
      );
    };
    const small = drawn(1, 0);
    expect(drawn(1024, 0)).toEqual(
      small.map(([x0, y0, x1, y1, bulge]) => [x0 * 1024, y0 * 1024, x1 * 1024, y1 * 1024, bulge]),
    );
    expect(drawn(1024, 4).length).toBeGreaterThan(drawn(1, 4).length);
  });
});

describe('When any ellipse is read', () => {
  test('then its arcs lie within the chord tolerance of it, and it of them', () => {
    const angle = fc.integer({ min: 0, max: 62 }).map((tenths) => tenths / 10);
    fc.assert(
      fc.property(
        place,
        place,
        fc.integer({ min: 1, max: 100 }),
        angle,
        angle,
        ([cx, cy], [ux, uy], percent, from, to) => {
          fc.pre(Math.hypot(ux, uy) > 1 && from !== to);
          const ratio = percent / 100;
          const rows = rowsOf(
            readEntities(entity('ELLIPSE', [10, cx], [20, cy], [11, ux], [21, uy], [40, ratio], [41, from], [42, to])),
          );
          const sweep = to > from ? to - from : to - from + 2 * Math.PI;
          const curve = (t: number): Place => {
            const a = from + sweep * t;
            return [cx + ux * Math.cos(a) - uy * ratio * Math.sin(a), cy + uy * Math.cos(a) + ux * ratio * Math.sin(a)];
          };
          expectNear(rows, curve, 0.0100001);
        },
      ),
      { numRuns: 200 },
    );
  });
});

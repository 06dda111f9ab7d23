import { describe, expect, test } from 'vitest';
import { circle, entity, FROM_BELOW, line, type DxfPair } from './dxf-text.ts';
import { areaOf, codesOf, expectRows, lengthOf, readEntities, rowsOf } from './found.ts';

// Group codes, OCS and angles: DXF Reference, ENTITIES section, and its arbitrary axis algorithm, by which the X axis of
// extrusion (0, 0, −1) is (−1, 0, 0) and its Y axis (0, 1, 0).

const QUARTER = Math.tan(Math.PI / 8);

describe('When a LINE is read', () => {
  test('then it runs from 10, 20 to 11, 21', () => {
    expectRows(readEntities(line(1, 2, 3.5, -4)), [[1, 2, 3.5, -4, 0]]);
  });

  test('then its extrusion changes nothing, as its ends are in world coordinates', () => {
    expectRows(readEntities(line(1, 2, 3.5, -4, ...FROM_BELOW)), [[1, 2, 3.5, -4, 0]]);
    expectRows(readEntities(line(1, 2, 3.5, -4, [210, 1], [220, 0], [230, 0])), [[1, 2, 3.5, -4, 0]]);
  });

  test('then one height is laid flat and told, and two heights are refused', () => {
    const flat = readEntities(line(1, 2, 3, 4, [30, 7], [31, 7]));
    expectRows(flat, [[1, 2, 3, 4, 0]]);
    expect(codesOf(flat)).toEqual(['flattened']);
    const steep = readEntities(line(1, 2, 3, 4, [30, 0], [31, 7]));
    expect(steep.curves.count).toBe(0);
    expect(steep.census).toEqual([
      { type: 'LINE', layer: '0', fate: 'refused', reason: 'not-flat', count: 1, lines: [expect.any(Number)] },
    ]);
    expect(codesOf(steep)).toEqual(['not-flat']);
  });

  test('then one without length is set aside', () => {
    expect(readEntities(line(1, 2, 1, 2)).census[0]).toMatchObject({ fate: 'aside', reason: 'no-length' });
  });
});

describe('When an ARC or CIRCLE is read', () => {
  const arc = (from: number, to: number, ...more: readonly DxfPair[]) =>
    entity('ARC', [10, 10], [20, 5], [40, 2], [50, from], [51, to], ...more);

  test('then an arc runs counter-clockwise from 50 to 51', () => {
    expectRows(readEntities(arc(0, 90)), [[12, 5, 10, 7, QUARTER]]);
  });

  test('then an arc across 0° keeps its way', () => {
    const found = readEntities(arc(350, 20));
    const bulge = Math.tan((30 * Math.PI) / 180 / 4);
    const at = (degrees: number) => [
      10 + 2 * Math.cos((degrees * Math.PI) / 180),
      5 + 2 * Math.sin((degrees * Math.PI) / 180),
    ];
    expectRows(found, [[...at(350), ...at(20), bulge] as never]);
  });

  test('then more than half a turn comes as two arcs of one circle', () => {
    expectRows(readEntities(arc(0, 270)), [
      [12, 5, 10 + 2 * Math.cos(0.75 * Math.PI), 5 + 2 * Math.sin(0.75 * Math.PI), Math.tan((0.75 * Math.PI) / 4)],
      [10 + 2 * Math.cos(0.75 * Math.PI), 5 + 2 * Math.sin(0.75 * Math.PI), 10, 3, Math.tan((0.75 * Math.PI) / 4)],
    ]);
  });

  test('then a circle is two half circles, counter-clockwise, exact at its quadrants', () => {
    expect(rowsOf(readEntities(circle(10, 5, 2)))).toEqual([
      [12, 5, 8, 5, expect.closeTo(1, 15)],
      [8, 5, 12, 5, expect.closeTo(1, 15)],
    ]);
  });

  test('then whole quadrants about the origin are exact zeros', () => {
    const rows = rowsOf(readEntities(circle(0, 0, 2) + entity('ARC', [10, 0], [20, 0], [40, 3], [50, 90], [51, 180])));
    expect(rows.map((row) => row.slice(0, 4))).toEqual([
      [2, 0, -2, 0],
      [-2, 0, 2, 0],
      [0, 3, -3, 0],
    ]);
  });

  test('then from below X runs backwards and the arc clockwise', () => {
    expectRows(readEntities(arc(0, 90, ...FROM_BELOW)), [[-12, 5, -10, 7, -QUARTER]]);
    expectRows(readEntities(circle(10, 5, 2, ...FROM_BELOW)), [
      [-12, 5, -8, 5, -1],
      [-8, 5, -12, 5, -1],
    ]);
  });

  test('then an extrusion of another length points the same way', () => {
    expectRows(readEntities(arc(0, 90, [210, 0], [220, 0], [230, -0.5])), [[-12, 5, -10, 7, -QUARTER]]);
  });

  test.each([
    ['leaning', [0.1, 0, 1]],
    ['lying', [1, 0, 0]],
    ['of no length', [0, 0, 0]],
  ])('then an extrusion %s is refused', (_, [x, y, z]) => {
    const found = readEntities(circle(10, 5, 2, [210, x!], [220, y!], [230, z!]));
    expect(found.census[0]).toMatchObject({ fate: 'refused', reason: 'tilted' });
    expect(codesOf(found)).toEqual(['tilted']);
  });

  test.each([0, -3])('then a radius of %d is refused', (radius) => {
    expect(readEntities(circle(0, 0, radius)).census[0]).toMatchObject({ fate: 'refused', reason: 'bad-size' });
  });
});

describe('When an LWPOLYLINE is read', () => {
  const vertices: readonly DxfPair[] = [
    [10, 0],
    [20, 0],
    [42, 1],
    [10, 10],
    [20, 0],
    [10, 10],
    [20, 6],
    [42, -0.5],
    [10, 0],
    [20, 6],
    [42, 0.25],
  ];

  test('then each vertex’s bulge belongs to the segment that leaves it, the closing one among them', () => {
    const found = readEntities(entity('LWPOLYLINE', [90, 4], [70, 1], ...vertices));
    expectRows(found, [
      [0, 0, 10, 0, 1],
      [10, 0, 10, 6, 0],
      [10, 6, 0, 6, -0.5],
      [0, 6, 0, 0, 0.25],
    ]);
    expect(found.problems).toEqual([]);
  });

  test('then an open one has no closing segment', () => {
    expect(readEntities(entity('LWPOLYLINE', [90, 4], [70, 0], ...vertices)).curves.count).toBe(3);
  });

  test('then vertex numbers (91) lose no vertex', () => {
    const numbered = vertices.flatMap((pair): DxfPair[] => (pair[0] === 20 ? [pair, [91, 0]] : [pair]));
    expectRows(readEntities(entity('LWPOLYLINE', [90, 4], [70, 1], ...numbered)), [
      [0, 0, 10, 0, 1],
      [10, 0, 10, 6, 0],
      [10, 6, 0, 6, -0.5],
      [0, 6, 0, 0, 0.25],
    ]);
  });

  test.each([0, 1, 4_000_000_000, -5])('then a count (90) of %d changes nothing', (count) => {
    expect(readEntities(entity('LWPOLYLINE', [90, count], [70, 1], ...vertices)).curves.count).toBe(4);
  });

  test.each([[[43, 3]], [[40, 1]], [[41, 1]]] as [DxfPair][])('then a width (%s) is left out and told', (width) => {
    const found = readEntities(entity('LWPOLYLINE', [70, 1], ...vertices.slice(0, 2), width, ...vertices.slice(2)));
    expect(found.curves.count).toBe(4);
    expect(codesOf(found)).toEqual(['width-left-out']);
  });

  test('then from below X runs backwards and bulges turn', () => {
    expectRows(readEntities(entity('LWPOLYLINE', [70, 0], ...vertices.slice(0, 5), ...FROM_BELOW)), [
      [-0, 0, -10, 0, -1],
    ]);
  });

  test('then more than half a turn is two arcs with the same circle', () => {
    const rows = rowsOf(readEntities(entity('LWPOLYLINE', [70, 0], [10, 0], [20, 0], [42, 3], [10, 6], [20, 0])));
    expect(rows.length).toBe(2);
    // Radius c(1 + b²)/(4b) = 5, sweep 4·atan 3.
    expect(lengthOf(rows)).toBeCloseTo(5 * 4 * Math.atan(3), 9);
    expect(rows[0]!.slice(2, 4)).toEqual([expect.closeTo(3, 12), expect.closeTo(-9, 12)]);
  });

  test('then a height (38) is told, and repeated vertices draw nothing', () => {
    const found = readEntities(
      entity('LWPOLYLINE', [70, 1], [38, 19], [10, 1], [20, 1], [10, 1], [20, 1], [10, 2], [20, 1], [10, 1], [20, 1]),
    );
    expectRows(found, [
      [1, 1, 2, 1, 0],
      [2, 1, 1, 1, 0],
    ]);
    expect(codesOf(found)).toEqual(['flattened']);
  });
});

describe('When a POLYLINE is read', () => {
  const vertex = (x: number, y: number, ...more: readonly DxfPair[]) =>
    entity('VERTEX', [8, '0'], [10, x], [20, y], ...more);
  const square = vertex(0, 0, [42, 1]) + vertex(10, 0) + vertex(10, 6, [42, -0.5]) + vertex(0, 6, [42, 0.25]);
  const SQUARE = [
    [0, 0, 10, 0, 1],
    [10, 0, 10, 6, 0],
    [10, 6, 0, 6, -0.5],
    [0, 6, 0, 0, 0.25],
  ] as const;

  test('then it counts once and has the bulges of its vertices', () => {
    const found = readEntities(entity('POLYLINE', [66, 1], [70, 1]) + square + entity('SEQEND'));
    expectRows(found, SQUARE);
    expect(found.census).toMatchObject([{ type: 'POLYLINE', fate: 'kept', count: 1 }]);
    expect(found.problems).toEqual([]);
  });

  test('then one without SEQEND ends where something else begins, and is told', () => {
    const found = readEntities(entity('POLYLINE', [66, 1], [70, 1]) + square + line(0, 0, 1, 0));
    expectRows(found, [...SQUARE, [0, 0, 1, 0, 0]]);
    expect(codesOf(found)).toEqual(['polyline-without-end']);
  });

  test('then from below X runs backwards and bulges turn', () => {
    const found = readEntities(entity('POLYLINE', [70, 1], ...FROM_BELOW) + square + entity('SEQEND'));
    expectRows(
      found,
      SQUARE.map(([x0, y0, x1, y1, bulge]) => [-x0, y0, -x1, y1, -bulge] as const),
    );
  });

  test('then one in space keeps world coordinates and has no bulges', () => {
    const found = readEntities(entity('POLYLINE', [70, 9], ...FROM_BELOW) + square + entity('SEQEND'));
    expectRows(
      found,
      SQUARE.map(([x0, y0, x1, y1]) => [x0, y0, x1, y1, 0] as const),
    );
  });

  test('then one in space at one height is laid flat, and one that climbs is refused', () => {
    const at = (z0: number, z1: number) =>
      readEntities(entity('POLYLINE', [70, 8]) + vertex(0, 0, [30, z0]) + vertex(9, 0, [30, z1]) + entity('SEQEND'));
    expect(codesOf(at(4, 4))).toEqual(['flattened']);
    expect(at(4, 4).curves.count).toBe(1);
    expect(at(4, 5).census).toMatchObject([{ fate: 'refused', reason: 'not-flat' }]);
  });

  test('then a spline-fit one leaves out its frame (vertex flag 16) and keeps what was fitted (8)', () => {
    const fitted =
      vertex(0, 0, [70, 16]) +
      vertex(0, 0, [70, 8]) +
      vertex(5, 9, [70, 16]) +
      vertex(5, 5, [70, 8]) +
      vertex(10, 0, [70, 8]);
    expectRows(readEntities(entity('POLYLINE', [70, 4]) + fitted + entity('SEQEND')), [
      [0, 0, 5, 5, 0],
      [5, 5, 10, 0, 0],
    ]);
  });

  test('then a curve-fit one keeps the vertices that were added (1)', () => {
    expect(
      readEntities(
        entity('POLYLINE', [70, 2]) + vertex(0, 0) + vertex(3, 3, [70, 1], [42, 0.2]) + vertex(9, 0) + entity('SEQEND'),
      ).curves.count,
    ).toBe(2);
  });

  test.each([
    ['polyface', 64],
    ['polygon mesh', 16],
    ['closed mesh', 16 | 32],
  ])('then a %s is refused with what to export instead', (_, flags) => {
    const found = readEntities(
      entity('POLYLINE', [70, flags]) +
        vertex(0, 0, [70, 192]) +
        entity('VERTEX', [70, 128]) +
        entity('SEQEND') +
        line(0, 0, 1, 0),
    );
    expect(found.census).toMatchObject([
      { type: 'POLYLINE', fate: 'refused', reason: 'three-dimensional', count: 1 },
      { type: 'LINE', fate: 'kept', count: 1 },
    ]);
    expect(found.problems[0]).toMatchObject({ code: 'three-dimensional', message: expect.stringContaining('2D') });
  });
});

describe('When an ELLIPSE is read', () => {
  const ellipse = (ratio: number, ...more: readonly DxfPair[]) =>
    entity('ELLIPSE', [10, 3], [20, 4], [11, 10], [21, 0], [40, ratio], ...more);

  test('then a whole one has its area, in arcs that meet, with a notice', () => {
    const found = readEntities(ellipse(0.5));
    const rows = rowsOf(found);
    expect(areaOf(rows)).toBeCloseTo(Math.PI * 10 * 5, 1);
    rows.forEach((row, i) => expect(row.slice(0, 2)).toEqual(rows.at(i - 1)!.slice(2, 4)));
    expect(rows.every((row) => row[4] > 0)).toBe(true);
    expect(codesOf(found)).toEqual(['ellipse-fitted']);
  });

  test('then part of one begins and ends at its parameters', () => {
    const rows = rowsOf(readEntities(ellipse(0.5, [41, Math.PI / 2], [42, Math.PI])));
    expect(rows[0]!.slice(0, 2)).toEqual([expect.closeTo(3, 9), expect.closeTo(9, 9)]);
    expect(rows.at(-1)!.slice(2, 4)).toEqual([expect.closeTo(-7, 9), expect.closeTo(4, 9)]);
  });

  test('then from below the minor axis turns round, not the centre', () => {
    const rows = rowsOf(readEntities(ellipse(0.5, [41, 0], [42, Math.PI / 2], ...FROM_BELOW)));
    expect(rows[0]!.slice(0, 2)).toEqual([expect.closeTo(13, 9), expect.closeTo(4, 9)]);
    expect(rows.at(-1)!.slice(2, 4)).toEqual([expect.closeTo(3, 9), expect.closeTo(-1, 9)]);
    expect(rows.every((row) => row[4] < 0)).toBe(true);
  });

  test('then one with ratio 1 is a circle, exact and without a notice', () => {
    const found = readEntities(ellipse(1));
    expectRows(found, [
      [13, 4, -7, 4, 1],
      [-7, 4, 13, 4, 1],
    ]);
    expect(found.problems).toEqual([]);
  });

  test.each([0, -0.5])('then a ratio of %d is refused', (ratio) => {
    expect(readEntities(ellipse(ratio)).census[0]).toMatchObject({ fate: 'refused', reason: 'bad-size' });
  });

  test('then a major axis out of the plane is refused', () => {
    expect(readEntities(ellipse(0.5, [31, 4])).census[0]).toMatchObject({ fate: 'refused', reason: 'tilted' });
  });
});

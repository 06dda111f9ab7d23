import { describe, expect, test } from 'vitest';
import type { DrawingEntity } from '#shared/kernel/drawing/drawing.ts';
import { findTwins } from '../../../server/dxf/find-twins.ts';

type Place = readonly [x: number, y: number, bulge?: number];
const line = (layer: string, closed: boolean, ...places: readonly Place[]): DrawingEntity => ({
  kind: 'polyline',
  layer,
  closed,
  vertices: places.map(([x, y, bulge = 0]) => ({ x, y, bulge })),
});
const NEAR = 1e-6;
const square = line('A', true, [0, 0], [2, 0], [2, 2], [0, 2]);

describe('When two lines of a file coincide, then both layers are named', () => {
  test.each<[string, DrawingEntity, DrawingEntity]>([
    ['on another layer, from another start', square, line('B', true, [2, 2], [0, 2], [0, 0], [2, 0])],
    ['the other way round', square, line('B', true, [0, 0], [0, 2], [2, 2], [2, 0])],
    ['an open line run back', line('A', false, [0, 0], [1, 3]), line('B', false, [1, 3], [0, 0])],
    ['arcs run back', line('A', false, [0, 0, 0.5], [2, 0]), line('B', false, [2, 0, -0.5], [0, 0])],
  ])('%s', (_, a, b) => expect(findTwins([a, b], NEAR)).toEqual(['A and B']));
});

test('When two layers say one cut, then they may coincide with each other and not within themselves', () => {
  const other = line('B', true, [0, 0], [2, 0], [2, 2], [0, 2]);
  const oneCut = new Set(['A', 'B']);
  expect(findTwins([square, other], NEAR, oneCut)).toEqual([]);
  expect(findTwins([square, square], NEAR, oneCut)).toEqual(['A and A']);
  expect(findTwins([square, { ...other, layer: 'C' }], NEAR, oneCut)).toEqual(['A and C']);
});

describe('When they do not, then nothing is named', () => {
  test.each<[string, DrawingEntity, DrawingEntity]>([
    ['another place', square, line('B', true, [0, 0], [2, 0], [2, 2.001], [0, 2])],
    ['an arc in place of a line', square, line('B', true, [0, 0, 0.1], [2, 0], [2, 2], [0, 2])],
    ['an arc to the other side', line('A', false, [0, 0, 0.5], [2, 0]), line('B', false, [0, 0, -0.5], [2, 0])],
    ['open in place of closed', square, line('B', false, [0, 0], [2, 0], [2, 2], [0, 2])],
  ])('%s', (_, a, b) => expect(findTwins([a, b], NEAR)).toEqual([]));
});

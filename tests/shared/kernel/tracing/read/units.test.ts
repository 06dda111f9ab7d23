import { describe, expect, test } from 'vitest';
import type { DxfPair } from './dxf-text.ts';
import { codesOf, readEntities } from './found.ts';

// $INSUNITS 1 inches, 2 feet, 4 millimetres, 5 centimetres, 6 metres; $MEASUREMENT 0 English, 1 metric: DXF Reference, HEADER.

const read = (...header: readonly DxfPair[]) => readEntities('', {}, header);
const units = (code: string | number): DxfPair[] => [
  [9, '$INSUNITS'],
  [70, code],
];
const measurement = (code: number): DxfPair[] => [
  [9, '$MEASUREMENT'],
  [70, code],
];

describe('When a file says its unit', () => {
  test.each([
    [1, 0, 'in'],
    [4, 1, 'mm'],
  ] as const)('then $INSUNITS %d, alone or with $MEASUREMENT %d, is %s', (code, metric, unit) => {
    for (const header of [
      units(code),
      [...units(code), ...measurement(metric)],
      [...measurement(metric), ...units(code)],
    ]) {
      const found = read(...header);
      expect(found.unit).toBe(unit);
      expect(found.problems).toEqual([]);
    }
  });

  test.each([
    [1, 1],
    [4, 0],
  ])('then $INSUNITS %d with $MEASUREMENT %d is a conflict that a person decides', (code, metric) => {
    const found = read(...units(code), ...measurement(metric));
    expect(found.unit).toBeNull();
    expect(found.problems).toMatchObject([
      { code: 'unit-conflict', message: expect.stringMatching(/\$INSUNITS.*\$MEASUREMENT/) },
    ]);
  });

  test.each([
    [2, 'feet'],
    [5, 'centimetres'],
    [6, 'metres'],
    [77, '77'],
  ])('then $INSUNITS %d is not taken, and the message names %s', (code, name) => {
    const found = read(...units(code), ...measurement(1));
    expect(found.unit).toBeNull();
    expect(found.problems).toMatchObject([{ code: 'unit-not-taken', message: expect.stringContaining(name) }]);
  });

  test.each([
    ['0', units(0)],
    ['nothing', []],
    ['$MEASUREMENT alone', measurement(1)],
    ['no number', units('mm')],
  ] as const)('then with %s it is not known', (_, header) => {
    const found = read(...header);
    expect(found.unit).toBeNull();
    expect(codesOf(found)).toEqual(['unit-not-said']);
  });
});

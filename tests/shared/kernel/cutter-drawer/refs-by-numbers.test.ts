import { describe, expect, it } from 'vitest';
import { refsByNumbers } from '#shared/kernel/cutter-drawer/refs-by-numbers.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';

const frame = newFrame('in', 'Frame');
const drawn = (id: string, change: object = {}): DrawerCutter => ({
  id,
  unit: 'in',
  cutter: {
    kind: 'straight',
    name: `Cutter ${id}`,
    diameter: 0.375,
    fluteLength: 1.25,
    maxPass: 0.5,
    ...change,
  } as DrawerCutter['cutter'],
  remarks: '',
});

describe('refsByNumbers', () => {
  it('When cutters of a frame carry all numbers of one, then it is found for each, and the first of two alike', () => {
    expect(refsByNumbers(frame, [drawn('a'), drawn('b')])).toEqual({ dado: 'a', squaring: 'a', perimeter: 'a' });
  });

  it.each([{ diameter: 0.374 }, { fluteLength: 1 }, { maxPass: undefined }, { kind: 'vee', includedAngle: 30 }])(
    'When %j differs, then it is none of them',
    (change) => expect(refsByNumbers(frame, [drawn('a', change)])).toEqual({}),
  );

  it('When the frame names its cutter, then the name must agree', () => {
    const named = setField(frame, 'cutters.dado.name', 'Cutter b');
    expect(refsByNumbers(named, [drawn('a'), drawn('b')])).toMatchObject({ dado: 'b', squaring: 'a' });
  });

  it('When the drawer is in the other unit, then the converted numbers count: 3/8 in is 9.525 mm', () => {
    const metric: DrawerCutter = { ...drawn('m', { diameter: 9.525, fluteLength: 31.75, maxPass: 12.7 }), unit: 'mm' };
    expect(refsByNumbers(frame, [metric])).toEqual({ dado: 'm', squaring: 'm', perimeter: 'm' });
  });
});

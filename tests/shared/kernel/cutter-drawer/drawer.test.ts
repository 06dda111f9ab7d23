import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cutterRefs, drawerEntry } from '#shared/contracts/cutters.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import { convertCutter } from '#shared/kernel/cutter-drawer/convert-cutter.ts';
import { draftsTouched } from '#shared/kernel/cutter-drawer/drafts-touched.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { pickCutter, rolesOf } from '#shared/kernel/cutter-drawer/pick-cutter.ts';
import { refreshCutters, staleCutters } from '#shared/kernel/cutter-drawer/refresh-cutters.ts';
import { startingCutters } from '#shared/kernel/cutter-drawer/starting-cutters.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryCutter } from './arbitrary-cutter.ts';

const half: DrawerCutter = {
  id: 'c1',
  unit: 'in',
  cutter: { kind: 'straight', name: 'Straight 3/8', number: 4, diameter: 0.375, fluteLength: 1.25, maxPass: 0.5 },
  remarks: '',
};

describe('When a cutter is picked for a frame', () => {
  test('then in its own unit it is the very same', () => {
    expect(pickCutter(half, 'in')).toBe(half.cutter);
  });

  test('then in the other unit lengths are converted clean, and angles, name and number stay', () => {
    // 25.4 mm to the inch, exact by definition.
    expect(pickCutter(half, 'mm')).toEqual({
      kind: 'straight',
      name: 'Straight 3/8',
      number: 4,
      diameter: 9.525,
      fluteLength: 31.75,
      maxPass: 12.7,
    });
    const tapered: Cutter = { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 };
    expect(convertCutter(tapered, 'in', 'mm')).toEqual({
      kind: 'tapered',
      tipRadius: 1.5875,
      sideAngle: 1.5,
      fluteLength: 31.75,
    });
    expect(convertCutter({ kind: 'vee', includedAngle: 30, fluteLength: 12.7 }, 'mm', 'in')).toEqual({
      kind: 'vee',
      includedAngle: 30,
      fluteLength: 0.5,
    });
  });

  test('then any cutter has the same shape in either unit', () => {
    fc.assert(
      fc.property(arbitraryCutter, fc.double({ min: 0, max: 1, noNaN: true }), (cutter, share) => {
        const metric = convertCutter(cutter, 'in', 'mm');
        const h = cutter.fluteLength * share;
        const [inch, mm] = [radiusAtHeight(cutter, h), radiusAtHeight(metric, h * 25.4)];
        // A profile is steep where arcs stand upright: a hair’s difference in height is more across.
        expect(Math.abs(mm - inch * 25.4)).toBeLessThanOrEqual(1e-4 * (1 + Math.abs(mm)));
        const back = convertCutter(metric, 'mm', 'in');
        expect(back.fluteLength / cutter.fluteLength).toBeCloseTo(1, 10);
      }),
    );
  });

  test('then its kind says what work it can do', () => {
    expect(rolesOf({ kind: 'straight', diameter: 1, fluteLength: 1 })).toEqual([
      'dado',
      'squaring',
      'opening',
      'perimeter',
      'quirk',
    ]);
    expect(rolesOf({ kind: 'tapered', tipRadius: 1, sideAngle: 1, fluteLength: 1 })).toEqual(['opening']);
    expect(rolesOf({ kind: 'beading', profileRadius: 1, tipFlat: 0, fluteLength: 1 })).toEqual(['bead']);
    expect(rolesOf({ kind: 'vee', includedAngle: 30, fluteLength: 1 })).toEqual(['opening', 'corner']);
  });
});

describe('When a new shop’s drawer is filled', () => {
  test.each(['in', 'mm'] as const)(
    'then the set in %s is valid, its names differ, and every work has a cutter',
    (unit) => {
      const set = startingCutters(unit);
      for (const entry of set) expect(drawerEntry.parse(entry)).toEqual(entry);
      expect(new Set(set.map((e) => e.cutter.name)).size).toBe(set.length);
      expect(new Set(set.flatMap((e) => rolesOf(e.cutter)))).toEqual(
        new Set(['dado', 'squaring', 'opening', 'perimeter', 'bead', 'quirk', 'corner']),
      );
      expect(set.every((e) => e.unit === unit)).toBe(true);
    },
  );

  test.each(['in', 'mm'] as const)('then a new frame in %s can be cut with it', (unit) => {
    const frame = newFrame(unit, 'A');
    const pick = (kind: Cutter['kind'], nth: number) =>
      startingCutters(unit)
        .map((e) => e.cutter)
        .filter((c) => c.kind === kind)[nth]!;
    const straight = pick('straight', 1);
    const worked = workFrame({
      ...frame,
      cutters: { dado: straight, squaring: straight, perimeter: straight, opening: pick('tapered', 0) },
    });
    expect(worked.findings.filter((f) => f.level === 'stop')).toEqual([]);
  });

  test('then the usual sizes of the trade are in it', () => {
    // Common practice, no source: the sizes of the specification’s standing facts.
    const inch = startingCutters('in').map((e) => e.cutter);
    expect(inch).toContainEqual(expect.objectContaining({ kind: 'tapered', tipRadius: 1 / 16, sideAngle: 1.5 }));
    expect(inch).toContainEqual(expect.objectContaining({ kind: 'straight', diameter: 1 / 8 }));
    expect(inch).toContainEqual(expect.objectContaining({ kind: 'vee', includedAngle: 30 }));
  });
});

describe('When a cutter of the drawer changes', () => {
  const drafts = [
    { frameId: 'f1', cutterRefs: { dado: 'c1', perimeter: 'c1', opening: 'c2' } },
    { frameId: 'f2', cutterRefs: { opening: 'c2' } },
    { frameId: 'f3', cutterRefs: {} },
    { frameId: 'f4', cutterRefs: { squaring: 'c1' } },
  ] as const;
  const with_ = (change: Partial<DrawerCutter['cutter']>, rest: Partial<DrawerCutter> = {}): DrawerCutter => ({
    ...half,
    ...rest,
    cutter: { ...half.cutter, ...change } as DrawerCutter['cutter'],
  });

  test('then the drafts that refer to it are listed with the work it does there, and what changed', () => {
    expect(
      draftsTouched(half, with_({ diameter: 0.374, maxPass: undefined } as Partial<DrawerCutter['cutter']>), drafts),
    ).toEqual({
      changes: ['diameter', 'maxPass'],
      drafts: [
        { frameId: 'f1', roles: ['dado', 'perimeter'] },
        { frameId: 'f4', roles: ['squaring'] },
      ],
    });
  });

  test('then other remarks touch no draft', () => {
    expect(draftsTouched(half, { ...half, remarks: 'Sharpened in March' }, drafts)).toEqual({
      changes: [],
      drafts: [],
    });
  });

  test('then another unit, another place in the machine and being taken out do', () => {
    expect(draftsTouched(half, { ...half, unit: 'mm' }, drafts)).toMatchObject({
      changes: ['unit'],
      drafts: [{ frameId: 'f1' }, { frameId: 'f4' }],
    });
    expect(draftsTouched(half, with_({ number: 5 }), drafts).changes).toEqual(['number']);
    expect(draftsTouched(half, null, drafts)).toMatchObject({
      changes: ['removed'],
      drafts: [{ frameId: 'f1' }, { frameId: 'f4' }],
    });
  });

  test('then two that are not one cutter are thrown out', () => {
    expect(() => draftsTouched(half, with_({}, { id: 'c9' }), drafts)).toThrow('cutter: got c9 after c1');
  });

  test('then a draft’s own copy is stale until it is refreshed, in the draft’s unit', () => {
    const frame = newFrame('mm', 'A');
    const refs = { dado: 'c1', perimeter: 'gone' };
    expect(staleCutters(frame, refs, [half])).toEqual(['dado']);
    const fresh = refreshCutters(frame, refs, [half]);
    expect(fresh.cutters).toEqual({ ...frame.cutters, dado: pickCutter(half, 'mm') });
    expect(staleCutters(fresh, refs, [half])).toEqual([]);
    expect(refreshCutters(fresh, refs, [half])).toBe(fresh);
    expect(staleCutters(fresh, refs, [with_({ diameter: 0.5 })])).toEqual(['dado']);
  });
});

describe('When an entry of the drawer is read', () => {
  const errors = (input: unknown) => {
    const read = drawerEntry.safeParse(input);
    return read.success ? [] : fieldErrors(read.error, input).map(({ path, takes }) => ({ path, takes }));
  };

  test.each([
    ['no name', { ...half, cutter: { ...half.cutter, name: undefined } }, 'cutter.name', 'some text'],
    [
      'a pass longer than the flute',
      { ...half, cutter: { ...half.cutter, maxPass: 2 } },
      'cutter.maxPass',
      'at most the flute length, 1.25',
    ],
    ['no number', { ...half, cutter: { ...half.cutter, diameter: '3/8' } }, 'cutter.diameter', 'a length above 0'],
    ['too long a remark', { ...half, remarks: 'x'.repeat(501) }, 'remarks', 'at most 500 characters'],
  ])('then %s is refused at its field', (_what, input, path, takes) => {
    const { id: _id, ...entry } = input;
    expect(errors(entry)).toEqual([{ path, takes }]);
  });

  test('then references go by the work, and an unknown work is refused', () => {
    expect(cutterRefs.parse({ dado: 'c1' })).toEqual({ dado: 'c1' });
    expect(cutterRefs.safeParse({ drill: 'c1' }).success).toBe(false);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { box as contract } from '#shared/contracts/box.ts';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { checkBox } from '#shared/kernel/box/check-box.ts';
import { newBox } from '#shared/kernel/box/new-box.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { arbitraryBox } from './arbitrary-box.ts';

const base = newBox('in', 'Two-door base');

function errorsOf(input: unknown) {
  const read = contract.safeParse(input);
  return read.success ? [] : fieldErrors(read.error, input).map(({ path, got, takes }) => ({ path, got, takes }));
}

describe('When a box is read', () => {
  test.each(['in', 'mm'] as const)('then the one to begin from, in %s, is taken as it is', (unit) => {
    expect(contract.parse(newBox(unit, 'A'))).toEqual(newBox(unit, 'A'));
  });

  test.each([
    ['an unknown key', { ...base, colour: 'white' }, 'colour', 'only keys that the format knows'],
    ['no width', { ...base, width: undefined }, 'width', 'a length above 0'],
    ['text for a length', { ...base, ends: { thickness: '3/4' } }, 'ends.thickness', 'a length above 0'],
    ['not a number', { ...base, height: Number.NaN }, 'height', 'a length above 0'],
    ['an unknown unit', { ...base, unit: 'cm' }, 'unit', '"in" or "mm"'],
    [
      'half a partition',
      { ...base, partitions: { thickness: 0.75, places: { kind: 'equal openings', count: 1.5 } } },
      'partitions.places.count',
      'a whole number from 1 to 20',
    ],
    ['a top of no kind', { ...base, top: { thickness: 0.75, down: 0 } }, 'top.kind', '"panel" or "stretcher"'],
    ['a negative reveal', { ...base, reveal: { ...base.reveal, left: -1 } }, 'reveal.left', 'a length, 0 or more'],
  ])('then %s is refused at its field', (_what, input, path, takes) => {
    expect(errorsOf(input)).toEqual([{ path, got: expect.any(String), takes }]);
  });

  test.each([
    // Dado cutter 3/8, clearance 0.01: a panel of 0.365 at least.
    [
      'a panel thinner than its cutter',
      { ...base, bottom: { thickness: 0.25, up: 0 } },
      'bottom.thickness',
      'at least 0.365 in: its dado is cut with a cutter of 3/8 in',
    ],
    [
      'a dado deeper than two thirds',
      { ...base, dado: { ...base.dado, depth: 0.51 } },
      'dado.depth',
      'at most 1/2 in: two thirds of the frame’s 3/4 in',
    ],
    [
      'too much clearance',
      { ...base, dado: { ...base.dado, clearance: 0.1 } },
      'dado.clearance',
      'at most 1/16 in: more does not hold the panel',
    ],
    [
      'an end that misses the frame',
      { ...base, overhang: { ...base.overhang, left: -0.5 } },
      'overhang.left',
      'at least -3/8 in: half of the end must plug into the frame',
    ],
    [
      'a bottom below the frame',
      { ...base, overhang: { ...base.overhang, bottom: -4 }, height: 34 },
      'bottom.up',
      'at least 4 in: the bottom must lie behind the frame',
    ],
    [
      'a bottom below the feet',
      { ...base, feet: 4 },
      'bottom.up',
      'at least 3 1/2 in: the bottom must lie above the feet',
    ],
    [
      'a top above the frame',
      { ...base, top: { kind: 'panel', thickness: 0.75, down: 0 }, overhang: { ...base.overhang, top: -1 } },
      'top.down',
      'at least 1 in: the top must lie behind the frame',
    ],
    [
      'no top and no rail',
      { ...base, reveal: { ...base.reveal, top: 0 } },
      'reveal.top',
      'at least 1/2 in: the top rail would be too narrow',
    ],
    // Members 1 3/4 + 1 1/2 + 1 3/4 and two openings of 1 make a frame of 7, a box of 6 1/2.
    ['a box too narrow', { ...base, width: 6 }, 'width', 'at least 6 1/2 in: each opening needs 1 in'],
    // Rails 1 3/4 and 1 1/4 and an opening of 1 make a frame of 4, a box of 3 1/2.
    ['a box too low', { ...base, height: 3 }, 'height', 'at least 3 1/2 in: the opening needs 1 in'],
    // A sheet of 49 × 97 less 2 1/2 for allowance and trim less 1/2 of overhang: 46 high or 94 wide.
    ['a box too wide', { ...base, width: 95 }, 'width', 'at most 94 in: the frame’s blank must come out of a sheet'],
    // The first opening runs from 1 3/4; its mid-stile begins 3/8 before the partition, so the partition’s face is 3 1/8 in frame view at least.
    [
      'a partition too far left',
      { ...base, partitions: { thickness: 0.75, places: { kind: 'given', at: [2] } } },
      'partitions.places.at.0',
      'at least 2 7/8 in: the opening beside it needs 1 in',
    ],
    [
      'a partition too far right',
      { ...base, partitions: { thickness: 0.75, places: { kind: 'given', at: [10, 29.5] } } },
      'partitions.places.at.1',
      'at most 28 7/8 in: the opening beside it needs 1 in',
    ],
    ['too deep a letting in', { ...base, letIn: 0.6 }, 'letIn', 'at most 1/2 in: two thirds of the end'],
  ])('then %s is refused with the bound it breaks', (_what, input, path, takes) => {
    expect(errorsOf(input)).toEqual([{ path, got: expect.any(String), takes }]);
  });

  test('then the bound it names is one that it takes', () => {
    expect(errorsOf({ ...base, width: 6.5 })).toEqual([]);
    expect(errorsOf({ ...base, width: 94 })).toEqual([]);
    expect(errorsOf({ ...base, overhang: { ...base.overhang, left: -0.375 } })).toEqual([]);
    expect(errorsOf({ ...base, partitions: { thickness: 0.75, places: { kind: 'given', at: [2.875] } } })).toEqual([]);
  });

  test('then most boxes of the properties are taken, and refused ones say why', () => {
    const taken = fc.sample(arbitraryBox, { seed: 7, numRuns: 200 }).filter((box) => {
      const problems = checkBox(box, newFrame(box.unit, box.name));
      for (const { field, got, takes } of problems) expect([field, got, takes].every((text) => text !== '')).toBe(true);
      return problems.length === 0;
    });
    expect(taken.length).toBeGreaterThan(50);
  });
});

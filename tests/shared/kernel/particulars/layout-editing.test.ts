import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { addPart } from '#shared/kernel/particulars/add-part.ts';
import {
  childrenOf,
  everyPart,
  openingParts,
  partAt,
  partField,
  replacePart,
} from '#shared/kernel/particulars/layout-parts.ts';
import { nextLabel } from '#shared/kernel/particulars/next-label.ts';
import type { LayoutPart } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { removePart } from '#shared/kernel/particulars/remove-part.ts';
import { splitPart } from '#shared/kernel/particulars/split-part.ts';
import { exampleFrame } from './example-frame.ts';

const layout: LayoutPart = {
  columns: [
    { opening: { label: 'A', arch: 1.5 }, size: 12 },
    { rows: [{ opening: { label: 'B' } }, { opening: { label: 'C' } }], between: 1.25 },
  ],
  between: 1.5,
};

describe('splitPart', () => {
  test('When an opening of fixed size is split into rows, then the two share that size and the arch stays at the top', () => {
    expect(partAt(splitPart(layout, [0], 'rows', 2), [0])).toEqual({
      rows: [{ opening: { label: 'A', arch: 1.5 } }, { opening: { label: 'D' } }],
      between: 2,
      size: 12,
    });
  });

  test('When an arched opening is split into columns, then both heads are arched', () => {
    expect(childrenOf(partAt(splitPart(layout, [0], 'columns', 2), [0]))).toEqual([
      { opening: { label: 'A', arch: 1.5 } },
      { opening: { label: 'D', arch: 1.5 } },
    ]);
  });

  test('When a divided part is split, then it stands whole in the first half', () => {
    expect(partAt(splitPart(layout, [1], 'columns', 2), [1, 0])).toEqual(partAt(layout, [1]));
  });
});

describe('addPart', () => {
  test('When an opening is added to rows, then it comes last with the next free label', () => {
    expect(openingParts(addPart(layout, [1])).map((p) => p.opening.label)).toEqual(['A', 'B', 'C', 'D']);
  });

  test('When it is asked of an opening, then it throws', () => {
    expect(() => addPart(layout, [0])).toThrow('no parts');
  });
});

describe('removePart', () => {
  test('When one of two is removed, then the other takes the place and size of the divided part', () => {
    const sized = replacePart(layout, [1], { ...partAt(layout, [1]), size: 9 });
    expect(partAt(removePart(sized, [1, 0]), [1])).toEqual({ opening: { label: 'C' }, size: 9 });
  });

  test('When a size would then be wanted of a part that has none, then none is left behind', () => {
    expect(removePart(layout, [1])).toEqual({ opening: { label: 'A', arch: 1.5 } });
  });

  test('When only parts with fixed sizes are left, then the last of them is freed', () => {
    const three: LayoutPart = {
      columns: [{ opening: {}, size: 5 }, { opening: {}, size: 6 }, { opening: {} }],
      between: 1,
    };
    expect(removePart(three, [2])).toEqual({ columns: [{ opening: {}, size: 5 }, { opening: {} }], between: 1 });
  });

  test('When the whole layout is to be removed, then it throws', () => {
    expect(() => removePart(layout, [])).toThrow('whole layout');
  });
});

describe('any layout', () => {
  const part: fc.Arbitrary<LayoutPart> = fc.letrec<{ part: LayoutPart }>((tie) => {
    const children = fc.array(tie('part'), { minLength: 2, maxLength: 3 });
    const size = fc.option(fc.double({ min: 1, max: 20, noNaN: true }), { nil: undefined });
    return {
      part: fc.oneof(
        { maxDepth: 3 },
        fc.constant<LayoutPart>({ opening: {} }),
        fc.record(
          { columns: children, between: fc.constant(1.5), size },
          { requiredKeys: ['columns', 'between'] },
        ) as fc.Arbitrary<LayoutPart>,
        fc.record(
          { rows: children, between: fc.constant(1.5), size },
          { requiredKeys: ['rows', 'between'] },
        ) as fc.Arbitrary<LayoutPart>,
      ),
    };
  }).part;

  test('When any part is split and its new half removed again, then the layout is what it was', () => {
    fc.assert(
      fc.property(part, fc.nat(), fc.constantFrom('columns' as const, 'rows' as const), (layout, n, into) => {
        const parts = everyPart(layout);
        const { path } = parts[n % parts.length]!;
        const split = splitPart(layout, path, into, 2);
        expect(openingParts(split).length).toBe(openingParts(layout).length + 1);
        expect(removePart(split, [...path, 1])).toEqual(layout);
      }),
    );
  });

  test('When a path is written as a field, then that field of the particulars holds the part', () => {
    fc.assert(
      fc.property(part, (layout) => {
        if (exampleFrame.outline.kind !== 'members') throw new Error('the example has members');
        const particulars = { ...exampleFrame, outline: { ...exampleFrame.outline, layout } };
        for (const { path, part } of everyPart(layout))
          expect(readField(particulars, partField(layout, path))).toBe(part);
      }),
    );
  });
});

test('When A to Z are taken, then the next label is AA', () => {
  const columns = Array.from({ length: 26 }, (_, i): LayoutPart => ({
    opening: { label: String.fromCharCode(65 + i) },
  }));
  expect(nextLabel({ columns, between: 1 })).toBe('AA');
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Box } from '#shared/kernel/box/box.ts';
import type { BoxPart } from '#shared/kernel/box/box-part.ts';
import { checkBox } from '#shared/kernel/box/check-box.ts';
import { frameFromBox } from '#shared/kernel/box/frame-from-box.ts';
import { givenOfBox } from '#shared/kernel/box/given-of-box.ts';
import { listBoxParts } from '#shared/kernel/box/list-box-parts.ts';
import { newBox } from '#shared/kernel/box/new-box.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { arbitraryBox } from './arbitrary-box.ts';

const acceptable = arbitraryBox.filter((box) => checkBox(box, newFrame(box.unit, box.name)).length === 0);

function partsOf(box: Box): BoxPart[] {
  const made = frameFromBox(box);
  if (!made.ok) throw new Error(JSON.stringify(made.problems));
  return listBoxParts(made.particulars, givenOfBox(box));
}

/** The cut list from the box itself, as a person would work it out with no frame at hand. */
function sawn(box: Box): { part: string; thickness: number; length: number; width: number | undefined }[] {
  const { width, height, depth, ends, bottom, top, partitions, dado, letIn } = box;
  const between = width - 2 * ends.thickness + 2 * letIn;
  const inside = height - (bottom.up + bottom.thickness) - (top ? top.down + top.thickness : 0);
  const deep = depth === undefined ? undefined : depth + dado.depth;
  const count = !partitions
    ? 0
    : partitions.places.kind === 'given'
      ? partitions.places.at.length
      : partitions.places.count;
  return [
    { part: 'Left end', thickness: ends.thickness, length: height, width: deep },
    { part: 'Right end', thickness: ends.thickness, length: height, width: deep },
    ...Array.from({ length: count }, (_, i) => ({
      part: count === 1 ? 'Partition' : `Partition ${i + 1}`,
      thickness: partitions!.thickness,
      length: inside + (top ? 2 : 1) * letIn,
      width: deep,
    })),
    { part: 'Bottom', thickness: bottom.thickness, length: between, width: deep },
    ...(top
      ? [
          {
            part: top.kind === 'panel' ? 'Top' : 'Stretcher',
            thickness: top.thickness,
            length: between,
            width: top.kind === 'stretcher' ? top.width + dado.depth : deep,
          },
        ]
      : []),
  ];
}

describe('When the box parts of a frame are listed', () => {
  test('then each grows by its dado’s depth on its front edge', () => {
    const box = newBox('in', 'Two-door base');
    const rows = partsOf(box);
    const row = {
      count: 1,
      thickness: 0.75,
      width: 23.5,
      growth: 0.25,
      grows: 'front edge',
      remark: 'add 1/4 in to the front-to-back size',
    };
    // Ends 30 long though their dados run out at 0 below; bottom between the ends; partition from the bottom up.
    expect(rows).toEqual([
      { ...row, part: 'Left end', length: 30, runsOut: ['bottom', 'top'] },
      { ...row, part: 'Right end', length: 30, runsOut: ['bottom', 'top'] },
      { ...row, part: 'Partition', length: 29.25, runsOut: ['top'] },
      { ...row, part: 'Bottom', length: 31, runsOut: [] },
    ]);
  });

  test('then without the box’s depth only the growth is told', () => {
    const [end] = listBoxParts(newFrame('mm', 'A'));
    expect(end).toMatchObject({
      part: 'Left end',
      width: undefined,
      growth: 6,
      remark: 'add 6 mm to the front-to-back size',
    });
  });

  test('then parts of one name and size are told together', () => {
    const frame = newFrame('in', 'A');
    const shelf = { ...frame.dados[3]!, part: 'Shelf' };
    const parts = listBoxParts({ ...frame, dados: [shelf, { ...shelf, at: 12 }, { ...shelf, at: 20, to: 16 }] });
    expect(parts.map(({ part, count, length }) => ({ part, count, length }))).toEqual([
      { part: 'Shelf', count: 2, length: 31 },
      { part: 'Shelf', count: 1, length: 15 },
    ]);
  });

  test('then a traced outline serves as well', () => {
    const frame = newFrame('in', 'A');
    const perimeter = [
      [5, 5],
      [38, 5],
      [38, 35.5],
      [5, 35.5],
    ] as const;
    expect(listBoxParts({ ...frame, outline: { kind: 'traced', perimeter, openings: [] } })).toEqual(
      listBoxParts(frame),
    );
  });

  test('then a part named like a property of objects has no width of its own', () => {
    const frame = newFrame('in', 'A');
    const [part] = listBoxParts(
      { ...frame, dados: [{ ...frame.dados[0]!, part: 'constructor' }] },
      { widths: { Stretcher: 4 } },
    );
    expect(part).toMatchObject({ part: 'constructor', width: undefined });
  });

  test('then none come of a frame without dados', () => {
    expect(listBoxParts({ ...newFrame('in', 'A'), dados: [] })).toEqual([]);
  });
});

describe('When any box goes to its frame and back', () => {
  test('then the cut list is the one worked out from the box alone', () => {
    fc.assert(
      fc.property(acceptable, (box) => {
        const got = partsOf(box);
        const wanted = sawn(box);
        expect(got.map((row) => row.part)).toEqual(wanted.map((row) => row.part));
        got.forEach((row, i) => {
          expect(row.length).toBeCloseTo(wanted[i]!.length, 8);
          expect(row.thickness).toBe(wanted[i]!.thickness);
          expect(row.growth).toBe(box.dado.depth);
          if (wanted[i]!.width === undefined) expect(row.width).toBeUndefined();
          else expect(row.width).toBeCloseTo(wanted[i]!.width!, 8);
        });
      }),
      { numRuns: 120 },
    );
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import type { Box } from '#shared/kernel/box/box.ts';
import { checkBox } from '#shared/kernel/box/check-box.ts';
import { frameFromBox } from '#shared/kernel/box/frame-from-box.ts';
import { layOutBox } from '#shared/kernel/box/lay-out-box.ts';
import { newBox } from '#shared/kernel/box/new-box.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryBox } from './arbitrary-box.ts';

const base = newBox('in', 'Two-door base');
const boxWith = (changes: Partial<Box>): Box => ({ ...base, ...changes });

function frameOf(box: Box): Particulars {
  const made = frameFromBox(box);
  if (!made.ok) throw new Error(JSON.stringify(made.problems));
  return made.particulars;
}
const partOf = (p: Particulars, part: string) => p.dados.find((dado) => dado.part === part);
const acceptable = arbitraryBox.filter((box) => checkBox(box, newFrame(box.unit, box.name)).length === 0);

describe('When the frame of a box is made', () => {
  test('then the box behind the worked example gives the worked example, dado by dado', () => {
    // The worked example of the specification: 33 × 30 1/2 before a box of 32 1/2, its bottom 1/2 above the frame’s lower edge.
    const p = frameOf(base);
    const plug = { panel: 0.75, clearance: 0.01, depth: 0.25 };
    expect(p.outline).toEqual({
      kind: 'members',
      width: 33,
      height: 30.5,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.25 },
      feet: 0,
      layout: { columns: [{ opening: { label: 'A' } }, { opening: { label: 'B' } }], between: 1.5 },
    });
    expect(p.dados).toEqual([
      { part: 'Left end', runs: 'vertical', at: 0.25, ...plug, from: 0, to: 30.5, ends: ['open', 'open'] },
      { part: 'Right end', runs: 'vertical', at: 32, ...plug, from: 0, to: 30.5, ends: ['open', 'open'] },
      { part: 'Partition', runs: 'vertical', at: 16.125, ...plug, from: 1.25, to: 30.5, ends: ['meets', 'open'] },
      { part: 'Bottom', runs: 'horizontal', at: 0.5, ...plug, from: 1, to: 32, ends: ['meets', 'meets'] },
    ]);
  });

  test.each(['in', 'mm'] as const)(
    'then the box to begin from, in %s, is the one behind the frame to begin from',
    (unit) => {
      expect(frameOf(newBox(unit, 'A'))).toEqual(newFrame(unit, 'A'));
    },
  );

  test('then with a top, the partition ends under it and the rail covers it', () => {
    // A wall box of 30 × 36: frame flush above and below, 1/4 past each side; top rail over a 3/4 top and 3/4 past it.
    const p = frameOf(
      boxWith({
        width: 30,
        height: 36,
        overhang: { left: 0.25, right: 0.25, top: 0, bottom: 0 },
        top: { kind: 'panel', thickness: 0.75, down: 0 },
        reveal: { ...base.reveal, top: 0.75, bottom: 0.75 },
      }),
    );
    expect(p.outline).toMatchObject({ width: 30.5, height: 36, rails: { top: 1.5, bottom: 1.5 } });
    expect(partOf(p, 'Top')).toMatchObject({
      runs: 'horizontal',
      at: 35.25,
      from: 1,
      to: 29.5,
      ends: ['meets', 'meets'],
    });
    expect(partOf(p, 'Partition')).toMatchObject({ from: 0.75, to: 35.25, ends: ['meets', 'meets'] });
  });

  test('then a stretcher stands where a top would', () => {
    const p = frameOf(boxWith({ top: { kind: 'stretcher', thickness: 0.75, down: 0, width: 4 } }));
    expect(partOf(p, 'Stretcher')).toMatchObject({ runs: 'horizontal', at: 29.75, panel: 0.75, from: 1, to: 32 });
    expect(p.outline).toMatchObject({ rails: { top: 2.5 } });
  });

  test('then stopped dados end where the box does, and run out only where the frame does not stand past it', () => {
    const p = frameOf(
      boxWith({ overhang: { left: 0.25, right: 0.25, top: 0, bottom: 0.5 }, dado: { ...base.dado, run: 'stopped' } }),
    );
    expect(partOf(p, 'Left end')).toMatchObject({ from: 0.5, to: 30.5, ends: ['stopped', 'open'] });
    expect(partOf(p, 'Partition')).toMatchObject({ ends: ['meets', 'open'] });
  });

  test('then a toe kick is a negative overhang below: the ends run down past the frame to the floor', () => {
    // 34 1/2 high to the floor, the frame 30 1/2 high above a 4 in kick; bottom 4 1/2 above the floor.
    const p = frameOf(
      boxWith({ height: 34.5, overhang: { ...base.overhang, bottom: -4 }, bottom: { thickness: 0.75, up: 4.5 } }),
    );
    expect(p.outline).toMatchObject({ height: 30.5, rails: { bottom: 1.25 } });
    expect(partOf(p, 'Left end')).toMatchObject({ from: 0, ends: ['open', 'open'] });
    expect(partOf(p, 'Bottom')).toMatchObject({ at: 0.5 });
  });

  test('then given partition places give openings of fixed widths with the last one free', () => {
    // Ends 3/4, partition’s left face at 12 from the box’s left outside: its mid-stile (1 1/2) from 11.875 to 13.375 in frame view.
    const p = frameOf(boxWith({ partitions: { thickness: 0.75, places: { kind: 'given', at: [12] } } }));
    expect(partOf(p, 'Partition')).toMatchObject({ at: 12.25 });
    expect(p.outline).toMatchObject({
      layout: { columns: [{ opening: { label: 'A' }, size: 10.125 }, { opening: { label: 'B' } }] },
    });
    expect(workFrame(p).contours.openings.map((o) => o.width)).toEqual([10.125, 17.875]);
  });

  test('then equal spaces are equal inside the box, equal openings between the members', () => {
    const wide = { ...base.reveal, left: 1.5 };
    const places = (kind: 'equal spaces' | 'equal openings') => ({ thickness: 0.75, places: { kind, count: 2 } });
    const spaces = frameOf(boxWith({ reveal: wide, partitions: places('equal spaces') }));
    const faces = spaces.dados
      .filter((d) => d.runs === 'vertical')
      .map((d) => d.at)
      .sort((a, b) => a - b);
    const gaps = faces.slice(1).map((at, i) => at - faces[i]! - 0.75);
    for (const gap of gaps) expect(gap).toBeCloseTo((32.5 - 4 * 0.75) / 3, 9);
    const openings = workFrame(frameOf(boxWith({ reveal: wide, partitions: places('equal openings') }))).contours
      .openings;
    for (const { width } of openings) expect(width).toBeCloseTo((33 - 2.5 - 1.75 - 2 * 1.5) / 3, 9);
  });

  test('then the board, edge, setup and cutters are those of the frame it is based on', () => {
    const shop = {
      ...newFrame('in', 'B'),
      thickness: 1,
      setup: { ...newFrame('in', 'B').setup, flip: 'end-over-end' as const },
    };
    const made = frameFromBox(base, shop);
    expect(made).toMatchObject({
      ok: true,
      particulars: { thickness: 1, setup: shop.setup, cutters: shop.cutters, name: 'Two-door base' },
    });
  });

  test('then a base in the other unit is refused', () => {
    expect(() => frameFromBox(base, newFrame('mm', 'B'))).toThrow('base: got a frame in mm, takes one in in');
  });

  test('then a stop that only the base brings comes back as a problem', () => {
    const shop = newFrame('in', 'B');
    const made = frameFromBox(base, { ...shop, blank: { width: 20, height: 20 } });
    expect(made.ok).toBe(false);
    if (!made.ok) expect(made.problems[0]).toMatchObject({ field: '', takes: expect.stringContaining('blank') });
  });
});

describe('When any box passes its checks', () => {
  const asserted = { numRuns: 80 };

  test('then its frame is valid and has no stop, and every end of a dado finds what it meets', () => {
    fc.assert(
      fc.property(acceptable, (box) => {
        const { width, height, stiles, rails, layout, dados } = layOutBox(box);
        const p: Particulars = {
          ...newFrame(box.unit, box.name),
          outline: { kind: 'members', width, height, stiles, rails, feet: box.feet, layout },
          dados,
        };
        expect(contract.safeParse(p).error).toBeUndefined();
        const codes = workFrame(p).findings.map((f) => `${f.level} ${f.code}`);
        expect(
          codes.filter((c) => c.startsWith('stop') || c.includes('end-meets-nothing') || c.includes('open-end-inside')),
        ).toEqual([]);
      }),
      asserted,
    );
  });

  test('then the frame is as large as the box and its overhang, and each member covers its part by the reveal', () => {
    fc.assert(
      fc.property(acceptable, (box) => {
        const frame = workFrame(frameOf(box));
        const { overhang, reveal } = box;
        expect(frame.contours.width).toBeCloseTo(overhang.left + box.width + overhang.right, 8);
        expect(frame.contours.height).toBeCloseTo(overhang.bottom + box.height + overhang.top, 8);
        const uprights = frame.particulars.dados.filter((d) => d.runs === 'vertical').sort((a, b) => a.at - b.at);
        const openings = frame.contours.openings.map((o) => o.extents).sort((a, b) => a.minX - b.minX);
        expect(openings).toHaveLength(uprights.length - 1);
        openings.forEach((o, i) => {
          const [left, right] = [uprights[i]!, uprights[i + 1]!];
          expect(o.minX - (left.at + left.panel)).toBeCloseTo(i === 0 ? reveal.left : reveal.partition, 8);
          expect(right.at - o.maxX).toBeCloseTo(i === openings.length - 1 ? reveal.right : reveal.partition, 8);
          const bottom = frame.particulars.dados.find((d) => d.part === 'Bottom')!;
          expect(o.minY - (bottom.at + bottom.panel)).toBeCloseTo(reveal.bottom, 8);
          const top = frame.particulars.dados.find((d) => d.part === 'Top' || d.part === 'Stretcher');
          expect((top ? top.at : frame.contours.height - overhang.top) - o.maxY).toBeCloseTo(reveal.top, 8);
        });
      }),
      asserted,
    );
  });
});

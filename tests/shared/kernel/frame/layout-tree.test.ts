import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { LayoutPart, MembersOutline } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryFrame } from '../../../builders/arbitrary-frame.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const outline = workedExample().outline as MembersOutline;
const work = (layout: LayoutPart, changes: Partial<MembersOutline> = {}) =>
  workFrame(workedExample({ outline: { ...outline, ...changes, layout }, dados: [] }));
const boxes = (layout: LayoutPart, changes: Partial<MembersOutline> = {}) =>
  work(layout, changes).contours.openings.map((o) => o.extents);
const stops = (layout: LayoutPart, changes: Partial<MembersOutline> = {}) =>
  work(layout, changes).findings.filter((f) => f.level === 'stop');

/** The frame is 33 × 30.5 with members 1.75, 1.75, 1.75 and 1.25: 29.5 × 27.5 inside, from (1.75, 1.25). */
const INSIDE = { minX: 1.75, minY: 1.25, maxX: 31.25, maxY: 28.75 };

describe('When a layout is', () => {
  test('one opening, then it fills the inside', () => expect(boxes({ opening: {} })).toEqual([INSIDE]));

  test('columns, then they run left to right and share what is left equally', () => {
    const [a, b, c] = boxes({ columns: [{ opening: {} }, { opening: {} }, { opening: {} }], between: 1.5 });
    const each = (29.5 - 3) / 3;
    expect(a).toMatchObject({ minX: 1.75, maxX: expect.closeTo(1.75 + each, 12) });
    expect(b).toMatchObject({
      minX: expect.closeTo(1.75 + each + 1.5, 12),
      maxX: expect.closeTo(1.75 + 2 * each + 1.5, 12),
    });
    expect(c).toMatchObject({ minX: expect.closeTo(31.25 - each, 12), maxX: expect.closeTo(31.25, 12) });
  });

  test('rows, then they run top to bottom, as on screen', () => {
    const rows = work({ rows: [{ opening: { label: 'top' }, size: 5 }, { opening: { label: 'low' } }], between: 1.5 })
      .contours.openings;
    expect(rows.map((o) => o.label)).toEqual(['top', 'low']);
    expect(rows[0]!.extents).toMatchObject({ minY: expect.closeTo(23.75, 12), maxY: expect.closeTo(28.75, 12) });
    expect(rows[1]!.extents).toMatchObject({ minY: expect.closeTo(1.25, 12), maxY: expect.closeTo(22.25, 12) });
  });

  test('rows in columns, then each is divided by itself', () => {
    const [door, drawer, low] = boxes({
      columns: [
        { opening: {}, size: 10 },
        { rows: [{ opening: {}, size: 5 }, { opening: {} }], between: 1 },
      ],
      between: 1.5,
    });
    expect(door).toMatchObject({ minX: 1.75, maxX: 11.75, minY: 1.25, maxY: 28.75 });
    expect(drawer).toMatchObject({ minX: 13.25, maxX: 31.25, minY: 23.75, maxY: 28.75 });
    expect(low).toMatchObject({ minX: 13.25, maxX: 31.25, minY: 1.25, maxY: 22.75 });
  });

  test('of fixed sizes that add up, then no finding stops it', () => {
    expect(
      stops({
        columns: [
          { opening: {}, size: 10 },
          { opening: {}, size: 18 },
        ],
        between: 1.5,
      }),
    ).toEqual([]);
  });

  test.each([
    ['too small by 0.5', 17.5, 0.5],
    ['too large by 0.25', 18.25, 0.25],
    ['too large by a thousandth', 18.001, 0.001],
  ])('of fixed sizes %s, then a stop says by how much', (_, size, by) => {
    const found = stops({
      columns: [
        { opening: {}, size: 10 },
        { opening: {}, size },
      ],
      between: 1.5,
    });
    expect(found.map((f) => f.code)).toEqual(['members-do-not-add-up']);
    expect(Object.values(found[0]!.numbers).some((n) => Math.abs(Math.abs(n) - by) < 1e-9)).toBe(true);
    expect(found[0]!.field).toMatch(/^outline\.layout/);
  });

  test('so full that nothing is left for a part without a size, then that is a stop', () => {
    expect(stops({ columns: [{ opening: {}, size: 28 }, { opening: {} }], between: 1.5 }).map((f) => f.code)).toContain(
      'members-do-not-add-up',
    );
  });

  test('in a frame whose members fill it, then that is a stop and nothing throws', () => {
    expect(stops({ opening: {} }, { width: 3.5 }).map((f) => f.code)).toContain('members-do-not-add-up');
    expect(stops({ opening: {} }, { height: 2 }).map((f) => f.code)).toContain('members-do-not-add-up');
  });
});

describe('When a frame has feet', () => {
  const footed = work({ opening: {} }, { feet: 4 });

  test('then the bottom rail is raised by them and the height is still the whole', () => {
    expect(footed.contours.openings[0]!.extents).toEqual({ ...INSIDE, minY: 5.25 });
    expect(footed.contours.height).toBe(30.5);
  });

  test('then the perimeter is notched between the stiles', () => {
    const corners = footed.contours.perimeter.vertices.map((v) => `${v.x},${v.y}`).sort();
    expect(corners).toEqual(['0,0', '1.75,0', '1.75,4', '31.25,4', '31.25,0', '33,0', '33,30.5', '0,30.5'].sort());
  });
});

describe('When any frame is worked, then its members and openings fill it', () => {
  test('with nothing between them and nothing twice', () => {
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        const { contours, findings } = workFrame({ ...p, dados: [] });
        fc.pre(!findings.some((f) => f.code === 'members-do-not-add-up' || f.code === 'arc-smaller-than-cutter'));
        const { width, height, feet, stiles } = p.outline as MembersOutline;
        const area = (e: { minX: number; minY: number; maxX: number; maxY: number }) =>
          (e.maxX - e.minX) * (e.maxY - e.minY);
        const notch = (width - stiles.left - stiles.right) * feet;
        const rails = contours.members.reduce((sum, m) => sum + area(m.extents), 0);
        const openings = contours.openings.reduce((sum, o) => sum + area(o.extents), 0);
        expect(Math.abs(rails + openings + notch - width * height)).toBeLessThan(1e-6);
      }),
      { numRuns: 300 },
    );
  });
});

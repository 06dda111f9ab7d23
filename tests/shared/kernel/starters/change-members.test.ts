import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { memberChange } from '#shared/contracts/member-change.ts';
import { particulars as contract } from '#shared/contracts/particulars.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import type { LayoutPart, MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { changeManyFrames, changeMember, changeMembers } from '#shared/kernel/starters/change-members.ts';
import {
  CHANGEABLE,
  type Changeable,
  type ChangedFrame,
  type MemberChange,
} from '#shared/kernel/starters/member-change.ts';
import { STARTERS } from '#shared/kernel/starters/starters.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';

/** 33 × 30 1/2: stiles 1 3/4, rails 1 3/4 and 1 1/4, a mid-stile of 1 1/2 with a partition centred behind it, the bottom flush with its rail. */
const frame = newFrame('in', 'Two-door base');
const outline = frame.outline as MembersOutline;
const withLayout = (layout: LayoutPart): Particulars => ({ ...frame, outline: { ...outline, layout } });
const inch = (what: Changeable, to: number, from?: number): MemberChange => ({
  what,
  unit: 'in',
  to,
  ...(from === undefined ? {} : { from }),
});

function taken(result: ChangedFrame): Extract<ChangedFrame, { ok: true }> {
  if (!result.ok) throw new Error(result.why);
  return result;
}
const stops = (p: Particulars) => workFrame(p).findings.filter((f) => f.level === 'stop');

describe('When a member is changed', () => {
  test('then the frame keeps its size and the openings give the room', () => {
    const { particulars, changed } = taken(changeMember(frame, inch('left stile', 2)));
    expect(particulars.outline).toEqual({ ...outline, stiles: { left: 2, right: 1.75 } });
    expect(changed).toEqual(['left stile: 2 in, was 1 3/4 in']);
    expect(workFrame(particulars).contours.openings.map((o) => o.width)).toEqual([13.875, 13.875]);
  });

  test('then a partition centred behind a mid-stile goes along with it, and what does not stand there stays', () => {
    // Openings of 13.875: the mid-stile’s middle goes from 16.5 to 2 + 13.875 + 0.75 = 16.625, the partition by 1/8.
    const { particulars, moved, stayed } = taken(changeMember(frame, inch('left stile', 2)));
    expect(moved).toEqual([{ dado: 'dado-2', part: 'Partition', entry: 'at', was: 16.125, is: 16.25 }]);
    expect(particulars.dados).toEqual(frame.dados.with(2, { ...frame.dados[2]!, at: 16.25 }));
    expect(stayed).toEqual([]);
  });

  test('then a bottom flush with its rail goes along, and so does the partition that meets it', () => {
    const { moved } = taken(changeMember(frame, inch('bottom rail', 1.5)));
    expect(moved).toEqual([
      { dado: 'dado-2', part: 'Partition', entry: 'from', was: 1.25, is: 1.5 },
      { dado: 'dado-3', part: 'Bottom', entry: 'at', was: 0.5, is: 0.75 },
    ]);
  });

  test('then a bottom that is not flush keeps its place to the frame’s edge', () => {
    const low: Particulars = {
      ...frame,
      dados: frame.dados.map((d) =>
        d.part === 'Bottom' ? { ...d, at: 0.25 } : d.part === 'Partition' ? { ...d, from: 1 } : d,
      ),
    };
    expect(taken(changeMember(low, inch('bottom rail', 1.5))).moved).toEqual([]);
  });

  test('then feet raise the bottom rail and all that stands behind it', () => {
    const { moved, particulars } = taken(changeMember(frame, inch('feet', 4)));
    expect(moved.map(({ part, entry, is }) => [part, entry, is])).toEqual([
      ['Partition', 'from', 5.25],
      ['Bottom', 'at', 4.5],
    ]);
    expect(particulars.dados[0]).toEqual(frame.dados[0]);
  });

  test('then a shelf that meets a partition follows it with that end only', () => {
    const shelf = { ...frame.dados[3]!, part: 'Shelf', at: 14, to: 16.125 };
    const { moved } = taken(changeMember({ ...frame, dados: [...frame.dados, shelf] }, inch('right stile', 2)));
    // Middle from 16.5 to (1.75 + 31) / 2 = 16.375.
    expect(moved).toEqual([
      { dado: 'dado-2', part: 'Partition', entry: 'at', was: 16.125, is: 16 },
      { dado: 'dado-4', part: 'Shelf', entry: 'to', was: 16.125, is: 16 },
    ]);
  });

  test('then a wider mid-stile leaves a centred partition in the middle and a flush one with its side', () => {
    const wide = { ...frame, outline: { ...outline, layout: { ...outline.layout, between: 3 } as LayoutPart } };
    expect(taken(changeMember(wide, inch('mid-stiles', 2.5))).moved).toEqual([]);
    // The mid-stile stands from 15 to 18; 2 1/2 wide it begins at 15.25.
    const flush = { ...wide, dados: wide.dados.with(2, { ...wide.dados[2]!, at: 15 }) };
    expect(taken(changeMember(flush, inch('mid-stiles', 2.5))).moved).toMatchObject([
      { part: 'Partition', entry: 'at', was: 15, is: 15.25 },
    ]);
    const neither = { ...wide, dados: wide.dados.with(2, { ...wide.dados[2]!, at: 15.5 }) };
    expect(taken(changeMember(neither, inch('mid-stiles', 2.5)))).toMatchObject({
      moved: [],
      stayed: [{ dado: 'dado-2', part: 'Partition' }],
    });
  });

  test('then a partition behind two mid-stiles that part company stays and is told', () => {
    const column = (size?: number): LayoutPart => ({ opening: {}, ...(size === undefined ? {} : { size }) });
    const split = withLayout({
      rows: [
        { columns: [column(), column()], between: 1.5 },
        { columns: [column(14), column()], between: 1.5 },
      ],
      between: 1.5,
    });
    const { moved, stayed } = taken(changeMember(split, inch('right stile', 2)));
    expect(moved).toEqual([]);
    expect(stayed).toEqual([{ dado: 'dado-2', part: 'Partition' }]);
  });

  test('then fixed sizes stay and the free parts give the room', () => {
    const fixed = withLayout({ columns: [{ opening: {}, size: 10 }, { opening: {} }], between: 1.5 });
    const { particulars } = taken(changeMember(fixed, inch('mid-stiles', 2)));
    expect(workFrame(particulars).contours.openings.map((o) => o.width)).toEqual([10, 17.5]);
  });

  test('then fixed sizes that no longer add up are a refusal that says by how much', () => {
    const full = withLayout({
      columns: [
        { opening: {}, size: 14 },
        { opening: {}, size: 14 },
      ],
      between: 1.5,
    });
    expect(changeMember(full, inch('left stile', 2))).toEqual({
      ok: false,
      why: 'Columns and mid-stiles are 1/4 in too long for the width they share. Take 1/4 in off one of them, or leave one part without a size: it takes what is left.',
    });
  });

  test('then a mid-rail in every stack is changed, however deep it lies', () => {
    const [base] = STARTERS.find((s) => s.id === 'base')!.frames('in');
    const { particulars, changed } = taken(changeMember(base!, inch('mid-rails', 2)));
    expect(
      workFrame(particulars)
        .contours.members.filter((m) => m.kind === 'mid-rail')
        .map((m) => m.width),
    ).toEqual([2, 2]);
    expect(changed).toEqual(['mid-rails: 2 in, was 1 1/2 in']);
  });

  test('then clearance and depth of all dados change where they are', () => {
    const { particulars, moved } = taken(
      changeMembers(frame, [inch('dado clearance', 0.02), inch('dado depth', 0.375)]),
    );
    expect(particulars.dados).toEqual(frame.dados.map((d) => ({ ...d, clearance: 0.02, depth: 0.375 })));
    expect(moved).toEqual([]);
  });

  test('then a board too thin for its dados is a refusal', () => {
    expect(changeMember(frame, inch('thickness', 0.3))).toMatchObject({
      ok: false,
      why: expect.stringContaining('deep in a board of 0.3 in'),
    });
  });

  test('then a traced outline has no members, but a board and dados', () => {
    const traced: Particulars = {
      ...frame,
      outline: {
        kind: 'traced',
        perimeter: [
          [0, 0],
          [33, 0],
          [33, 30.5],
          [0, 30.5],
        ],
        openings: [],
      },
    };
    expect(changeMember(traced, inch('left stile', 2))).toEqual({
      ok: false,
      why: 'Its outline is traced, so it has no left stile to change.',
    });
    expect(taken(changeMember(traced, inch('thickness', 1))).particulars).toEqual({ ...traced, thickness: 1 });
  });

  test('then a change in the other unit is refused: nothing is converted on the quiet', () => {
    expect(changeMember(frame, { what: 'left stile', unit: 'mm', to: 50 })).toEqual({
      ok: false,
      why: 'The frame is in inches, the change in millimetres.',
    });
  });

  test('then what has nothing to change is told, and the frame is the very same', () => {
    expect(changeMember(frame, inch('left stile', 1.75))).toEqual({
      ok: true,
      particulars: frame,
      changed: [],
      skipped: ['left stile: 1 3/4 in already'],
      moved: [],
      stayed: [],
    });
    expect(taken(changeMember(frame, inch('mid-rails', 2))).skipped).toEqual(['mid-rails: there is none']);
    const kept = taken(changeMember(frame, inch('left stile', 2, 1.5)));
    expect(kept.skipped).toEqual(['left stile: 1 3/4 in, not 1 1/2 in']);
    expect(kept.particulars).toBe(frame);
  });

  test('then a stop that was there before does not stand in the way', () => {
    const stopped = { ...frame, dados: frame.dados.with(0, { ...frame.dados[0]!, depth: 0.6 }) };
    expect(stops(stopped)).toHaveLength(1);
    expect(changeMember(stopped, inch('top rail', 2)).ok).toBe(true);
  });

  test('then a length that is none is thrown out', () => {
    expect(() => changeMember(frame, inch('left stile', 0))).toThrow('left stile: got 0, takes a length above 0');
    expect(() => changeMember(frame, inch('feet', Number.NaN))).toThrow('feet: got NaN, takes a length, 0 or more');
  });
});

describe('When many frames are changed at once', () => {
  test('then each is answered for itself, in order', () => {
    const narrow = withLayout({
      columns: [
        { opening: {}, size: 14 },
        { opening: {}, size: 14 },
      ],
      between: 1.5,
    });
    const results = changeManyFrames(
      [
        { id: 'a', particulars: frame },
        { id: 'b', particulars: newFrame('mm', 'B') },
        { id: 'c', particulars: narrow },
      ],
      [inch('left stile', 2, 1.75)],
    );
    expect(results.map(({ id, result }) => [id, result.ok])).toEqual([
      ['a', true],
      ['b', false],
      ['c', false],
    ]);
  });
});

describe('When any starter is changed at will', () => {
  const frames = STARTERS.flatMap((s) => s.frames('in'));
  const wanted = fc
    .constantFrom(...CHANGEABLE)
    .chain((what) =>
      fc
        .integer({ min: 8, max: 48 })
        .map((n) =>
          inch(
            what,
            what === 'dado clearance'
              ? n / 1000
              : what === 'dado depth'
                ? n / 100
                : what === 'thickness'
                  ? 0.5 + n / 64
                  : n / 16,
          ),
        ),
    );

  test('then what is taken is valid, keeps its size, brings no new stop, and keeps every end of a dado where it met another', () => {
    let counted = 0;
    fc.assert(
      fc.property(fc.constantFrom(...frames), fc.array(wanted, { minLength: 1, maxLength: 3 }), (from, changes) => {
        const result = changeMembers(from, changes);
        if (!result.ok) return;
        counted += 1;
        const { particulars } = result;
        expect(contract.safeParse(particulars).error).toBeUndefined();
        expect(stops(particulars)).toEqual([]);
        const was = from.outline as MembersOutline;
        expect(particulars.outline).toMatchObject({ width: was.width, height: was.height });
        const lost = (p: Particulars) => workFrame(p).findings.filter((f) => f.code === 'end-meets-nothing').length;
        expect(lost(particulars)).toBe(lost(from));
      }),
      { numRuns: 80 },
    );
    expect(counted).toBeGreaterThan(20);
  });

  test('then changing it back gives the frame that it was, when every dado could follow', () => {
    const members: Changeable[] = ['left stile', 'right stile', 'top rail', 'bottom rail', 'mid-stiles', 'mid-rails'];
    const width: Record<string, (o: MembersOutline) => number> = {
      'left stile': (o) => o.stiles.left,
      'right stile': (o) => o.stiles.right,
      'top rail': (o) => o.rails.top,
      'bottom rail': (o) => o.rails.bottom,
      'mid-stiles': () => 1.5,
      'mid-rails': () => 1.5,
    };
    let counted = 0;
    fc.assert(
      fc.property(
        fc.constantFrom(...frames),
        fc.constantFrom(...members),
        fc.integer({ min: 25, max: 40 }),
        (from, what, n) => {
          const there = changeMember(from, inch(what, n / 16));
          if (!there.ok || there.stayed.length > 0) return;
          const back = taken(changeMember(there.particulars, inch(what, width[what]!(from.outline as MembersOutline))));
          if (back.stayed.length > 0) return;
          counted += 1;
          expect(back.particulars.outline).toEqual(from.outline);
          back.particulars.dados.forEach((dado, i) => {
            for (const entry of ['at', 'from', 'to'] as const)
              expect(dado[entry]).toBeCloseTo(from.dados[i]![entry], 9);
          });
        },
      ),
      { numRuns: 60 },
    );
    expect(counted).toBeGreaterThan(20);
  });
});

describe('When a change is read', () => {
  test.each([
    [{ what: 'left style', unit: 'in', to: 2 }, 'what', CHANGEABLE.map((what) => `"${what}"`).join(' or ')],
    [{ what: 'left stile', unit: 'in', to: 0 }, 'to', 'a length above 0'],
    [{ what: 'left stile', unit: 'in', to: '2' }, 'to', 'a length, 0 or more'],
    [{ what: 'left stile', unit: 'cm', to: 2 }, 'unit', '"in" or "mm"'],
  ])('then %j is refused at its field', (input, path, takes) => {
    const read = memberChange.safeParse(input);
    expect(read.success ? [] : fieldErrors(read.error, input)).toMatchObject([{ path, takes }]);
  });

  test('then no feet and no clearance are lengths too', () => {
    expect(memberChange.parse(inch('feet', 0))).toEqual(inch('feet', 0));
    expect(memberChange.parse(inch('dado clearance', 0))).toEqual(inch('dado clearance', 0));
  });
});

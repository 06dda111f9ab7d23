import { describe, expect, test } from 'vitest';
import type { Finding, FindingCode, FindingLevel } from '#shared/kernel/checks/finding.ts';
import type {
  Cutters,
  MembersOutline,
  Particulars,
  Setup,
  TracedVertex,
} from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';

/** Each check by a frame that it must speak of and one, as near to it as may be, of which it must not. */
interface Case {
  readonly code: FindingCode;
  readonly level: FindingLevel;
  readonly when: string;
  readonly speaks: Particulars;
  readonly silent: Particulars;
}

const base = workedExample();
const members = base.outline as MembersOutline;
const outline = (changes: Partial<MembersOutline>): Particulars =>
  workedExample({ outline: { ...members, ...changes }, dados: [] });
const setup = (changes: Partial<Setup>, more: Partial<Particulars> = {}): Particulars =>
  workedExample({ ...more, setup: { ...base.setup, ...changes } });
const cutters = (changes: Partial<Cutters>): Particulars => workedExample({ cutters: { ...base.cutters, ...changes } });
const dados = (...list: Parameters<typeof dado>[0][]): Particulars =>
  workedExample({ dados: list.map((changes) => dado(changes)) });
const box = (x: number, y: number, width: number, height: number): TracedVertex[] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
];
const traced = (perimeter: TracedVertex[], ...openings: TracedVertex[][]): Particulars =>
  workedExample({ outline: { kind: 'traced', perimeter, openings }, dados: [] });

/** Axis offset of the example's tapered cutter: ρ(0.8125) = 0.082161. */
const AXIS = 0.082161;
const straight = (diameter: number, fluteLength = 1.25) => ({ kind: 'straight', diameter, fluteLength }) as const;

const CASES: Case[] = [
  {
    code: 'members-do-not-add-up',
    level: 'stop',
    when: 'columns of 10 and 18 stand with 1.5 between in 29.5, or in a hundredth less',
    speaks: outline({
      width: 32.99,
      layout: {
        columns: [
          { opening: {}, size: 10 },
          { opening: {}, size: 18 },
        ],
        between: 1.5,
      },
    }),
    silent: outline({
      layout: {
        columns: [
          { opening: {}, size: 10 },
          { opening: {}, size: 18 },
        ],
        between: 1.5,
      },
    }),
  },
  {
    code: 'opening-smaller-than-cutter',
    level: 'stop',
    when: 'an opening is as wide as the cutter’s way, 2 × 0.082161, or a little wider',
    speaks: traced(box(0, 0, 20, 20), box(5, 5, 2 * AXIS - 0.001, 8)),
    silent: traced(box(0, 0, 20, 20), box(5, 5, 2 * AXIS + 0.002, 8)),
  },
  {
    code: 'arc-smaller-than-cutter',
    level: 'stop',
    when: 'corners are rounded by less than the axis offset, or by more',
    speaks: traced(box(0, 0, 20, 20), rounded(AXIS - 0.002)),
    silent: traced(box(0, 0, 20, 20), rounded(AXIS + 0.002)),
  },
  {
    code: 'dado-narrower-than-cutter',
    level: 'stop',
    when: 'panel and clearance are under or just the cutter’s 0.375',
    speaks: dados({ panel: 0.364, clearance: 0.01 }),
    silent: dados({ panel: 0.365, clearance: 0.01 }),
  },
  {
    code: 'dado-shorter-than-cutter',
    level: 'stop',
    when: 'a dado between two others is shorter than the cutter is wide',
    speaks: dados({ at: 10, from: 5, to: 5.374, ends: ['meets', 'meets'] }),
    silent: dados({ at: 10, from: 5, to: 5.375, ends: ['meets', 'meets'] }),
  },
  {
    code: 'dado-too-deep',
    level: 'stop',
    when: 'a dado takes more than 2/3 of 0.75, or just that',
    speaks: dados({ depth: 0.501 }),
    silent: dados({ depth: 0.5 }),
  },
  {
    code: 'offset-collapses',
    level: 'stop',
    when: 'an opening has a neck narrower than the cutter’s way, or wider',
    speaks: traced(box(0, 0, 20, 20), necked(2 * AXIS - 0.004)),
    silent: traced(box(0, 0, 20, 20), necked(2 * AXIS + 0.004)),
  },
  {
    code: 'flute-too-short',
    level: 'stop',
    when: 'the opening cutter’s flute is shorter than its 0.8125 depth, or as long',
    speaks: cutters({ opening: { ...base.cutters.opening, fluteLength: 0.8 } }),
    silent: cutters({ opening: { ...base.cutters.opening, fluteLength: 0.8125 } }),
  },
  {
    code: 'flute-too-short',
    level: 'stop',
    when: 'the perimeter cutter’s flute is shorter than thickness and spoilboard, 0.77, or as long',
    speaks: cutters({ perimeter: straight(0.375, 0.769) }),
    silent: cutters({ perimeter: straight(0.375, 0.77) }),
  },
  {
    code: 'cutter-unfit',
    level: 'stop',
    when: 'a V-cutter is to cut dados, or a straight one',
    speaks: cutters({ dado: { kind: 'vee', includedAngle: 60, fluteLength: 1 } }),
    silent: cutters({ dado: straight(0.25) }),
  },
  {
    code: 'frame-over-blank',
    level: 'stop',
    when: 'the given board has no room for frame, allowance and trim on the pins’ sides: 33 + 1 + 0.25',
    speaks: workedExample({ blank: { width: 34.2, height: 33 } }),
    silent: workedExample({ blank: { width: 35.5, height: 33 } }),
  },
  {
    code: 'blank-over-sheet',
    level: 'stop',
    when: 'the blank is wider than the sheet’s 49, or as wide (common practice, no source)',
    speaks: outline({ width: 60, height: 46.6 }),
    silent: outline({ width: 60, height: 46.5 }),
  },
  {
    code: 'blank-over-sheet',
    level: 'stop',
    when: 'the blank is longer than the sheet’s 97, or as long',
    speaks: outline({ width: 94.6, height: 30 }),
    silent: outline({ width: 94.5, height: 30 }),
  },
  {
    code: 'outline-crosses-itself',
    level: 'stop',
    when: 'a traced opening is a bow, or the same four corners in order',
    speaks: traced(box(0, 0, 20, 20), [
      [5, 5],
      [10, 10],
      [10, 5],
      [5, 10],
    ]),
    silent: traced(box(0, 0, 20, 20), box(5, 5, 5, 5)),
  },
  {
    code: 'opening-outside-perimeter',
    level: 'stop',
    when: 'a traced opening reaches over the perimeter, or stays within',
    speaks: traced(box(0, 0, 20, 20), box(15, 5, 5.01, 5)),
    silent: traced(box(0, 0, 20, 20), box(15, 5, 4.99, 5)),
  },
  {
    code: 'openings-overlap',
    level: 'stop',
    when: 'two traced openings lie over one another, or apart',
    speaks: traced(box(0, 0, 20, 20), box(3, 3, 5, 5), box(7.99, 3, 5, 5)),
    silent: traced(box(0, 0, 20, 20), box(3, 3, 5, 5), box(8.01, 3, 5, 5)),
  },
  {
    code: 'openings-overlap',
    level: 'stop',
    when: 'one traced opening lies within another, or beside it',
    speaks: traced(box(0, 0, 20, 20), box(3, 3, 8, 8), box(5, 5, 2, 2)),
    silent: traced(box(0, 0, 20, 20), box(3, 3, 8, 8), box(13, 5, 2, 2)),
  },
  {
    code: 'thin-wall',
    level: 'caution',
    when: 'less than 1/8 is left between a dado and an opening at x 1.75, or just that',
    speaks: dados({ at: 0.871, clearance: 0.01 }),
    silent: dados({ at: 0.869, clearance: 0.01 }),
  },
  {
    code: 'thin-wall',
    level: 'caution',
    when: 'less than 1/8 is left between a dado and the frame’s edge, or just that',
    speaks: dados({ at: 0.129 }),
    silent: dados({ at: 0.131 }),
  },
  {
    code: 'thin-wall',
    level: 'caution',
    when: 'less than 1/8 is left between two dados, or just that',
    speaks: wide({ at: 3 }, { at: 3.883 }),
    silent: wide({ at: 3 }, { at: 3.887 }),
  },
  {
    code: 'slender-member',
    level: 'caution',
    when: 'a stile over 24 long is under 1 1/4 wide, or just that (common practice, no source)',
    speaks: outline({ stiles: { left: 1.24, right: 1.75 } }),
    silent: outline({ stiles: { left: 1.25, right: 1.75 } }),
  },
  {
    code: 'slender-member',
    level: 'caution',
    when: 'a narrow mid-stile is longer than 24, or just that',
    speaks: outline({ height: 27.1, layout: { columns: [{ opening: {} }, { opening: {} }], between: 1 } }),
    silent: outline({ height: 27, layout: { columns: [{ opening: {} }, { opening: {} }], between: 1 } }),
  },
  {
    code: 'small-allowance',
    level: 'caution',
    when: 'the allowance is under the perimeter cutter’s 0.375 and 1/8, or just that',
    speaks: setup({ allowance: 0.499 }),
    silent: setup({ allowance: 0.5 }),
  },
  {
    code: 'tight-clearance',
    level: 'caution',
    when: 'a clearance is less than the board’s tolerance of 0.005 (ANSI A208.2, from memory), or just that',
    speaks: dados({ clearance: 0.004 }),
    silent: dados({ clearance: 0.005 }),
  },
];

/** A square opening of 8 with corners rounded by quarter circles; a quarter's bulge is tan(90°/4). */
function rounded(radius: number): TracedVertex[] {
  const q = Math.tan(Math.PI / 8);
  return [
    [5 + radius, 5],
    [13 - radius, 5, q],
    [13, 5 + radius],
    [13, 13 - radius, q],
    [13 - radius, 13],
    [5 + radius, 13, q],
    [5, 13 - radius],
    [5, 5 + radius, q],
  ];
}

/** Two rooms of 4 × 6 joined by a neck of the given width. */
function necked(width: number): TracedVertex[] {
  const [low, high] = [8 - width / 2, 8 + width / 2];
  return [
    [3, 5],
    [7, 5],
    [7, low],
    [11, low],
    [11, 5],
    [15, 5],
    [15, 11],
    [11, 11],
    [11, high],
    [7, high],
    [7, 11],
    [3, 11],
  ];
}

/** Dados in a frame with stiles wide enough for several. */
function wide(...list: Parameters<typeof dado>[0][]): Particulars {
  return workedExample({
    outline: { ...members, stiles: { left: 8, right: 1.75 } },
    dados: list.map((changes) => dado(changes)),
  });
}

const found = (p: Particulars, code: FindingCode): Finding[] =>
  workFrame(p).findings.filter((finding) => finding.code === code);

describe.each(CASES)('When $when: $code', ({ code, level, speaks, silent }) => {
  test(`then the one is a ${level} with its place, its numbers and what to change`, () => {
    const [finding] = found(speaks, code);
    expect(finding, JSON.stringify(workFrame(speaks).findings.map((f) => f.code))).toBeDefined();
    expect(finding!.level).toBe(level);
    expect(finding!.places.length).toBeGreaterThan(0);
    expect(finding!.text).toMatch(/\.$/);
    expect(finding!.remedy).toMatch(/\.$/);
    expect(Object.values(finding!.numbers).every(Number.isFinite)).toBe(true);
  });

  test('then the other is not spoken of', () => {
    expect(found(silent, code)).toEqual([]);
  });
});

describe('When a frame is sound', () => {
  const { findings } = workFrame(workedExample());

  test('then stops come first, then cautions, then notes', () => {
    const order = ['stop', 'caution', 'note'];
    const ranks = findings.map((finding) => order.indexOf(finding.level));
    expect(ranks).toEqual([...ranks].sort());
  });

  test('then it is noted which edge is entered and by how much the other is smaller', () => {
    const note = findings.find((finding) => finding.code === 'size-held');
    expect(note?.level).toBe('note');
    // Thickness · tan 1.5°: 0.019639 a side.
    expect(Object.values(note!.numbers).some((n) => Math.abs(Math.abs(n) - 0.019639) < 5e-7)).toBe(true);
  });

  test('then what is left in the corners is noted', () => {
    expect(findings.find((finding) => finding.code === 'corner-residue')?.level).toBe('note');
  });

  test('then the offcuts that come free are noted with their size', () => {
    const note = findings.find((finding) => finding.code === 'offcut-free');
    expect(note?.level).toBe('note');
    // 14 × 27.5 less the cutter's way on both sides: axis offset 0.082161 and the radius at the back, ρ(0.0625) = 0.062521.
    const kerf = 2 * (0.082161 + 0.062521);
    expect(note!.numbers['width']).toBeCloseTo(14 - kerf, 5);
    expect(note!.numbers['height']).toBeCloseTo(27.5 - kerf, 5);
  });
});

describe('When every check is listed', () => {
  test('then each of a square-edged frame is held against a frame that sets it off', () => {
    const tried = new Set(CASES.map((c) => c.code));
    const named: FindingCode[] = ['dado-outside-frame', 'open-end-inside', 'end-meets-nothing'];
    const [outside, inside, nothing] = [
      dados({ at: 40 }),
      dados({ from: 5, to: 20 }),
      dados({ from: 5, to: 20, ends: ['meets', 'meets'] }),
    ];
    expect([outside, inside, nothing].map((p, i) => found(p, named[i]!).length)).toEqual([1, 2, 2]);
    expect(named.map((code) => found(workedExample(), code).length)).toEqual([0, 0, 0]);
    expect(tried.size).toBeGreaterThanOrEqual(18);
  });
});

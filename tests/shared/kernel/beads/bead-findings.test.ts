import { describe, expect, test } from 'vitest';
import type { Finding, FindingCode, FindingLevel } from '#shared/kernel/checks/finding.ts';
import type { Bead, BeadedEdge, Cutters, MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { beadCutterSet, beadedExample } from '../../../builders/beaded-example.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';

/** Each check of a beaded edge by a frame that it must speak of and one, as near to it as may be, of which it must not. */
interface Case {
  readonly code: FindingCode;
  readonly level: FindingLevel;
  readonly when: string;
  readonly speaks: Particulars;
  readonly silent: Particulars;
}

const base = beadedExample({ dados: [] });
const members = base.outline as MembersOutline;
const bead = (changes: Partial<Bead>, more: Partial<Particulars> = {}): Particulars => {
  const entered: Bead = { radius: 3 / 32, drop: 0.01, quirk: 0.125, ...changes };
  return { ...base, ...more, edge: { style: 'beaded', bead: entered } satisfies BeadedEdge };
};
const cutters = (changes: Partial<Cutters>, p = base): Particulars => ({ ...p, cutters: { ...p.cutters, ...changes } });
const between = (width: number): Particulars => ({
  ...base,
  outline: { ...members, layout: { columns: [{ opening: {} }, { opening: {} }], between: width } },
});
const arched = (arch: number, width: number): Particulars => ({
  ...base,
  outline: { ...members, width, layout: { opening: { arch } } },
});

const CASES: Case[] = [
  {
    code: 'cutter-unfit',
    level: 'stop',
    when: 'there is no beading cutter, or there is',
    speaks: cutters({ bead: undefined }),
    silent: base,
  },
  {
    code: 'bead-cutter-differs',
    level: 'stop',
    when: 'the beading cutter has another radius than the bead, or the same',
    speaks: bead({ radius: 0.094, quirk: 0.13 }),
    silent: base,
  },
  {
    code: 'quirk-narrower-than-cutter',
    level: 'stop',
    when: 'the quirk is under, or just, its cutter’s 1/8',
    speaks: bead({ quirk: 0.1249 }),
    silent: bead({ quirk: 0.125 }),
  },
  {
    code: 'vee-over-bead',
    level: 'stop',
    when: 'the V is wider at the face than the quirk: 2 · 0.10375 · tan(β/2) against 1/8, β 63° and 62°',
    speaks: cutters({ corner: { kind: 'vee', includedAngle: 63, fluteLength: 1 } }),
    silent: cutters({ corner: { kind: 'vee', includedAngle: 62, fluteLength: 1 } }),
  },
  {
    code: 'quirk-scar',
    level: 'caution',
    when: 'q is under t + R = 1/8, or just that',
    speaks: cutters({ bead: { ...beadCutterSet.bead, tipFlat: 1 / 32 + 0.001 } as Cutters['bead'] }),
    silent: base,
  },
  {
    code: 'no-face-between',
    level: 'stop',
    when: 'two beads with quirks of 5/16 share a mid-stile of 0.62, or 0.63',
    speaks: between(0.62),
    silent: between(0.63),
  },
  {
    code: 'bead-too-deep',
    level: 'stop',
    when: 'bead and drop go deeper than 2/3 of 0.75, or just that',
    speaks: bead({ drop: 0.5 - 3 / 32 + 0.001 }),
    silent: bead({ drop: 0.5 - 3 / 32 }),
  },
  {
    code: 'thin-under-bead',
    level: 'caution',
    // 0.75 − 0.10375 − 0.25 = 0.39625 of board: deepen the dado until 1/4 is left.
    when: 'a dado under the bead leaves less than 1/4 of board, or just that',
    speaks: { ...base, dados: [dado({ at: 0.9, depth: 0.39626 })] },
    silent: { ...base, dados: [dado({ at: 0.9, depth: 0.39625 })] },
  },
  {
    code: 'bead-shaved',
    level: 'caution',
    when: 'the opening cutter’s flank leans 20° into the bead, or 1.5°',
    speaks: cutters({ opening: { kind: 'tapered', tipRadius: 0.0625, sideAngle: 20, fluteLength: 1.25 } }),
    silent: base,
  },
  {
    code: 'bead-collapses',
    level: 'stop',
    // An arc of radius R that the opening goes around is used up by an outward offset of R: quirk's outer wall 5/16.
    when: 'an L-shaped opening’s outside corner is rounded by 0.3, or 0.35, against an offset of 5/16',
    speaks: roundedL(0.3),
    silent: roundedL(0.35),
  },
];

/** A traced L-shaped opening whose one reflex corner is a quarter circle, tan(90°/4) = 0.41421356. */
function roundedL(radius: number): Particulars {
  return {
    ...base,
    outline: {
      kind: 'traced',
      perimeter: [
        [-10, -10],
        [20, -10],
        [20, 20],
        [-10, 20],
      ],
      openings: [
        [
          [0, 0],
          [10, 0],
          [10, 5],
          [5 + radius, 5, -Math.tan(Math.PI / 8)],
          [5, 5 + radius],
          [5, 10],
          [0, 10],
        ],
      ],
    },
  };
}

const found = (p: Particulars, code: FindingCode): Finding[] => workFrame(p).findings.filter((f) => f.code === code);

describe.each(CASES)('When $when, then $code', ({ code, level, speaks, silent }) => {
  test('speaks of the first', () => {
    const [finding] = found(speaks, code);
    expect(finding).toBeDefined();
    expect(finding!.level).toBe(level);
    expect(finding!.remedy).not.toBe('');
    expect(finding!.places.length).toBeGreaterThan(0);
  });

  test('is silent about the second', () => {
    expect(found(silent, code)).toEqual([]);
  });
});

test('When edges are square, then nothing is said of beads', () => {
  const codes = workFrame(workedExample()).findings.map((f) => f.code);
  expect(codes.filter((c) => c.includes('bead') || c.includes('quirk'))).toEqual([]);
});

test('When the arch of an opening is tight but the bead has room, then no stop is found', () => {
  expect(workFrame(arched(4, 12)).findings.filter((f) => f.level === 'stop')).toEqual([]);
});

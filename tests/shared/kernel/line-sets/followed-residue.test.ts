import { describe, expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import type { CornerMethod } from '#shared/kernel/particulars/particulars.ts';
import { cornerSituation } from '#shared/kernel/section/corner-picture.ts';
import { cornerSlices } from '#shared/kernel/section/corner-view.ts';
import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const VEE: Cutter = { kind: 'vee', includedAngle: 30, fluteLength: 0.5 };

/** The same frame, square or beaded, with a V-cutter whose flute is shorter than the board is thick. */
const frames = (method: CornerMethod) => {
  const square = workedExample();
  const beaded = beadedExample();
  return [
    { ...square, edge: { ...square.edge, corners: method }, cutters: { ...square.cutters, corner: VEE } },
    { ...beaded, edge: { ...beaded.edge, corners: method }, cutters: { ...beaded.cutters, corner: VEE } },
  ];
};

describe('When a V-cutter follows into the corners', () => {
  test.each(frames('vee').map((p) => [p.edge.style, p] as const))(
    'then what is said to be left (%s) is what the view into the corner shows, at each depth',
    (_, p) => {
      const [residue] = workFrame(p).residues;
      const slices = cornerSlices(cornerSituation(p, 'vee', residue!.angle), p.thickness);
      residue!.levels.forEach(({ depth, followed }, i) => {
        expect(depth).toBe(slices[i]!.depth);
        expect(Math.abs(followed! - slices[i]!.diagonal)).toBeLessThan(2e-5);
      });
    },
  );

  test('then a V of 30° leaves z·tan 15°·√2 on the diagonal near the face, and nothing at it', () => {
    const p = { ...frames('vee')[0]!, thickness: 0.2 };
    const [face, quarter] = workFrame(p).residues[0]!.levels;
    expect(face!.followed).toBe(0);
    // Beside it the opening's flank stands in by tan 1.5° a side: the corner itself moves along the diagonal.
    const z = quarter!.depth;
    const flank = z * Math.tan((1.5 * Math.PI) / 180);
    expect(quarter!.followed).toBeCloseTo((z * Math.tan(Math.PI / 12) - flank) * Math.SQRT2, 9);
  });

  test('then the note and the setup sheet say that, and without it they say what the lift leaves', () => {
    const noteOf = (method: CornerMethod) =>
      workFrame(frames(method)[0]!).findings.find(({ code }) => code === 'corner-residue')!.text;
    expect(noteOf('vee')).toContain('nothing is left on the diagonal at the face');
    const headings = (method: CornerMethod) => {
      const sheet = describeSheet(workFrame(frames(method)[0]!), {
        shopName: 'Shop',
        jobName: 'Job',
        author: 'Author',
        revision: 'A',
        releasedAt: '2026-05-04T10:00:00.000Z',
        note: '',
        proof: null,
        profile: BUILTIN_PROFILES[0]!.profile,
      });
      return JSON.stringify(sheet);
    };
    expect(headings('vee')).toContain('After the V: diagonal');
    expect(headings('lift')).not.toContain('After the V: diagonal');
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareFrames } from '#shared/kernel/compare/compare-frames.ts';
import type { Comparison, FeatureChange } from '#shared/kernel/compare/comparison.ts';
import { sayFeature, sayLine, settingLine } from '#shared/kernel/compare/say-change.ts';
import { drawFrame } from '#shared/kernel/draw-frame.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import type { MembersOutline, Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { arbitraryFrame } from '../../../builders/arbitrary-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';

const compare = (a: Particulars, b: Particulars): Comparison => compareFrames(drawFrame(a), drawFrame(b));
const features = (c: Comparison) => c.features.map((change) => sayFeature(change, c.unit));
const settings = (c: Comparison) => c.settings.map((s) => `${s.subject}: ${sayLine(settingLine(s, c.unit))}`);
const base = workedExample();
const outline = base.outline as MembersOutline;
const withOutline = (changes: Partial<MembersOutline>) => workedExample({ outline: { ...outline, ...changes } });

/** The worked example's numbers in millimetres: an inch is 25.4 mm exactly. */
function inMillimetres(p: Particulars): Particulars {
  const lengths = (value: unknown): unknown =>
    typeof value === 'number'
      ? value * 25.4
      : Array.isArray(value)
        ? value.map(lengths)
        : value !== null && typeof value === 'object'
          ? Object.fromEntries(Object.entries(value).map(([k, v]) => [k, k === 'sideAngle' ? v : lengths(v)]))
          : value;
  return { ...(lengths(p) as Particulars), unit: 'mm' };
}

/** The change as the other direction has to tell it. Which vertex of a tie is named, and the label, are each direction's own. */
const mirrored = (c: FeatureChange) => ({
  before: c.after,
  after: c.before,
  numbers: c.numbers.map(({ name, measure, was, is }) => ({ name, measure, was: is, is: was })),
  words: c.words.map(({ name, was, is }) => ({ name, was: is, is: was })),
  line: c.line && {
    distance: c.line.distance,
    gone: c.line.verticesNew,
    came: c.line.verticesGone,
  },
});
const plain = (c: FeatureChange) => ({
  before: c.before,
  after: c.after,
  numbers: c.numbers,
  words: c.words,
  line: c.line && { distance: c.line.distance, gone: c.line.verticesGone, came: c.line.verticesNew },
});
const inOrder = <T>(list: readonly T[]) => list.map((entry) => JSON.stringify(entry)).sort();

describe('compareFrames', () => {
  it('When a random frame is compared with itself, then nothing differs', () => {
    fc.assert(
      fc.property(arbitraryFrame, (a) => {
        const { features: f, settings: s, unitWas } = compare(a, structuredClone(a));
        expect([f, s, unitWas]).toEqual([[], [], null]);
      }),
    );
  });

  it('When two random frames change places, then each change is told the other way round', () => {
    fc.assert(
      fc.property(arbitraryFrame, arbitraryFrame, (a, b) => {
        const forth = compare(a, b);
        const back = compare(b, a);
        expect(inOrder(back.features.map(plain))).toEqual(inOrder(forth.features.map(mirrored)));
        expect(inOrder(back.settings)).toEqual(inOrder(forth.settings.map((s) => ({ ...s, was: s.is, is: s.was }))));
      }),
    );
  });

  it('When a random frame’s dado changes in depth alone, then that number differs and nothing else', () => {
    fc.assert(
      fc.property(
        arbitraryFrame.filter(({ dados }) => dados.length > 0),
        fc.nat(),
        fc.integer({ min: 1, max: 16 }),
        (a, pick, sixtyFourths) => {
          const at = pick % a.dados.length;
          const depth = a.dados[at]!.depth + sixtyFourths / 64;
          const b = { ...a, dados: a.dados.map((d, i) => (i === at ? { ...d, depth } : d)) };
          const { features: f, settings: s } = compare(a, b);
          expect(s).toEqual([]);
          expect(f).toHaveLength(1);
          expect(f[0]!.numbers).toEqual([{ name: 'depth', measure: 'length', was: a.dados[at]!.depth, is: depth }]);
          expect(f[0]!.after!.id).toBe(`dado-${at}`);
        },
      ),
    );
  });

  it('When a random frame’s thickness changes alone, then that setting differs and no part', () => {
    fc.assert(
      fc.property(arbitraryFrame, fc.integer({ min: 1, max: 16 }), (a, n) => {
        // A straight dado cutter is as wide at every height: the dados stay.
        const c = compare(a, { ...a, thickness: a.thickness + n / 64 });
        expect(c.features).toEqual([]);
        expect(c.settings).toEqual([
          { subject: 'Board', name: 'thickness', measure: 'length', was: a.thickness, is: a.thickness + n / 64 },
        ]);
      }),
    );
  });

  it('When the allowance changes alone, then it differs, and the blank that follows from it by twice as much', () => {
    const c = compare(base, workedExample({ setup: { ...base.setup, allowance: 1.25 } }));
    expect(features(c)).toEqual([]);
    expect(settings(c)).toEqual([
      'Turning over: allowance 1 → 1 1/4 (+1/4)',
      'Blank: width 35 1/2 → 36 (+1/2)',
      'Blank: height 33 → 33 1/2 (+1/2)',
    ]);
  });

  it('When the left stile is wider, then both openings follow, and the rails and the mid-stile between', () => {
    // By hand: between the stiles 29 1/2 becomes 29; less the mid-stile of 1 1/2, each opening has 13 3/4 instead of 14.
    const c = compare(base, withOutline({ stiles: { left: 2.25, right: 1.75 } }));
    expect(features(c)).toEqual([
      'Opening A: width 14 → 13 3/4 (−1/4), from left 1 3/4 → 2 1/4 (+1/2)',
      'Opening B: width 14 → 13 3/4 (−1/4), from left 17 1/4 → 17 1/2 (+1/4)',
      'Left stile: width 1 3/4 → 2 1/4 (+1/2)',
      'Top rail: length 29 1/2 → 29 (−1/2), from left 1 3/4 → 2 1/4 (+1/2)',
      'Bottom rail: length 29 1/2 → 29 (−1/2), from left 1 3/4 → 2 1/4 (+1/2)',
      'Mid-stile: from left 15 3/4 → 16 (+1/4)',
    ]);
    expect(settings(c)).toEqual([]);
  });

  it('When the frame is wider, then its size, what hangs on it and the blank are told', () => {
    const c = compare(base, withOutline({ width: 34 }));
    expect(features(c)[0]).toBe('Perimeter: width 33 → 34 (+1)');
    expect(features(c)).toContain('Right stile: from left 31 1/4 → 32 1/4 (+1)');
    expect(settings(c)).toEqual(['Blank: width 35 1/2 → 36 1/2 (+1)']);
  });

  it('When an opening is divided, then one half takes its place, and the other and the member between came', () => {
    const half = { opening: {} };
    const c = compare(
      base,
      withOutline({
        layout: { columns: [{ opening: { label: 'A' } }, { rows: [half, half], between: 1.5 }], between: 1.5 },
      }),
    );
    const said = features(c);
    expect(said.filter((text) => text.endsWith(': came'))).toEqual(['Opening C: came', 'Mid-rail: came']);
    expect(said.some((text) => text.startsWith('Opening A'))).toBe(false);
    expect(said).toContain('Opening B: height 27 1/2 → 13 (−14 1/2), from bottom 1 1/4 → 15 3/4 (+14 1/2)');
  });

  it('When dados change in order, then nothing differs; when one goes and one moves, then just that is told', () => {
    expect(compare(base, workedExample({ dados: base.dados.toReversed() })).features).toEqual([]);
    const moved = [...base.dados.slice(0, 2), dado({ ...base.dados[2], at: 20 })];
    expect(features(compare(base, workedExample({ dados: moved })))).toEqual([
      'Dado Partition: from left 16 1/8 → 20 (+3 7/8)',
      'Dado Bottom: went',
    ]);
  });

  it('When a dado is renamed in its place, then it is the same dado under another name', () => {
    const renamed = base.dados.map((d, i) => (i === 0 ? { ...d, part: 'Gable' } : d));
    expect(features(compare(base, workedExample({ dados: renamed })))).toEqual(['Dado Gable: part Left end → Gable']);
  });

  it('When the frame is put into millimetres, then nothing differs but the unit', () => {
    const c = compare(base, inMillimetres(base));
    expect([c.features, c.settings, c.unitWas, c.unit]).toEqual([[], [], 'in', 'mm']);
    expect(compare(inMillimetres(base), base).features).toEqual([]);
  });

  it('When a random frame is put into millimetres, then nothing differs but the unit', () => {
    fc.assert(
      fc.property(arbitraryFrame, (a) => {
        const { features: f, settings: s, unitWas } = compare(a, inMillimetres(a));
        expect([f, s, unitWas]).toEqual([[], [], 'in']);
      }),
    );
  });

  it('When the unit and a size change at once, then the difference is told in the newer unit', () => {
    const c = compare(base, inMillimetres(withOutline({ rails: { top: 2.25, bottom: 1.25 } })));
    expect(features(c)).toContain('Top rail: width 44.45 → 57.15 (+12.7), from bottom 730.25 → 717.55 (−12.7)');
  });

  it('When a cutter, the edge and the turning over change, then each is a setting with its numbers', () => {
    const opening: Cutter = { kind: 'straight', diameter: 0.25, fluteLength: 1.25, name: 'Quarter', number: 3 };
    const c = compare(
      base,
      workedExample({
        cutters: { ...base.cutters, opening },
        edge: { style: 'beaded', bead: { radius: 0.125, drop: 0, quirk: 0.0625 } },
        setup: { ...base.setup, flip: 'end-over-end' },
      }),
    );
    expect(features(c)).toEqual([]);
    expect(settings(c)).toEqual([
      'Edge: style square → beaded',
      'Edge: size held at face → bead base',
      'Edge: bead radius none → 1/8',
      'Edge: bead drop none → 0',
      'Edge: quirk none → 1/16',
      'Opening cutter: kind tapered → straight',
      'Opening cutter: diameter none → 1/4',
      'Turning over: flip side to side → end over end',
      'Opening cutter: name none → Quarter',
      'Opening cutter: number none → 3',
      'Opening cutter: tip radius 1/16 → none',
      'Opening cutter: side angle 1.5° → none',
    ]);
  });
});

describe('compareFrames of traced outlines', () => {
  const traced = (perimeter: readonly TracedVertex[], openings: readonly (readonly TracedVertex[])[] = []) =>
    workedExample({ outline: { kind: 'traced', perimeter, openings }, dados: [] });
  const box = (x: number, y: number, w: number, h: number): TracedVertex[] => [
    [x, y],
    [x + w, y],
    [x + w, y + h],
    [x, y + h],
  ];

  it('When an outline begins at another vertex or has one more on a straight side, then nothing differs', () => {
    const from = traced(box(0, 0, 20, 10), [box(2, 2, 6, 6)]);
    const [a, b, c, d] = box(0, 0, 20, 10) as [TracedVertex, TracedVertex, TracedVertex, TracedVertex];
    expect(compare(from, traced([c, d, a, b], [box(2, 2, 6, 6)])).features).toEqual([]);
    expect(compare(from, traced([a, [10, 0], b, c, d], [box(2, 2, 6, 6)])).features).toEqual([]);
  });

  it('When the head of the outline is notched, then the greatest distance and its place are told', () => {
    const notched: TracedVertex[] = [
      [0, 0],
      [20, 0],
      [20, 10],
      [12, 10],
      [12, 9],
      [8, 9],
      [8, 10],
      [0, 10],
    ];
    const [change, ...rest] = compare(traced(box(0, 0, 20, 10)), traced(notched)).features;
    expect(rest).toEqual([]);
    expect(change!.numbers).toEqual([]);
    expect(change!.line!.distance).toBe(1);
    expect(change!.line!.at).toEqual({ x: 10, y: 10 });
    expect([change!.line!.verticesGone.length, change!.line!.verticesNew.length]).toEqual([0, 4]);
  });

  it('When a straight head becomes an arc of the same ends, then the distance is the arc’s rise', () => {
    // A bulge of 0.5 rises by half the bulge times the chord: 0.5 × 20 / 2 (DXF Reference, group 42).
    const [change] = compare(
      traced(box(0, 0, 20, 10)),
      traced([
        [0, 0],
        [20, 0],
        [20, 10, 0.5],
        [0, 10],
      ]),
    ).features;
    expect(change!.line!.distance).toBeCloseTo(5, 9);
    expect(change!.numbers).toEqual([{ name: 'height', measure: 'length', was: 10, is: expect.closeTo(15, 9) }]);
  });

  it('When an opening is cut smaller at one side, then its extents, area and vertices are told', () => {
    const c = compare(traced(box(0, 0, 20, 10), [box(2, 2, 6, 6)]), traced(box(0, 0, 20, 10), [box(2, 2, 5, 6)]));
    expect(features(c)).toEqual([
      'Opening A: width 6 → 5 (−1), area 36 in² → 30 in² (−6 in²), line moved by up to 1 at 8, 2 (2 vertices gone, 2 new)',
    ]);
  });

  it('When an opening moves clear of its place, then it is the same one by label and size, moved', () => {
    const from = traced(box(0, 0, 40, 10), [box(2, 2, 6, 6)]);
    const [said, ...rest] = features(compare(from, traced(box(0, 0, 40, 10), [box(30, 2, 6, 6)])));
    expect(rest).toEqual([]);
    expect(said).toMatch(/^Opening A: from left 2 → 30 \(\+28\), line moved by up to 28 at /);
  });

  it('When a frame of members is traced, then that is told once and not member by member', () => {
    const c = compare(base, traced(box(0, 0, 33, 30.5), [box(1.75, 1.25, 14, 27.5), box(17.25, 1.25, 14, 27.5)]));
    expect(c.features.filter(({ kind }) => kind !== 'dado')).toEqual([]);
    expect(settings(c)).toEqual(['Frame: outline members → traced']);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import { findCrossing } from '#shared/kernel/contour/find-crossing.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import type { LineSet, SetName } from '#shared/kernel/line-sets/line-set.ts';
import { quirkOffsets } from '#shared/kernel/line-sets/bead-line-sets.ts';
import type { Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryOutline } from '../../../builders/arbitrary-contour.ts';
import { beadCutterSet, beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';
import { offsetArea } from '../../../setup/clipper.ts';

const setOf = (p: Particulars, set: SetName, variant = ''): LineSet => {
  const found = workFrame(p).front.lineSets.find((s) => s.set === set && s.variant === variant);
  if (!found) throw new Error(`no line set ${set}`);
  return found;
};
const contoursOf = (set: LineSet): Contour[] => set.shapes.flatMap((s) => (s.kind === 'contour' ? [s.contour] : []));

describe('When the bead of the worked example is entered, then its numbers are those of the handbook table to six decimals', () => {
  // Opening A lies at (2.75, 2.25)–(16.75, 29.75) in the front setup: worked example.
  test.each([
    ['BEAD_INNER', -0.015625],
    ['BEAD_OUTER', 0.203125],
    ['QUIRK', 0.25],
  ] as const)('%s runs %d outwards from the opening’s edge', (name, offset) => {
    const e = contourExtents(contoursOf(setOf(beadedExample(), name))[0]!);
    expect(e.minX).toBeCloseTo(2.75 - offset, 6);
    expect(e.minY).toBeCloseTo(2.25 - offset, 6);
    expect(e.maxX).toBeCloseTo(16.75 + offset, 6);
    expect(e.maxY).toBeCloseTo(29.75 + offset, 6);
  });

  test.each(['BEAD_INNER', 'BEAD_OUTER', 'QUIRK', 'QUIRK_CORNER'] as const)(
    '%s lies at the base, 0.10375 below the face',
    (name) => {
      expect(setOf(beadedExample(), name).depth).toBeCloseTo(0.10375, 6);
    },
  );

  test('the 30° V is 0.027800 in radius at the face when its tip is at the base', () => {
    const path = setOf(beadedExample(), 'QUIRK_CORNER').shapes[0]!;
    if (path.kind !== 'climb') throw new Error('no climb');
    const corner = path.points.find((p) => p.z === 0)!;
    const bend = path.points[path.points.indexOf(corner) - 1]!;
    expect(Math.abs(bend.x - corner.x)).toBeCloseTo(0.0278, 6);
    expect(Math.abs(bend.y - corner.y)).toBeCloseTo(0.0278, 6);
    expect(bend.z).toBeCloseTo(-0.10375, 6);
  });

  test('the entered size is true at the base: the axis runs ρ(0.8125 − 0.10375) inside', () => {
    // ρ(h) = r/cos a + (h − r)·tan a, tapered cutter: plane trigonometry.
    const a = (1.5 * Math.PI) / 180;
    const wanted = 0.0625 / Math.cos(a) + (0.8125 - 0.10375 - 0.0625) * Math.tan(a);
    expect(contourExtents(contoursOf(setOf(beadedExample(), 'OPENING_AXIS'))[0]!).minX).toBeCloseTo(2.75 + wanted, 9);
  });

  test('line sets come in cutting order, beads before openings, the perimeter last', () => {
    const names = workFrame(beadedExample()).front.lineSets.map((s) => s.set);
    expect(names).toEqual([
      'BEAD_INNER',
      'BEAD_OUTER',
      'QUIRK',
      'QUIRK_CORNER',
      'OPENING',
      'OPENING_AXIS',
      'CORNER_LIFT',
      'PERIMETER',
      'BLANK',
    ]);
  });
});

describe('When openings have arches or come from a drawing, then bead lines enclose the area that clipper2 works out', () => {
  const traced = (outline: Contour): Particulars => {
    const far = 40;
    return beadedExample({
      outline: {
        kind: 'traced',
        perimeter: [
          [-far, -far],
          [far, -far],
          [far, far],
          [-far, far],
        ],
        openings: [outline.vertices.map((v): TracedVertex => [v.x, v.y, v.bulge])],
      },
      dados: [],
    });
  };

  test('polygons and outlines with arcs, 200 of them', () => {
    let compared = 0;
    fc.assert(
      fc.property(arbitraryOutline, (outline) => {
        fc.pre(!findCrossing(outline) && outline.vertices.every((v) => v.bulge === 0));
        const worked = workFrame(traced(outline));
        const lines = worked.front.lineSets.filter((s) => s.set === 'BEAD_OUTER' || s.set === 'QUIRK');
        if (worked.findings.some((f) => f.code === 'bead-collapses')) return;
        for (const set of lines) {
          const offset = set.set === 'QUIRK' ? 0.25 : 0.203125;
          const ours = contoursOf(set)[0]!;
          // The opening lies where it was drawn but for a shift; areas do not mind.
          const wanted = offsetArea(flattenContour(outline, 1e-5), offset);
          expect(offsetArea(flattenContour(ours, 1e-5), 1e-9)).toBeCloseTo(wanted, 4);
          compared++;
        }
      }),
      { numRuns: 200, seed: 20260301 },
    );
    expect(compared).toBeGreaterThan(100);
  });

  test('an arch keeps its arc about the same centre, with its radius grown by the offset', () => {
    const outline = workedExample().outline;
    if (outline.kind !== 'members') throw new Error('members');
    const p = beadedExample({ outline: { ...outline, layout: { opening: { arch: 1.5 } } }, dados: [] });
    // R = (c²/4 + h²)/2h over the opening's 29.5 with rise 1.5: circular segments, Machinery's Handbook.
    const R = (29.5 ** 2 / 4 + 1.5 ** 2) / 3;
    for (const [name, offset] of [
      ['BEAD_INNER', -0.015625],
      ['BEAD_OUTER', 0.203125],
      ['QUIRK', 0.25],
    ] as const) {
      const { vertices } = contoursOf(setOf(p, name))[0]!;
      const i = vertices.findIndex((v) => v.bulge !== 0);
      const [a, b] = [vertices[i]!, vertices[(i + 1) % vertices.length]!];
      const chord = Math.hypot(b.x - a.x, b.y - a.y);
      expect((chord * (1 + a.bulge ** 2)) / (4 * a.bulge)).toBeCloseTo(R + offset, 9);
    }
  });
});

describe('When the quirk is wider than its cutter, then it gets the lines it needs', () => {
  test('as wide: one line in the middle', () => {
    expect(quirkOffsets({ radius: 0.1, drop: 0, quirk: 0.125 }, 0.125)).toEqual([0.2 + 0.0625]);
  });

  test('narrower: first and last at the cutter’s radius from the walls, no gap between', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 0.5, noNaN: true }),
        fc.double({ min: 1.001, max: 6, noNaN: true }),
        (diameter, times) => {
          const quirk = diameter * times;
          const offsets = quirkOffsets({ radius: 0.1, drop: 0, quirk }, diameter);
          expect(offsets[0]! - diameter / 2).toBeCloseTo(0.2, 9);
          expect(offsets.at(-1)! + diameter / 2).toBeCloseTo(0.2 + quirk, 9);
          for (let i = 1; i < offsets.length; i++) expect(offsets[i]! - offsets[i - 1]!).toBeLessThan(diameter);
        },
      ),
    );
  });

  test('wider than the quirk: none', () => {
    expect(quirkOffsets({ radius: 0.1, drop: 0, quirk: 0.1 }, 0.125)).toEqual([]);
  });
});

describe('When one opening keeps a square edge, then it is cut on layers of its own', () => {
  const outline = workedExample().outline;
  if (outline.kind !== 'members') throw new Error('members');
  const p = beadedExample({
    outline: { ...outline, layout: { columns: [{ opening: {} }, { opening: { edge: 'square' } }], between: 1.5 } },
  });

  test('it has no bead, and its size is true at the face', () => {
    expect(contoursOf(setOf(p, 'BEAD_INNER'))).toHaveLength(1);
    expect(contoursOf(setOf(p, 'OPENING'))).toHaveLength(1);
    const square = contoursOf(setOf(p, 'OPENING_AXIS', 'SQUARE'));
    expect(square).toHaveLength(1);
    // ρ(0.8125) = 0.082161: worked example. Opening B begins at 17.25 + 1.
    expect(contourExtents(square[0]!).minX).toBeCloseTo(18.25 + 0.082161, 6);
  });
});

describe('When a V-cutter follows in the corners of openings', () => {
  test('it starts where both flanks touch the sides at the face, and ends in the corner', () => {
    const p = workedExample({
      edge: { style: 'square', sizeHeldAt: 'face', corners: 'vee' },
      cutters: { ...workedExample().cutters, corner: beadCutterSet.corner },
    });
    const set = setOf(p, 'CORNER_VEE');
    expect(set.shapes).toHaveLength(8);
    const path = set.shapes[0]!;
    if (path.kind !== 'climb') throw new Error('no climb');
    // Radius of a V of β at depth z below the face: z · tan(β/2).
    const reach = 0.75 * Math.tan(Math.PI / 12);
    expect(path.points[0]!.x).toBeCloseTo(2.75 + reach, 9);
    expect(path.points[0]!.y).toBeCloseTo(2.25 + reach, 9);
    expect(path.points.at(-1)).toEqual({ x: 2.75, y: 2.25, z: 0 });
  });
});

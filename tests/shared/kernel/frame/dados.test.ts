import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import { lineSetKey } from '#shared/kernel/line-sets/line-set.ts';
import type { Dado } from '#shared/kernel/particulars/particulars.ts';
import { placeContour, unplace } from '#shared/kernel/placing/place.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { arbitraryFrame } from '../../../builders/arbitrary-frame.ts';
import { cornersOf, enteredDado } from '../../../builders/entered-dado.ts';
import { contoursIn, lineSets } from '../../../builders/line-sets.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { unionArea } from '../../../setup/clipper.ts';

const RADIUS = 0.1875;
const work = (...dados: Dado[]) => workFrame(workedExample({ dados }));
const outlinesOf = (...dados: Dado[]) => {
  const { back } = work(...dados);
  return contoursIn(lineSets(back, 'DADO')).map((contour) => placeContour(unplace(back.placement), contour));
};

describe('When a dado ends', () => {
  const extents = (changes: Partial<Dado>) => work(dado(changes)).dados[0]!.extents;

  test('open, then it runs out past its end by the cutter’s radius', () => {
    expect(extents({ from: 0, to: 30.5, ends: ['open', 'open'] })).toMatchObject({
      minY: -RADIUS,
      maxY: 30.5 + RADIUS,
    });
  });

  test('meets, then it ends exactly there', () => {
    expect(extents({ from: 1.25, to: 20, ends: ['meets', 'meets'] })).toMatchObject({ minY: 1.25, maxY: 20 });
  });

  test('stopped without clearance, then it is longer by the whole radius', () => {
    const { minY, maxY } = extents({ from: 5, to: 20, clearance: 0, ends: ['stopped', 'stopped'] });
    expect(minY).toBeCloseTo(5 - RADIUS, 12);
    expect(maxY).toBeCloseTo(20 + RADIUS, 12);
  });

  test('stopped, then the square corner of the panel just touches the cutter’s fillet', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 0.3, noNaN: true }), (clearance) => {
        const e = extents({ from: 5, to: 20, clearance, ends: ['stopped', 'stopped'] });
        // Fillet: a circle of the cutter's radius touching side and end. The panel's corner is c/2 in from the side, at 5.
        const centre = { x: e.minX + RADIUS, y: e.minY + RADIUS };
        const corner = { x: e.minX + clearance / 2, y: 5 };
        expect(Math.hypot(corner.x - centre.x, corner.y - centre.y)).toBeCloseTo(RADIUS, 9);
      }),
    );
  });

  test('open at one end and stopped at the other, then each end has its own', () => {
    const { minY, maxY } = extents({ from: 0, to: 20, clearance: 0, ends: ['open', 'stopped'] });
    expect([minY, maxY - 20]).toEqual([-RADIUS, expect.closeTo(RADIUS, 12)]);
  });

  test('then a horizontal one has its length along X', () => {
    expect(extents({ runs: 'horizontal', at: 3, from: 2, to: 9, ends: ['meets', 'meets'] })).toEqual({
      minX: 2,
      maxX: 9,
      minY: expect.closeTo(2.995, 12),
      maxY: expect.closeTo(3.755, 12),
    });
  });
});

describe('When dados touch or cross', () => {
  test('then they are one outline with lines and true corners only', () => {
    const [outline, ...others] = outlinesOf(
      dado({ at: 5, from: 2, to: 12, ends: ['meets', 'meets'] }),
      dado({ runs: 'horizontal', at: 6, from: 1, to: 15, ends: ['meets', 'meets'] }),
    );
    expect(others).toEqual([]);
    expect(outline!.vertices).toHaveLength(12);
    expect(outline!.vertices.every((v) => v.bulge === 0)).toBe(true);
    expect(contourArea(outline!)).toBeCloseTo(0.76 * 10 + 0.76 * 14 - 0.76 ** 2, 9);
  });

  test('only along an edge, then they are one outline still', () => {
    const outlines = outlinesOf(
      dado({ at: 5, panel: 0.75, clearance: 0, from: 2, to: 12, ends: ['meets', 'meets'] }),
      dado({ at: 5.75, panel: 0.75, clearance: 0, from: 2, to: 12, ends: ['meets', 'meets'] }),
    );
    expect(outlines).toHaveLength(1);
    expect(outlines[0]!.vertices).toHaveLength(4);
  });

  test('not at all, then each has its own outline', () => {
    expect(outlinesOf(dado({ at: 5 }), dado({ at: 10 }), dado({ at: 15 }))).toHaveLength(3);
  });

  test('all round, then the outline has a hole with an outline of its own, run the other way', () => {
    const meets = { ends: ['meets', 'meets'] as const, from: 2, to: 12 };
    const outlines = outlinesOf(
      dado({ ...meets, at: 2, ends: ['meets', 'meets'] }),
      dado({ ...meets, at: 11, ends: ['meets', 'meets'] }),
      dado({ ...meets, runs: 'horizontal', at: 2, ends: ['meets', 'meets'] }),
      dado({ ...meets, runs: 'horizontal', at: 11, ends: ['meets', 'meets'] }),
    );
    expect(outlines).toHaveLength(2);
    expect(outlines.map((o) => Math.sign(contourArea(o))).sort()).toEqual([-1, 1]);
  });

  test('then the area is that of clipper2-wasm’s union, no side is a sliver and every corner turns by a right angle', () => {
    let compared = 0;
    fc.assert(
      fc.property(arbitraryFrame, (p) => {
        fc.pre(p.dados.length > 1);
        const { back } = workFrame(p);
        for (const set of lineSets(back, 'DADO')) {
          const entered = p.dados.filter((d) => d.depth === set.depth).map((d) => cornersOf(enteredDado(d, RADIUS)));
          expect(entered.length).toBeGreaterThan(0);
          const outlines = contoursIn([set]);
          const area = Math.abs(outlines.reduce((sum, outline) => sum + contourArea(outline), 0));
          expect(Math.abs(area - unionArea(entered))).toBeLessThan(1e-5);
          const corners = outlines.flatMap(({ vertices }) =>
            vertices.map((v, i) => corner(vertices.at(i - 1)!, v, vertices[(i + 1) % vertices.length]!)),
          );
          expect(Math.min(...corners.map((c) => c.side))).toBeGreaterThan(1e-9);
          expect(Math.max(...corners.map((c) => c.skew))).toBeLessThan(1e-6);
          compared++;
        }
      }),
      { numRuns: 300, maxSkipsPerRun: 50 },
    );
    expect(compared).toBeGreaterThan(200);
  });
});

/** Length of the side before a corner, and the cosine of its angle: 0 for a right one. */
function corner(a: Point, b: Point, c: Point): { side: number; skew: number } {
  const [before, after] = [Math.hypot(b.x - a.x, b.y - a.y), Math.hypot(c.x - b.x, c.y - b.y)];
  return { side: before, skew: Math.abs((b.x - a.x) * (c.x - b.x) + (b.y - a.y) * (c.y - b.y)) / (before * after) };
}

describe('When dados have several depths', () => {
  test('then each depth is a line set of its own, and only equal depths are merged', () => {
    const { back } = work(
      dado({ at: 5, depth: 0.25 }),
      dado({ at: 10, depth: 0.375 }),
      dado({ runs: 'horizontal', at: 10, from: 4, to: 20, depth: 0.25 }),
    );
    const sets = lineSets(back, 'DADO');
    expect(sets.map((set) => set.depth).sort()).toEqual([0.25, 0.375]);
    expect(sets.map((set) => set.shapes.length)).toEqual([1, 1]);
  });

  test('however near to one another, then no two line sets have the same key', () => {
    const { back } = work(dado({ at: 5, depth: 0.25 }), dado({ at: 10, depth: 0.2502 }), dado({ at: 15, depth: 0.3 }));
    const keys = lineSets(back, 'DADO').map(lineSetKey);
    expect(keys).toHaveLength(3);
    expect(new Set(keys).size).toBe(3);
  });

  test('then passes follow the dado cutter’s deepest step', () => {
    const { cutters } = workedExample();
    const { back } = workFrame(
      workedExample({ dados: [dado()], cutters: { ...cutters, dado: { ...cutters.dado, maxPass: 0.1 } } }),
    );
    const [set] = lineSets(back, 'DADO');
    expect(set!.passes).toEqual([expect.closeTo(0.1), expect.closeTo(0.2), 0.25]);
  });
});

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { rectangle } from '#shared/kernel/contour/make-contour.ts';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import { differenceArea, unionArea } from '../../../../setup/clipper.ts';
import { arbitraryOutline } from '../../../../builders/arbitrary-contour.ts';
import { arbitraryMess, curvesOf, explode, messUp, type Row } from './loose-curves.ts';

const lengths = (min: number, max: number) =>
  fc.array(fc.integer({ min: 2, max: 40 }), { minLength: min, maxLength: max });

/** Rows of cells of any height, each divided in its own way: cells meet in whole edges, in parts of edges, and in junctions. */
const wall = fc
  .tuple(fc.array(fc.tuple(fc.integer({ min: 2, max: 20 }), lengths(1, 5)), { minLength: 1, maxLength: 5 }))
  .map(([rows]) => {
    const width = 100;
    let y = 0;
    return rows.flatMap(([height, parts]) => {
      const whole = parts.reduce((sum, part) => sum + part, 0);
      let gone = 0;
      const cells = parts.map((part) => {
        const from = (gone / whole) * width;
        gone += part;
        return rectangle({ minX: from, maxX: (gone / whole) * width, minY: y, maxY: y + height });
      });
      y += height;
      return cells;
    });
  });

/** No two ends are as near each other as a gap that is closed would be, unless they are one place: they would be taken for one. */
const isRoomy = (rows: readonly Row[]): boolean => {
  const ends = rows.flatMap(([ax, ay, bx, by]) => [
    { x: ax, y: ay },
    { x: bx, y: by },
  ]);
  return ends.every((p, i) =>
    ends.slice(0, i).every((q) => {
      const apart = Math.hypot(p.x - q.x, p.y - q.y);
      return apart < 1e-9 || apart > 0.1;
    }),
  );
};

const total = (areas: readonly number[]) => areas.reduce((sum, area) => sum + area, 0);

describe('When cells share edges', () => {
  test('then there is a loop for each, and one line round all of them, on random walls of cells', () => {
    let several = 0;
    fc.assert(
      fc.property(wall, arbitraryMess, (cells, mess) => {
        const rows = messUp(explode(cells), mess);
        fc.pre(isRoomy(rows));
        const healed = healCurves(curvesOf(rows), { unit: 'mm' });
        const found = healed.loops.filter(({ kind }) => kind !== 'outline').map(({ contour }) => contour);
        const outlines = healed.loops.filter(({ kind }) => kind === 'outline').map(({ contour }) => contour);
        expect(healed.problems).toEqual([]);
        expect(healed.open).toEqual([]);
        expect(found).toHaveLength(cells.length);
        const sorted = (list: typeof cells) => list.map(contourArea).sort((a, b) => a - b);
        sorted(found).forEach((area, i) => expect(area).toBeCloseTo(sorted(cells)[i]!, 6));
        // The areas are whole, do not overlap, and leave nothing out: clipper2-wasm.
        const flat = found.map(({ vertices }) => vertices);
        expect(unionArea(flat)).toBeCloseTo(total(found.map(contourArea)), 5);
        expect(
          differenceArea(
            flat,
            cells.map(({ vertices }) => vertices),
          ),
        ).toBeLessThan(1e-5);
        if (cells.length === 1) {
          expect(outlines).toEqual([]);
          return;
        }
        several++;
        expect(outlines).toHaveLength(1);
        expect(outlines[0]!.vertices).toHaveLength(4);
        expect(contourArea(outlines[0]!)).toBeCloseTo(total(cells.map(contourArea)), 6);
      }),
      { numRuns: 250 },
    );
    expect(several).toBeGreaterThan(150);
  });

  test('then an outline of lines and arcs cut by a line from corner to corner is two cells of its area', () => {
    const CHORD = 1e-4;
    let compared = 0;
    fc.assert(
      fc.property(arbitraryOutline, arbitraryMess, fc.nat(), fc.nat(), (outline, mess, i, j) => {
        const n = outline.vertices.length;
        const [a, b] = [i % n, j % n];
        fc.pre(n > 3 && (a - b + n) % n > 1 && (b - a + n) % n > 1);
        const [p, q] = [outline.vertices[a]!, outline.vertices[b]!];
        // A line that passes through a third corner, or nearly, makes other cells than two.
        const off = (v: Point) =>
          ((v.x - p.x) * (q.y - p.y) - (v.y - p.y) * (q.x - p.x)) / Math.hypot(q.x - p.x, q.y - p.y);
        fc.pre(outline.vertices.every((v) => v === p || v === q || Math.abs(off(v)) > 0.1));
        const chord: Row = [p.x, p.y, q.x, q.y, 0];
        const healed = healCurves(curvesOf(messUp([...explode([outline]), chord], mess)), { unit: 'mm' });
        // Where the outline bulges over itself or the line leaves it, lines cross or touch: the product says so.
        fc.pre(healed.counts.crossings === 0 && healed.problems.length === 0 && healed.counts.tJunctions === 0);
        const ring = flattenContour(outline, CHORD);
        const area = contourArea(outline);
        fc.pre(Math.abs(unionArea([ring]) - area) < 1e-2);
        const cells = healed.loops.filter(({ kind }) => kind === 'cell').map(({ contour }) => contour);
        expect(cells).toHaveLength(2);
        const inside = unionArea([ring, ...cells.map((c) => flattenContour(c, CHORD))]);
        // A line outside the outline makes a cell of the bay it closes off: then both cells and the bay are the whole.
        expect(Math.abs(total(cells.map(contourArea)) - inside)).toBeLessThan(2e-2);
        compared++;
      }),
      { numRuns: 300, maxSkipsPerRun: 300 },
    );
    expect(compared).toBeGreaterThan(100);
  });
});

describe('When a drawing has a great many lines', () => {
  test('then each of 20,000 loose rectangles is a loop of its own, wherever its lines stand in the file', () => {
    const rows: Row[] = [];
    for (let i = 0; i < 20_000; i++) {
      const [x, y] = [(i % 150) * 12.3, Math.floor(i / 150) * 7.1];
      rows.push(...explode([rectangle({ minX: x, minY: y, maxX: x + 11, maxY: y + 5 + (i % 3) / 2 })]));
    }
    // A fixed shuffle: 7919 has no divisor in common with the number of rows.
    const shuffled = rows.map((_, i) => rows[(i * 7919) % rows.length]!);
    const healed = healCurves(curvesOf(shuffled), { unit: 'mm' });
    expect(healed.loops).toHaveLength(20_000);
    expect(new Set(healed.loops.map(({ contour }) => contourExtents(contour).maxX.toFixed(3))).size).toBe(150);
    expect(healed.problems).toEqual([]);
  });
});

describe('When the numbers or tolerances are none', () => {
  const one = curvesOf([[0, 0, 1, 0, 0]]);
  test('then it throws with what it got', () => {
    expect(() => healCurves(curvesOf([[0, 0, NaN, 0, 0]]), { unit: 'mm' })).toThrow('segment 0: got 0, 0, NaN, 0, 0');
    expect(() => healCurves({ ...one, count: 2 }, { unit: 'mm' })).toThrow('got 2 with 5 numbers');
    expect(() => healCurves(one, { unit: 'mm', gap: -1 })).toThrow('got -1 mm');
    expect(() => healCurves(one, { unit: 'mm', gap: 2 })).toThrow('got 2 mm');
    expect(() => healCurves(one, { unit: 'mm', arcsFromLines: { tolerance: 0 } })).toThrow('got 0 mm');
  });
});

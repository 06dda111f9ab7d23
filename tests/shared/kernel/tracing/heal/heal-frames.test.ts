import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour, Point } from '#shared/kernel/contour/contour.ts';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { membersContours } from '#shared/kernel/frame/members-contours.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import type { HealedDrawing } from '#shared/kernel/tracing/heal/healed-drawing.ts';
import { arbitraryFrame } from '../../../../builders/arbitrary-frame.ts';
import { contourDifference } from '../../../../builders/same-contour.ts';
import { arbitraryMess, curvesOf, explode, messUp, moved, type Row } from './loose-curves.ts';

/** Perimeter and openings of a frame whose members add up and whose openings are no slits; undefined for others. */
function contoursOf({ outline, unit }: Particulars): Contour[] | undefined {
  if (outline.kind !== 'members') return undefined;
  const { contours, findings } = membersContours(outline, unit);
  if (findings.length > 0 || contours.openings.some((o) => o.width < 0.5 || o.height < 0.5)) return undefined;
  return [contours.perimeter, ...contours.openings.map((o) => o.contour)];
}

const shifted = (contour: Contour, by: Point): Contour => ({
  closed: contour.closed,
  vertices: contour.vertices.map((v) => ({ x: v.x + by.x, y: v.y + by.y, bulge: v.bulge })),
});

/** For each contour the loop that is nearest to it, and how far it is off at most. */
function farthest(healed: HealedDrawing, contours: readonly Contour[], by: Point = { x: 0, y: 0 }): number {
  const loops = healed.loops.map(({ contour }) => shifted(contour, by));
  return Math.max(...contours.map((wanted) => Math.min(...loops.map((loop) => contourDifference(loop, wanted)))));
}

const GAP = 0.05 / 25.4;
/** Two ends that were one place are then at most 2·√2 of this apart: within the gap. */
const JITTER = GAP / 3;

describe('When the lines of a random frame are messed up', () => {
  test('in order, direction, cuts and copies, then its loops are the frame again', () => {
    let arches = 0;
    fc.assert(
      fc.property(arbitraryFrame, arbitraryMess, (frame, mess) => {
        const contours = contoursOf(frame);
        fc.pre(contours !== undefined);
        const healed = healCurves(curvesOf(messUp(explode(contours), mess)), { unit: frame.unit });
        expect(healed.loops).toHaveLength(contours.length);
        expect(healed.loops.every(({ kind }) => kind === 'alone')).toBe(true);
        expect(healed.open).toEqual([]);
        expect(healed.problems).toEqual([]);
        expect(farthest(healed, contours)).toBeLessThan(1e-7);
        if (contours.some(({ vertices }) => vertices.some((v) => v.bulge !== 0))) arches++;
      }),
      { numRuns: 300, maxSkipsPerRun: 300 },
    );
    expect(arches).toBeGreaterThan(30);
  });

  test('and lie 5e8 from the origin, then the loops are those at the origin, to what a float holds there', () => {
    fc.assert(
      fc.property(arbitraryFrame, arbitraryMess, fc.constantFrom(5e8, -5e8), (frame, mess, far) => {
        const contours = contoursOf(frame);
        fc.pre(contours !== undefined);
        const rows = messUp(explode(contours), mess).map((row) => moved(row, far, -far / 2));
        const healed = healCurves(curvesOf(rows), { unit: frame.unit });
        expect(healed.loops).toHaveLength(contours.length);
        expect(healed.problems).toEqual([]);
        // Floats near 5e8 are 6e-8 apart; the bulge of an arc is not moved at all.
        const back = { x: healed.origin.x - far, y: healed.origin.y + far / 2 };
        expect(farthest(healed, contours, back)).toBeLessThan(5e-7);
        const area = (list: readonly Contour[]) => list.reduce((sum, c) => sum + contourArea(c), 0);
        const there = area(healed.loops.map(({ contour }) => contour));
        expect(Math.abs(there - area(contours))).toBeLessThan(1e-3);
      }),
      { numRuns: 150, maxSkipsPerRun: 300 },
    );
  });

  test('and its ends are moved within the gap, copies too, then every loop closes within the gap of where it was', () => {
    const offsets = fc.array(fc.double({ min: -JITTER, max: JITTER, noNaN: true }), { minLength: 97, maxLength: 97 });
    let closed = 0;
    fc.assert(
      fc.property(arbitraryFrame, arbitraryMess, offsets, (frame, mess, offset) => {
        const contours = contoursOf(frame);
        fc.pre(contours !== undefined);
        const rows = messUp(explode(contours), { ...mess, cuts: [null] }).map(([ax, ay, bx, by, bulge], i): Row => [
          ax + offset[(4 * i) % 97]!,
          ay + offset[(4 * i + 1) % 97]!,
          bx + offset[(4 * i + 2) % 97]!,
          by + offset[(4 * i + 3) % 97]!,
          bulge,
        ]);
        const healed = healCurves(curvesOf(rows), { unit: frame.unit });
        expect(healed.loops).toHaveLength(contours.length);
        expect(healed.open).toEqual([]);
        expect(healed.counts.gapsAmbiguous).toBe(0);
        expect(farthest(healed, contours)).toBeLessThan(2 * GAP);
        for (const { size, code } of healed.problems) {
          expect(code).toBe('gap-closed');
          expect(size).toBeLessThanOrEqual(GAP);
        }
        closed += healed.counts.gapsClosed;
      }),
      { numRuns: 200, maxSkipsPerRun: 300 },
    );
    expect(closed).toBeGreaterThan(500);
  });

  test('then each loop says which segments and entities it is made of', () => {
    fc.assert(
      fc.property(arbitraryFrame, arbitraryMess, (frame, mess) => {
        const contours = contoursOf(frame);
        fc.pre(contours !== undefined);
        const rows = messUp(explode(contours), mess);
        // Two segments to an entity.
        const curves = { ...curvesOf(rows), entityOf: Uint32Array.from(rows, (_, i) => i >> 1) };
        for (const { contour, segments, entities } of healCurves(curves, { unit: frame.unit }).loops) {
          const e = contourExtents(contour);
          expect(segments.length).toBeGreaterThanOrEqual(contour.vertices.length);
          for (const s of segments) {
            const [x, y] = rows[s]!;
            expect(x >= e.minX - 1e-6 && x <= e.maxX + 1e-6 && y >= e.minY - 1e-6 && y <= e.maxY + 1e-6).toBe(true);
          }
          expect([...entities]).toEqual([...new Set([...segments].map((s) => s >> 1))]);
        }
      }),
      { numRuns: 50, maxSkipsPerRun: 300 },
    );
  });
});

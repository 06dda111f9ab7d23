import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import { rectangle } from '#shared/kernel/contour/make-contour.ts';
import { placeContour } from '#shared/kernel/placing/place.ts';
import { membersContours } from '#shared/kernel/frame/members-contours.ts';
import { tracedContours } from '#shared/kernel/frame/traced-contours.ts';
import { applyRoles } from '#shared/kernel/tracing/frames/apply-roles.ts';
import { framesFromLoops } from '#shared/kernel/tracing/frames/frames-from-loops.ts';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import { arbitraryFrame } from '../../../../builders/arbitrary-frame.ts';
import { contourDifference } from '../../../../builders/same-contour.ts';
import { arbitraryMess, curvesOf, explode, messUp, moved } from '../heal/loose-curves.ts';

const box = (minX: number, minY: number, width: number, height: number): Contour =>
  rectangle({ minX, minY, maxX: minX + width, maxY: minY + height });
const loopsOf = (...contours: Contour[]) => contours.map((contour) => ({ contour }));
const healed = (...contours: Contour[]) => healCurves(curvesOf(explode(contours)), { unit: 'in' }).loops;

describe('When loops lie in each other', () => {
  test('then the outermost are perimeters, those inside openings, and deeper ones left out with a note', () => {
    const { roles, frames, problems } = framesFromLoops(
      loopsOf(box(4, 4, 2, 2), box(0, 0, 20, 10), box(1, 1, 8, 8), box(11, 1, 8, 8), box(30, 0, 5, 5)),
      'in',
    );
    expect(roles.map(({ role }) => role)).toEqual(['leave-out', 'perimeter', 'opening', 'opening', 'perimeter']);
    expect(roles[0]!.note).toBe('inside-an-opening');
    expect(frames.map(({ perimeterLoop, openingLoops }) => [perimeterLoop, openingLoops])).toEqual([
      [1, [2, 3]],
      [4, []],
    ]);
    expect(problems).toEqual([]);
  });

  test('then each frame begins at 0, 0, with arcs reckoned in, and its coordinates are short decimals', () => {
    const arched: Contour = {
      closed: true,
      vertices: [
        { x: 100.1, y: 50.2, bulge: 0 },
        { x: 123.6, y: 50.2, bulge: 1 },
        { x: 123.6, y: 60.2, bulge: 0 },
        { x: 100.1, y: 60.2, bulge: 1 },
      ],
    };
    const [frame] = framesFromLoops(loopsOf(arched, box(101.1, 52.2, 20.5, 5)), 'in').frames;
    // Half circles of radius 5 on both sides.
    expect([frame!.width, frame!.height]).toEqual([33.5, 10]);
    expect(frame!.outline.perimeter).toContainEqual([5, 0]);
    expect(frame!.outline.perimeter).toContainEqual([28.5, 0, 1]);
    expect(frame!.outline.openings[0]).toContainEqual([6, 2]);
    expect(frame!.outline.openings[0]).toContainEqual([26.5, 7]);
  });

  test('then openings come top to bottom, left to right, tops that are nearly level being one row', () => {
    const loops = loopsOf(
      box(0, 0, 60, 60),
      box(40, 3, 10, 20),
      box(3, 3, 10, 20),
      box(40, 30, 10, 20),
      box(3, 30, 10, 20.3),
    );
    expect(framesFromLoops(loops, 'in').frames[0]!.openingLoops).toEqual([4, 3, 2, 1]);
  });

  test('only as far as their extents go, then they are frames of their own', () => {
    const bend: Contour = {
      closed: true,
      vertices: [
        [0, 0],
        [20, 0],
        [20, 5],
        [5, 5],
        [5, 20],
        [0, 20],
      ].map(([x, y]) => ({ x: x!, y: y!, bulge: 0 })),
    };
    const { roles } = framesFromLoops(loopsOf(bend, box(8, 8, 4, 4), box(1, 1, 3, 3)), 'in');
    expect(roles.map(({ role }) => role)).toEqual(['perimeter', 'perimeter', 'opening']);
  });

  test('and one runs across an edge of the outer one, whichever, then that is still the perimeter', () => {
    for (const across of [
      box(14.6, -1, 0.8, 20),
      box(14.6, 21, 0.8, 20),
      box(-1, 19.6, 20, 0.8),
      box(11, 19.6, 20, 0.8),
    ]) {
      const loops = loopsOf(across, box(0, 0, 30, 40), box(2, 2, 8, 8));
      expect(framesFromLoops(loops, 'in').roles.map(({ role }) => role)).toEqual(['opening', 'perimeter', 'opening']);
      const made = applyRoles(loops, ['dado', 'perimeter', 'opening'], 'in');
      expect(made.problems).toEqual([]);
      expect(made.frames[0]!.dadoLoops).toEqual([0]);
    }
  });

  test('of a frame drawn as stiles and rails, then the line round them is the perimeter and what they leave free an opening', () => {
    const members = [box(0, 0, 2, 30), box(18, 0, 2, 30), box(2, 0, 16, 2), box(2, 28, 16, 2)];
    const loops = healed(...members);
    const { roles, frames } = framesFromLoops(loops, 'in');
    expect(loops.map(({ kind }) => kind).sort()).toEqual(['cell', 'cell', 'cell', 'cell', 'cell', 'outline']);
    expect(roles.filter(({ note }) => note === 'touches-the-outline')).toHaveLength(4);
    expect(frames).toHaveLength(1);
    expect([frames[0]!.width, frames[0]!.height]).toEqual([20, 30]);
    expect(contourDifference(tracedContours(frames[0]!.outline).contours.openings[0]!.contour, box(2, 2, 16, 26))).toBe(
      0,
    );
  });

  test('of two frames drawn edge to edge, then each is a frame and the line round both is left out', () => {
    const { roles, frames } = framesFromLoops(healed(box(0, 0, 10, 20), box(10, 0, 10, 20), box(2, 2, 6, 16)), 'in');
    expect(frames.map(({ width, openingLoops }) => [width, openingLoops.length])).toEqual([
      [10, 1],
      [10, 0],
    ]);
    expect(roles.filter(({ note }) => note === 'only-round-cells')).toHaveLength(1);
  });

  test('of which there are 20,000, then each finds its own', () => {
    const loops = loopsOf(
      ...Array.from({ length: 10_000 }, (_, i) => {
        const [x, y] = [(i % 100) * 30, Math.floor(i / 100) * 30];
        return [box(x, y, 20, 20), box(x + 2, y + 2, 16, 16)];
      }).flat(),
    );
    const { frames } = framesFromLoops(loops, 'mm');
    expect(frames).toHaveLength(10_000);
    expect(frames.every((f) => f.openingLoops.length === 1 && f.openingLoops[0] === f.perimeterLoop + 1)).toBe(true);
  });
});

describe('When a person changes roles', () => {
  const loops = loopsOf(
    box(0, 0, 40, 30),
    box(2, 2, 16, 26),
    box(4, 4, 10, 20),
    box(3, -1, 0.76, 32),
    box(50, 0, 5, 5),
  );
  const apply = (...roles: Parameters<typeof applyRoles>[1]) => applyRoles(loops, roles, 'in');

  test('then an opening belongs to the smallest perimeter that holds it, and a perimeter in another is a problem', () => {
    const made = apply('perimeter', 'perimeter', 'opening', 'leave-out', 'leave-out');
    expect(made.frames.map((f) => [f.perimeterLoop, f.openingLoops])).toEqual([
      [0, []],
      [1, [2]],
    ]);
    expect(made.problems).toMatchObject([{ code: 'perimeter-in-perimeter', loop: 1 }]);
  });

  test('then an opening that lies in no perimeter is a problem', () => {
    expect(apply('perimeter', 'opening', 'leave-out', 'leave-out', 'opening').problems).toMatchObject([
      { code: 'in-no-perimeter', loop: 4 },
    ]);
    expect(apply('opening', 'leave-out', 'leave-out', 'leave-out', 'leave-out').problems).toMatchObject([
      { code: 'no-perimeter', loop: null },
      { code: 'in-no-perimeter', loop: 0 },
    ]);
  });

  test('then a rectangle becomes a dado along its longer side, also where it runs past the frame', () => {
    const [frame] = apply('perimeter', 'opening', 'leave-out', 'dado', 'leave-out').frames;
    expect(frame!.dados).toEqual([{ runs: 'vertical', at: 3, width: 0.76, from: -1, to: 31 }]);
    expect(frame!.dadoLoops).toEqual([3]);
    const flat = applyRoles(loopsOf(box(5, 5, 40, 30), box(6, 7.5, 30, 0.75)), ['perimeter', 'dado'], 'in');
    expect(flat.frames[0]!.dados).toEqual([{ runs: 'horizontal', at: 2.5, width: 0.75, from: 1, to: 31 }]);
  });

  test('then a loop that is no upright rectangle is no dado', () => {
    const skew: Contour = {
      closed: true,
      vertices: box(3, 3, 1, 10).vertices.map((v) => ({ ...v, x: v.x + v.y / 50 })),
    };
    const round: Contour = { closed: true, vertices: [3, 9].map((x) => ({ x, y: 5, bulge: 1 })) };
    const made = applyRoles(loopsOf(box(0, 0, 40, 30), skew, round), ['perimeter', 'dado', 'dado'], 'in');
    expect(made.frames[0]!.dados).toEqual([]);
    expect(made.problems.map(({ code, loop }) => [code, loop])).toEqual([
      ['no-dado', 1],
      ['no-dado', 2],
    ]);
  });

  test('and says the drawing is a back view, then all is mirrored about the frame’s own middle', () => {
    const made = applyRoles(loops, ['perimeter', 'opening', 'leave-out', 'dado', 'leave-out'], 'in', { view: 'back' });
    expect(made.frames[0]!.dados).toEqual([{ runs: 'vertical', at: 40 - 3.76, width: 0.76, from: -1, to: 31 }]);
    expect(tracedContours(made.frames[0]!.outline).contours.openings[0]!.extents).toEqual({
      minX: 22,
      maxX: 38,
      minY: 2,
      maxY: 28,
    });
  });

  test('and there are not as many roles as loops, then it throws', () => {
    expect(() => applyRoles(loops, ['perimeter'], 'in')).toThrow('got 1, takes 5');
  });
});

test('When random frames lie side by side in one messed-up drawing far away, then each comes back as it was', () => {
  fc.assert(
    fc.property(arbitraryFrame, arbitraryFrame, arbitraryMess, fc.constantFrom(0, 5e8), (one, two, mess, far) => {
      const solved = [one, two].map(
        ({ outline, unit }) => outline.kind === 'members' && membersContours(outline, unit),
      );
      fc.pre(
        solved.every(
          (s) => s && s.findings.length === 0 && s.contours.openings.every((o) => o.width > 0.5 && o.height > 0.5),
        ),
      );
      const contours = solved.flatMap((s) => (s ? [s.contours] : []));
      const drawn = contours.map(({ perimeter, openings }, i) =>
        [perimeter, ...openings.map((o) => o.contour)].map((c) =>
          placeContour({ sx: 1, sy: 1, dx: 100 * i, dy: 0 }, c),
        ),
      );
      const rows = messUp(explode(drawn.flat()), mess).map((row) => moved(row, far, far));
      const { frames, problems } = framesFromLoops(healCurves(curvesOf(rows), { unit: 'in' }).loops, 'in');
      expect(problems).toEqual([]);
      expect(frames).toHaveLength(2);
      // In reading order the one whose top is higher comes first, unless both are level.
      const byLeft = frames.toSorted(
        (p, q) => Math.abs(p.width - contours[0]!.width) - Math.abs(q.width - contours[0]!.width),
      );
      const level = Math.abs(contours[0]!.width - contours[1]!.width) < 1e-6;
      byLeft.forEach((frame, i) => {
        const wanted = level ? undefined : contours[i]!;
        if (!wanted) return;
        const made = tracedContours(frame.outline);
        expect(made.findings).toEqual([]);
        expect(contourDifference(made.contours.perimeter, wanted.perimeter)).toBeLessThan(5e-7);
        expect(made.contours.openings).toHaveLength(wanted.openings.length);
        for (const { contour } of wanted.openings)
          expect(Math.min(...made.contours.openings.map((o) => contourDifference(o.contour, contour)))).toBeLessThan(
            5e-7,
          );
      });
    }),
    { numRuns: 120, maxSkipsPerRun: 300 },
  );
});

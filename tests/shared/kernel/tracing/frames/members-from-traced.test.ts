import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import { rectangle } from '#shared/kernel/contour/make-contour.ts';
import { membersContours } from '#shared/kernel/frame/members-contours.ts';
import type {
  LayoutPart,
  MembersOutline,
  TracedOutline,
  TracedVertex,
} from '#shared/kernel/particulars/particulars.ts';
import { membersFromTraced } from '#shared/kernel/tracing/frames/members-from-traced.ts';
import { arbitraryFrame } from '../../../../builders/arbitrary-frame.ts';
import { contourDifference } from '../../../../builders/same-contour.ts';
import { workedExample } from '../../../../builders/worked-example.ts';

const vertices = (c: Contour): TracedVertex[] => c.vertices.map((v) => [v.x, v.y, v.bulge]);

/** A members outline as it would be traced: its contours only. */
function traced(outline: MembersOutline): TracedOutline {
  const { contours } = membersContours(outline, 'in');
  return {
    kind: 'traced',
    perimeter: vertices(contours.perimeter),
    openings: contours.openings.map((o) => vertices(o.contour)),
  };
}

const frame = (layout: LayoutPart, more: Partial<MembersOutline> = {}): MembersOutline => ({
  kind: 'members',
  width: 40,
  height: 30,
  stiles: { left: 2, right: 1.5 },
  rails: { top: 1.75, bottom: 1.25 },
  feet: 0,
  layout,
  ...more,
});

const box = (minX: number, minY: number, width: number, height: number) =>
  vertices(rectangle({ minX, minY, maxX: minX + width, maxY: minY + height }));
const tracedOf = (...openings: TracedVertex[][]): TracedOutline => ({
  kind: 'traced',
  perimeter: box(0, 0, 40, 30),
  openings,
});

const outlineOf = (outline: TracedOutline): MembersOutline => {
  const made = membersFromTraced(outline, 'in');
  if (!made.ok) throw new Error(made.problem.message);
  return made.outline;
};
const problemOf = (outline: TracedOutline) => {
  const made = membersFromTraced(outline, 'in');
  return made.ok ? 'none' : made.problem.code;
};

const opening = (label: string) => ({ opening: { label } });

describe('When a traced frame is made of stiles and rails', () => {
  test('then it becomes just the members that it was drawn from, sizes only where parts differ', () => {
    const layouts: LayoutPart[] = [
      opening('A'),
      { columns: [opening('A'), opening('B'), opening('C')], between: 1.5 },
      { rows: [{ ...opening('A'), size: 6 }, opening('B'), opening('C')], between: 1.25 },
      { columns: [opening('A'), { rows: [opening('B'), opening('C')], between: 2 }], between: 1.5 },
      { columns: [opening('A'), { ...opening('B'), size: 10 }], between: 1.5 },
      { rows: [{ columns: [opening('A'), opening('B')], between: 1 }, opening('C')], between: 1 },
      { opening: { label: 'A', arch: 2.5 } },
    ];
    for (const layout of layouts)
      for (const feet of [0, 3.5]) expect(outlineOf(traced(frame(layout, { feet })))).toEqual(frame(layout, { feet }));
  });

  test('then the worked example is its own again, but for nothing', () => {
    const { outline } = workedExample();
    if (outline.kind !== 'members') throw new Error('the worked example has members');
    expect(outlineOf(traced(outline))).toEqual(outline);
  });

  test('whose mid-stiles are of two widths, then the wider ones part what the narrower divide', () => {
    const made = outlineOf(tracedOf(box(2, 2, 8, 26), box(11, 2, 8, 26), box(21, 2, 17, 26)));
    expect(made.layout).toEqual({
      columns: [{ columns: [opening('A'), opening('B')], between: 1 }, opening('C')],
      between: 2,
    });
  });

  test('whose rows are divided nearly alike, then they stay rows', () => {
    const row = (between: number, ...labels: string[]) => ({ columns: labels.map(opening), between });
    const layout = { rows: [row(1.9375, 'A', 'B', 'C'), row(1.936751, 'D', 'E', 'F')], between: 1 };
    const small = frame(layout, { width: 20, height: 20, stiles: { left: 1, right: 1 }, rails: { top: 1, bottom: 1 } });
    expect(outlineOf(traced(small))).toEqual(small);
  });

  test('with a square opening, then that stays square', () => {
    const made = outlineOf({ ...tracedOf(box(2, 2, 17, 26), box(21, 2, 17, 26)), squareOpenings: [1] });
    expect(made.layout).toMatchObject({ columns: [opening('A'), { opening: { label: 'B', edge: 'square' } }] });
  });

  test('on random frames, then the members give the same contours', () => {
    let withFeet = 0;
    let arched = 0;
    fc.assert(
      fc.property(arbitraryFrame, ({ outline, unit }) => {
        if (outline.kind !== 'members') return;
        const wanted = membersContours(outline, unit);
        fc.pre(wanted.findings.length === 0 && wanted.contours.openings.every((o) => o.width > 0.5 && o.height > 0.5));
        const made = membersContours(outlineOf(traced(outline)), unit);
        expect(made.findings).toEqual([]);
        expect(contourDifference(made.contours.perimeter, wanted.contours.perimeter)).toBeLessThan(1e-9);
        expect(made.contours.openings).toHaveLength(wanted.contours.openings.length);
        for (const { contour } of wanted.contours.openings)
          expect(Math.min(...made.contours.openings.map((o) => contourDifference(o.contour, contour)))).toBeLessThan(
            1e-8,
          );
        if (outline.feet > 0) withFeet++;
        if (wanted.contours.openings.some((o) => o.arch > 0)) arched++;
      }),
      { numRuns: 400, maxSkipsPerRun: 300 },
    );
    expect(Math.min(withFeet, arched)).toBeGreaterThan(50);
  });
});

describe('When a traced frame is not made of stiles and rails', () => {
  test('then it says why', () => {
    const two = tracedOf(box(2, 2, 17, 26), box(21, 2, 17, 26));
    const cut: TracedVertex[] = [
      [0, 0],
      [40, 0],
      [40, 25],
      [35, 30],
      [0, 30],
    ];
    const bow: TracedVertex[] = [
      [0, 0],
      [40, 30],
      [40, 0],
      [0, 30],
    ];
    expect(problemOf(two)).toBe('none');
    expect(problemOf({ ...two, perimeter: cut })).toBe('perimeter-no-rectangle');
    expect(problemOf({ ...two, perimeter: bow })).toBe('outline-unsound');
    expect(problemOf(tracedOf())).toBe('no-openings');
    expect(
      problemOf(
        tracedOf(box(2, 2, 17, 26), [
          [21, 2],
          [38, 2],
          [30, 28],
        ]),
      ),
    ).toBe('opening-no-rectangle');
    expect(
      problemOf(
        tracedOf([
          [2, 2],
          [19, 2],
          [19, 20, -0.2],
          [2, 20],
        ]),
      ),
    ).toBe('opening-no-rectangle');
    // Not as high as its neighbour; four about a fifth, like sails of a mill.
    expect(problemOf(tracedOf(box(2, 2, 17, 26), box(21, 2, 17, 20)))).toBe('no-layout');
    const mill = [box(2, 2, 20, 8), box(24, 2, 14, 16), box(16, 20, 22, 8), box(2, 12, 12, 16), box(16, 12, 6, 6)];
    expect(problemOf(tracedOf(...mill))).toBe('no-layout');
    const feet: TracedVertex[] = [
      [0, 0],
      [5, 0],
      [5, 3],
      [38, 3],
      [38, 0],
      [40, 0],
      [40, 30],
      [0, 30],
    ];
    expect(problemOf({ ...tracedOf(box(2, 5, 36, 20)), perimeter: feet })).toBe('feet-beside-stiles');
  });
});

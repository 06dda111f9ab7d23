import { describe, expect, test } from 'vitest';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { heightAtRadius } from '#shared/kernel/cutters/height-at-radius.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { MembersOutline } from '#shared/kernel/particulars/particulars.ts';
import { placeExtents } from '#shared/kernel/placing/place.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { expectNear } from '../../builders/close-to.ts';
import { contoursIn, lineSet, lineSets } from '../../builders/line-sets.ts';
import { dado, workedExample } from '../../builders/worked-example.ts';

/** The table of the worked example, row by row, to six decimals. The numbers are the table's, worked out by hand. */
const SIX = 5e-7;
const EXACT = 1e-9;

const frame = workFrame(workedExample());
const { cutters, thickness } = workedExample();
const box = (minX: number, minY: number, maxX: number, maxY: number) => ({ minX, minY, maxX, maxY });

describe('When the worked example is worked', () => {
  test('then no finding stops it', () => {
    expect(frame.findings.filter((finding) => finding.level === 'stop')).toEqual([]);
  });

  test('then openings A and B are 14 × 27.5 each', () => {
    expect(frame.contours.openings.map((opening) => opening.label)).toEqual(['A', 'B']);
    const [a, b] = frame.contours.openings;
    expectNear(a!.extents, box(1.75, 1.25, 15.75, 28.75), EXACT);
    expectNear(b!.extents, box(17.25, 1.25, 31.25, 28.75), EXACT);
    expect([a!.width, a!.height, b!.width, b!.height]).toEqual([14, 27.5, 14, 27.5]);
  });

  test('then the blank is 35.5 × 33', () => {
    expectNear(frame.blank.rough, box(0, 0, 35.5, 33), EXACT);
  });

  test('then Left end is at x 0.245…1.005, y −0.1875…30.6875 in frame view', () => {
    expectNear(frame.dados[0]!.extents, box(0.245, -0.1875, 1.005, 30.6875), EXACT);
  });

  test('then Left end is at x 33.245…34.005, y 1.0625…31.9375 in the back setup', () => {
    expectNear(
      placeExtents(frame.back.placement, frame.dados[0]!.extents),
      box(33.245, 1.0625, 34.005, 31.9375),
      EXACT,
    );
  });

  test('then Right end is at x 1.495…2.255 in the back setup', () => {
    const { minX, maxX } = placeExtents(frame.back.placement, frame.dados[1]!.extents);
    expectNear({ minX, maxX }, { minX: 1.495, maxX: 2.255 }, EXACT);
  });

  test('then the dados, which all touch, are one outline that reaches from 1.495 to 34.005', () => {
    const outlines = contoursIn(lineSets(frame.back, 'DADO'));
    expect(outlines).toHaveLength(1);
    expectNear(contourExtents(outlines[0]!), box(1.495, 1.0625, 34.005, 31.9375), EXACT);
  });

  test('then the squared edges are x = 35.25 and y = 0.25 in the back setup', () => {
    expectNear(frame.blank.squaredCorner, { x: 35.25, y: 0.25 }, EXACT);
    const [line] = contoursIn([lineSet(frame.back, 'SQUARING')]);
    expect(line!.closed).toBe(false);
    const onEdges = line!.vertices.every((v) => Math.abs(v.x - 35.25) < EXACT || Math.abs(v.y - 0.25) < EXACT);
    expect(onEdges, JSON.stringify(line)).toBe(true);
    // Past the rough edges by the cutter's radius: 3/16.
    expectNear(contourExtents(line!), box(-0.1875, 0.25, 35.25, 33.1875), EXACT);
  });

  test('then opening A is at (2.75, 2.25)–(16.75, 29.75) in the front setup', () => {
    expectNear(contourExtents(contoursIn([lineSet(frame.front, 'OPENING')])[0]!), box(2.75, 2.25, 16.75, 29.75), EXACT);
  });

  test('then the tip runs at depth 0.8125, its axis 0.082161 inside', () => {
    const axis = lineSet(frame.front, 'OPENING_AXIS');
    expect(axis.depth).toBeCloseTo(0.8125, 9);
    const { minX, minY, maxX, maxY } = contourExtents(contoursIn([axis])[0]!);
    const inside = { left: minX - 2.75, bottom: minY - 2.25, right: 16.75 - maxX, top: 29.75 - maxY };
    expectNear(inside, { left: 0.082161, bottom: 0.082161, right: 0.082161, top: 0.082161 }, SIX);
  });

  test('then the opening is smaller at the back by 0.019639 a side', () => {
    const smaller = radiusAtHeight(cutters.opening, 0.8125) - radiusAtHeight(cutters.opening, 0.8125 - thickness);
    expect(Math.abs(smaller - 0.019639)).toBeLessThanOrEqual(SIX);
  });

  test('then the flank leaves the nose with radius 0.062479 at height 0.060864', () => {
    expect(Math.abs(radiusAtHeight(cutters.opening, 0.060864) - 0.062479)).toBeLessThanOrEqual(SIX);
    expect(
      Math.abs(heightAtRadius(cutters.opening, 0.0625 * Math.cos((1.5 * Math.PI) / 180)) - 0.060864),
    ).toBeLessThanOrEqual(SIX);
  });

  test('then a stopped end is 0.144488 longer', () => {
    const stopped = workFrame(workedExample({ dados: [dado({ from: 5, to: 20, ends: ['stopped', 'stopped'] })] }));
    const { minY, maxY } = stopped.dados[0]!.extents;
    expectNear({ minY, maxY }, { minY: 5 - 0.144488, maxY: 20 + 0.144488 }, SIX);
  });

  test('then an arch of rise 1.5 over 14 has radius 17.083333 and bulge 0.214286', () => {
    const outline = workedExample().outline as MembersOutline;
    const arched = workFrame(
      workedExample({
        outline: { ...outline, layout: { columns: [{ opening: { arch: 1.5 } }, { opening: {} }], between: 1.5 } },
      }),
    );
    const opening = arched.contours.openings[0]!;
    const heads = opening.contour.vertices.filter((vertex) => vertex.bulge !== 0);
    expect(heads).toHaveLength(1);
    expect(Math.abs(heads[0]!.bulge - 0.214286)).toBeLessThanOrEqual(SIX);
    // R = c(1 + b²) / 4b, the bulge's own definition (DXF Reference, LWPOLYLINE group 42).
    const b = heads[0]!.bulge;
    expect(Math.abs((14 * (1 + b * b)) / (4 * b) - 17.083333)).toBeLessThanOrEqual(SIX);
    // The opening's height is to the top of the arch.
    expectNear(contourExtents(opening.contour), box(1.75, 1.25, 15.75, 28.75), EXACT);
  });

  test('then a 30° V-cutter has radius 0.027800 at 0.10375', () => {
    const vee = { kind: 'vee', includedAngle: 30, fluteLength: 1 } as const;
    expect(Math.abs(radiusAtHeight(vee, 0.10375) - 0.0278)).toBeLessThanOrEqual(SIX);
  });

  test('then passes of 0.5 to 0.8125 are 0.5 and 0.8125', () => {
    const opening = { ...cutters.opening, maxPass: 0.5 };
    const worked = workFrame(workedExample({ cutters: { ...cutters, opening } }));
    expect(lineSet(worked.front, 'OPENING_AXIS').passes).toEqual([0.5, 0.8125]);
  });
});

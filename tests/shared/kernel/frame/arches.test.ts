import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import type { MembersOutline } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const outline = workedExample().outline as MembersOutline;
/** An opening as wide as `chord` with an arch of `rise`, 27.5 high. */
const arched = (chord: number, rise: number) =>
  workFrame(
    workedExample({ outline: { ...outline, width: chord + 3.5, layout: { opening: { arch: rise } } }, dados: [] }),
  );

describe('When an opening has an arch', () => {
  test('then its radius is (c²/4 + h²)/2h (Machinery’s Handbook, circular segments), its top the opening’s, its springing h lower', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 5, max: 40, noNaN: true }),
        fc.double({ min: 0.02, max: 0.49, noNaN: true }),
        (chord, share) => {
          const rise = chord * share;
          const [opening] = arched(chord, rise).contours.openings;
          const { vertices } = opening!.contour;
          const at = vertices.findIndex((v) => v.bulge !== 0);
          const [a, b] = [vertices[at]!, vertices[(at + 1) % vertices.length]!];
          expect(Math.abs(a.x - b.x)).toBeCloseTo(chord, 9);
          expect([a.y, b.y]).toEqual([expect.closeTo(28.75 - rise, 9), expect.closeTo(28.75 - rise, 9)]);
          // The bulge is tan(arc angle / 4) (DXF Reference, group 42); half the arc's angle is asin(c / 2R).
          const radius = (chord ** 2 / 4 + rise ** 2) / (2 * rise);
          expect(a.bulge).toBeCloseTo(Math.tan(Math.asin(chord / 2 / radius) / 2), 9);
          expect(contourExtents(opening!.contour)).toEqual({
            minX: expect.closeTo(1.75, 9),
            minY: expect.closeTo(1.25, 9),
            maxX: expect.closeTo(1.75 + chord, 9),
            maxY: expect.closeTo(28.75, 9),
          });
          // Rectangle up to the springing and circular segment above it: R²/2·(θ − sin θ), same handbook.
          const angle = 2 * Math.asin(chord / 2 / radius);
          const segment = (radius ** 2 / 2) * (angle - Math.sin(angle));
          expect(contourArea(opening!.contour)).toBeCloseTo(chord * (27.5 - rise) + segment, 6);
        },
      ),
      { numRuns: 200 },
    );
  });

  test('of half its width, then the head is half a circle', () => {
    const [opening] = arched(10, 5).contours.openings;
    expect(Math.max(...opening!.contour.vertices.map((v) => v.bulge))).toBeCloseTo(1, 12);
  });

  test('higher than the opening, then that is a stop and nothing throws', () => {
    expect(arched(60, 28).findings.some((f) => f.level === 'stop')).toBe(true);
  });
});

import fc from 'fast-check';
import type { Contour, Vertex } from '#shared/kernel/contour/contour.ts';

/**
 * Closed counter-clockwise outlines about 0, 0 of lines and arcs, star-shaped in their vertices: 3 to 9 of them, 2 to 6 from the middle.
 * Arcs have |bulge| from 0.05 to 0.35, so that an outline may bulge over itself: such ones must be told apart by the test.
 */
export const arbitraryOutline: fc.Arbitrary<Contour> = fc
  .array(
    fc.record({
      step: fc.double({ min: 0.6, max: 1.4, noNaN: true }),
      radius: fc.double({ min: 2, max: 6, noNaN: true }),
      bulge: fc.oneof(
        { weight: 2, arbitrary: fc.constant(0) },
        { weight: 1, arbitrary: fc.double({ min: 0.05, max: 0.35, noNaN: true }) },
        { weight: 1, arbitrary: fc.double({ min: -0.35, max: -0.05, noNaN: true }) },
      ),
    }),
    { minLength: 3, maxLength: 9 },
  )
  .map((corners) => {
    const turn = corners.reduce((sum, corner) => sum + corner.step, 0);
    let angle = 0;
    const vertices: Vertex[] = corners.map(({ step, radius, bulge }) => {
      angle += (step / turn) * 2 * Math.PI;
      return { x: radius * Math.cos(angle), y: radius * Math.sin(angle), bulge };
    });
    return { closed: true, vertices };
  });

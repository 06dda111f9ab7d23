import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import type { Contour, Point } from '#shared/kernel/contour/contour.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { contourLength } from '#shared/kernel/contour/contour-length.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { offsetContour } from '#shared/kernel/contour/offset-contour.ts';
import { arbitraryOutline } from '../../../builders/arbitrary-contour.ts';
import { differenceArea, offsetArea, unionArea } from '../../../setup/clipper.ts';

const CHORD = 2e-5;
/** What flattening may add or take away: 2/3 of the chord's rise along the whole outline, on both sides of the comparison. */
const slack = (contour: Contour) => 2 * CHORD * contourLength(contour) + 1e-6;

const square = (side: number, bulge = 0): Contour => ({
  closed: true,
  vertices: [
    { x: 0, y: 0, bulge: 0 },
    { x: side, y: 0, bulge: 0 },
    { x: side, y: side, bulge },
    { x: 0, y: side, bulge: 0 },
  ],
});

/** Direction of travel where the segment from a to b leaves a, or reaches b: the chord turned by half the arc's angle (2·atan bulge). */
function direction(a: Point & { bulge: number }, b: Point, atEnd: boolean): number {
  return Math.atan2(b.y - a.y, b.x - a.x) + (atEnd ? 2 : -2) * Math.atan(a.bulge);
}

/** Whether some corner that an offset opens is one of an arc: there our arc runs on round its circle, where Clipper's mitre is straight. */
function opensAtAnArc({ vertices }: Contour, distance: number): boolean {
  return vertices.some((v, i) => {
    const before = vertices.at(i - 1)!;
    const after = vertices[(i + 1) % vertices.length]!;
    const turn = Math.sin(direction(v, after, false) - direction(before, v, true));
    return turn * distance > 0 && (v.bulge !== 0 || before.bulge !== 0);
  });
}

/** An outline that does not run over itself has the area of its own union (Clipper's). */
const isSimple = (outline: Contour) =>
  Math.abs(unionArea([flattenContour(outline, CHORD)]) - contourArea(outline)) < slack(outline);

describe('When an outline of lines and arcs is offset', () => {
  test('then it has the area that clipper2-wasm finds, on at least 200 outlines', () => {
    let compared = 0;
    let withArcs = 0;
    fc.assert(
      fc.property(arbitraryOutline, fc.double({ min: -0.4, max: 0.4, noNaN: true }), (outline, distance) => {
        fc.pre(Math.abs(distance) > 0.01 && !opensAtAnArc(outline, distance) && isSimple(outline));
        const moved = offsetContour(outline, distance);
        if (!moved.ok) return;
        const wanted = offsetArea(flattenContour(outline, CHORD), distance);
        expect(Math.abs(contourArea(moved.contour) - wanted)).toBeLessThan(slack(outline));
        compared++;
        if (outline.vertices.some((vertex) => vertex.bulge !== 0)) withArcs++;
      }),
      { numRuns: 450, maxSkipsPerRun: 200 },
    );
    expect(compared).toBeGreaterThanOrEqual(200);
    expect(withArcs).toBeGreaterThanOrEqual(200);
  });

  test('then every arc is still an arc about its old centre, and the number of vertices is the same', () => {
    fc.assert(
      fc.property(arbitraryOutline, fc.double({ min: -0.3, max: 0.3, noNaN: true }), (outline, distance) => {
        const moved = offsetContour(outline, distance);
        if (!moved.ok) return;
        expect(moved.contour.vertices).toHaveLength(outline.vertices.length);
        moved.contour.vertices.forEach((v, i) => {
          const old = outline.vertices[i]!;
          expect(Math.sign(v.bulge)).toBe(Math.sign(old.bulge));
          if (v.bulge === 0) return;
          const was = circle(outline, i);
          const is = circle(moved.contour, i);
          expect(Math.hypot(is.x - was.x, is.y - was.y)).toBeLessThan(1e-7 * Math.max(1, was.radius));
          expect(is.radius).toBeCloseTo(was.radius + Math.sign(v.bulge) * distance, 6);
        });
      }),
      { numRuns: 400 },
    );
  });

  test('by little against its features, then it is never refused', () => {
    fc.assert(
      fc.property(arbitraryOutline, fc.constantFrom(-0.002, 0.002), (outline, distance) => {
        fc.pre(isSimple(outline) && isRoomy(outline));
        expect(offsetContour(outline, distance)).toMatchObject({ ok: true });
      }),
      { numRuns: 200, maxSkipsPerRun: 500 },
    );
  });

  test('out and in again, then it is what it was', () => {
    fc.assert(
      fc.property(arbitraryOutline, fc.double({ min: 0.01, max: 0.2, noNaN: true }), (outline, distance) => {
        const out = offsetContour(outline, distance);
        const back = out.ok && offsetContour(out.contour, -distance);
        if (!back || !back.ok) return;
        expect(differenceArea([flattenContour(back.contour, CHORD)], [flattenContour(outline, CHORD)])).toBeLessThan(
          slack(outline) * 2,
        );
      }),
      { numRuns: 100 },
    );
  });
});

/** Centre and radius of the arc that leaves vertex i (DXF Reference, group 42). */
function circle({ vertices }: Contour, i: number): Point & { radius: number } {
  const a = vertices[i]!;
  const b = vertices[(i + 1) % vertices.length]!;
  const k = (1 - a.bulge ** 2) / (4 * a.bulge);
  const chord = Math.hypot(b.x - a.x, b.y - a.y);
  return {
    x: (a.x + b.x) / 2 - (b.y - a.y) * k,
    y: (a.y + b.y) / 2 + (b.x - a.x) * k,
    radius: (chord * (1 + a.bulge ** 2)) / (4 * Math.abs(a.bulge)),
  };
}

/** No corner sharper than 20°, in or out, and no place where the outline comes back near itself. */
function isRoomy(outline: Contour): boolean {
  const { vertices } = outline;
  const gentle = vertices.every((v, i) => {
    const turn = direction(v, vertices[(i + 1) % vertices.length]!, false) - direction(vertices.at(i - 1)!, v, true);
    return Math.cos(turn) > -Math.cos((20 * Math.PI) / 180) && Math.abs(Math.sin(turn)) > 0.05;
  });
  if (!gentle) return false;
  const points = flattenContour(outline, 0.01);
  const n = points.length;
  return points.every((p, i) =>
    points.every((q, j) => {
      const apart = Math.min(Math.abs(i - j), n - Math.abs(i - j));
      return apart <= n / 6 || Math.hypot(p.x - q.x, p.y - q.y) > 0.3;
    }),
  );
}

describe('When a square is offset', () => {
  test('outwards, then its corners are mitred', () => {
    const moved = offsetContour(square(10), 1);
    expect(moved.ok && contourExtents(moved.contour)).toEqual({ minX: -1, minY: -1, maxX: 11, maxY: 11 });
    expect(moved.ok && contourArea(moved.contour)).toBeCloseTo(144, 9);
  });

  test('inwards by less than half its side, then it is a smaller square; by half or more, then it collapses', () => {
    const moved = offsetContour(square(10), -4.999);
    expect(moved.ok && contourArea(moved.contour)).toBeCloseTo(0.002 ** 2, 9);
    for (const distance of [-5, -5.001, -7, -30]) expect(offsetContour(square(10), distance).ok).toBe(false);
  });

  test('by nothing, then nothing moves', () => {
    const moved = offsetContour(square(10), 0);
    expect(moved.ok && moved.contour.vertices).toEqual(square(10).vertices);
  });
});

describe('When an arc cannot shrink any more', () => {
  // A head arc of bulge 0.5 over 10: R = 10·(1 + 0.25)/(4·0.5) = 6.25.
  test.each([
    [-1, true],
    [-4.9, true],
    [-5.1, false],
    [-6.25, false],
    [-6.3, false],
  ])('an inward offset of %d, then ok is %s', (distance, ok) => {
    expect(offsetContour(square(10, 0.5), distance).ok).toBe(ok);
  });

  test('of a hollow arc, then the outline opens outwards only to its radius and says which', () => {
    const hollow = square(10, -0.9);
    const refused = offsetContour(hollow, 5.1);
    expect(refused).toMatchObject({ ok: false, reason: 'arc' });
    expect(!refused.ok && refused.radius).toBeCloseTo((10 * (1 + 0.81)) / 3.6, 9);
  });
});

describe('When an offset runs over itself, then it is refused with the place', () => {
  // A slot 1 wide that opens to a room: inwards by 0.6 its walls pass each other, though no side is used up.
  const slot: [number, number][] = [
    [0, 0],
    [4, 0],
    [4, 4],
    [8, 4],
    [8, 0],
    [12, 0],
    [12, 9],
    [8, 9],
    [8, 5],
    [4, 5],
    [4, 9],
    [0, 9],
  ];
  const room: Contour = { closed: true, vertices: slot.map(([x, y]) => ({ x, y, bulge: 0 })) };

  test('inwards by 0.4 it holds', () => expect(offsetContour(room, -0.4)).toMatchObject({ ok: true }));

  test('inwards by 0.6 it crosses in the slot', () => {
    const moved = offsetContour(room, -0.6);
    expect(moved.ok).toBe(false);
    expect(!moved.ok && [moved.at.x, moved.at.y].every(Number.isFinite)).toBe(true);
  });
});

describe('When the wrong thing is offset, then that throws with the value', () => {
  test('an open line', () => expect(() => offsetContour({ ...square(1), closed: false }, 0.1)).toThrow(/open/));
  test.each([NaN, Infinity])('by %d', (distance) =>
    expect(() => offsetContour(square(1), distance)).toThrow(String(distance)),
  );
});

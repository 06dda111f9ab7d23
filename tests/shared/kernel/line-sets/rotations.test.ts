import { describe, expect, test } from 'vitest';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import type { Contour, Point, Point3 } from '#shared/kernel/contour/contour.ts';
import { contourLength } from '#shared/kernel/contour/contour-length.ts';
import type { Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { placeContour, placeShape, unplace } from '#shared/kernel/placing/place.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { climbsIn, contoursIn, lineSet } from '../../../builders/line-sets.ts';
import { contourDifference } from '../../../builders/same-contour.ts';
import { workedExample } from '../../../builders/worked-example.ts';

/** A frame without any symmetry: a cut-off corner, an arched side, an opening with a full and a hollow arc and slanted sides. */
const PERIMETER: TracedVertex[] = [
  [0, 0],
  [24, 0],
  [24, 14],
  [19, 18],
  [0, 18, 0.2],
];
const OPENING: TracedVertex[] = [
  [3, 3],
  [12, 2, 0.25],
  [15, 9],
  [11, 14, -0.2],
  [4, 12],
];

/** The eight ways of laying a board down: four turns, and four turns over. Each is a matrix with its own inverse's transpose. */
const WAYS = [
  ['as it is', [1, 0, 0, 1]],
  ['turned by 90°', [0, -1, 1, 0]],
  ['turned by 180°', [-1, 0, 0, -1]],
  ['turned by 270°', [0, 1, -1, 0]],
  ['mirrored left and right', [-1, 0, 0, 1]],
  ['mirrored up and down', [1, 0, 0, -1]],
  ['mirrored about one diagonal', [0, 1, 1, 0]],
  ['mirrored about the other', [0, -1, -1, 0]],
] as const;

type Matrix = (typeof WAYS)[number][1];
const apply = ([a, b, c, d]: Matrix, { x, y }: Point): Point => ({ x: a * x + b * y, y: c * x + d * y });
const mirrors = ([a, b, c, d]: Matrix) => a * d - b * c < 0;

const turned = (m: Matrix, contour: TracedVertex[]): TracedVertex[] =>
  contour.map(([x, y, bulge = 0]) => {
    const p = apply(m, { x, y });
    return [p.x, p.y, mirrors(m) ? -bulge : bulge];
  });

const frame = (m: Matrix): Particulars =>
  workedExample({
    outline: { kind: 'traced', perimeter: turned(m, PERIMETER), openings: [turned(m, OPENING)] },
    dados: [],
  });

/** Lines of the front in frame view. */
function work(m: Matrix): {
  axis: Contour;
  perimeter: Contour;
  opening: Contour;
  lifts: readonly (readonly Point3[])[];
  codes: string[];
  size: number[];
} {
  const { front, contours, findings } = workFrame(frame(m));
  const back = unplace(front.placement);
  const lifted = lineSet(front, 'CORNER_LIFT');
  return {
    axis: placeContour(back, contoursIn([lineSet(front, 'OPENING_AXIS')])[0]!),
    perimeter: contours.perimeter,
    opening: contours.openings[0]!.contour,
    lifts: climbsIn([{ ...lifted, shapes: lifted.shapes.map((shape) => placeShape(back, shape)) }]),
    codes: findings.map((finding) => finding.code),
    size: [contours.width, contours.height],
  };
}

const plain = work([1, 0, 0, 1]);

/** Turns a contour and moves it as `from` lies to `to`, so that two frames can be laid on one another. */
function carry(m: Matrix, contour: Contour, by: Point): Contour {
  const vertices = contour.vertices.map((v) => {
    const p = apply(m, v);
    return { x: p.x + by.x, y: p.y + by.y, bulge: mirrors(m) ? -v.bulge : v.bulge };
  });
  return { closed: contour.closed, vertices };
}

describe.each(WAYS)('When a traced frame is %s', (_, m) => {
  const other = work(m);
  const low = (points: readonly Point[], axis: 'x' | 'y') => Math.min(...points.map((p) => p[axis]));
  const moved = plain.opening.vertices.map((v) => apply(m, v));
  const by = {
    x: low(other.opening.vertices, 'x') - low(moved, 'x'),
    y: low(other.opening.vertices, 'y') - low(moved, 'y'),
  };

  test('then opening, axis and perimeter are turned with it', () => {
    for (const name of ['opening', 'axis', 'perimeter'] as const) {
      expect(contourDifference(other[name], carry(m, plain[name], by)), name).toBeLessThan(1e-9);
      expect(Math.abs(contourArea(other[name]))).toBeCloseTo(Math.abs(contourArea(plain[name])), 8);
      expect(contourLength(other[name])).toBeCloseTo(contourLength(plain[name]), 9);
    }
  });

  test('then its extents, arcs included, start at 0, 0', () => {
    const [width, height] = plain.size;
    expect(other.size).toEqual((m[0] === 0 ? [height, width] : [width, height]).map((n) => expect.closeTo(n!, 9)));
    // The arched side has rise c/2·b = 9 · 0.2 = 1.8 beyond x = 0 (circle geometry: h = bulge · c/2).
    expect(Math.max(...other.size)).toBeCloseTo(24 + 1.8, 9);
  });

  test('then each lift ends in the same corner at the same depth', () => {
    const ends = plain.lifts.map((points) => [points[0]!, points.at(-1)!].map((p) => ({ ...apply(m, p), z: p.z })));
    expect(other.lifts).toHaveLength(5);
    for (const points of other.lifts) {
      const nearest = Math.min(
        ...ends.map(([a, b]) => Math.max(distance(points[0]!, a!, by), distance(points.at(-1)!, b!, by))),
      );
      expect(nearest).toBeLessThan(1e-9);
    }
  });

  test('then the findings are the same', () => expect(other.codes).toEqual(plain.codes));
});

const distance = (p: Point3, q: Point3, by: Point) =>
  Math.max(Math.abs(p.x - q.x - by.x), Math.abs(p.y - q.y - by.y), Math.abs(p.z - q.z));

describe('When a traced contour starts at another vertex or runs the other way', () => {
  const shifted = (list: TracedVertex[]): TracedVertex[] => [...list.slice(2), ...list.slice(0, 2)];
  const backwards = (list: TracedVertex[]): TracedVertex[] =>
    list.map((_, i) => {
      const at = list.length - 1 - i;
      const [x, y] = list[at]!;
      return [x, y, -(list.at(at - 1)![2] ?? 0)];
    });

  test.each([
    ['another vertex', shifted],
    ['the other way', backwards],
  ])('%s, then the lines are the same', (_, change) => {
    const p = workedExample({
      outline: { kind: 'traced', perimeter: change(PERIMETER), openings: [change(OPENING)] },
      dados: [],
    });
    const { front, contours } = workFrame(p);
    const axis = placeContour(unplace(front.placement), contoursIn([lineSet(front, 'OPENING_AXIS')])[0]!);
    expect(contourDifference(axis, plain.axis)).toBeLessThan(1e-9);
    expect(contourDifference(contours.perimeter, plain.perimeter)).toBeLessThan(1e-9);
  });
});

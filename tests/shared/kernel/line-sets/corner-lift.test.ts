import { describe, expect, test } from 'vitest';
import type { Contour, Point, Point3 } from '#shared/kernel/contour/contour.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { offsetContour } from '#shared/kernel/contour/offset-contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { MembersOutline, Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { unplace, placeContour, placeShape } from '#shared/kernel/placing/place.ts';
import { liftChord } from '#shared/kernel/tolerances.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { contoursIn, lineSet } from '../../../builders/line-sets.ts';
import {
  placesAlong,
  reachInto,
  signedDistance,
  standsAlong,
  standsOf,
  type TipPath,
} from '../../../builders/sweep.ts';
import { workedExample } from '../../../builders/worked-example.ts';

/**
 * The cutter swept over a grid, by brute force: every stand of the axis line and of the lifts, against every place of a
 * grid about each corner, at several depths. Nothing behind the wall may be cut, and the corner must be reached.
 */
const TOLERANCE = liftChord('in') + 2e-6;
const STEP = 0.0025;
const THICKNESS = 0.75;

const tapered: Cutter = { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 };
const steep: Cutter = { kind: 'tapered', tipRadius: 0.03, sideAngle: 7, fluteLength: 1.25 };
const vee: Cutter = { kind: 'vee', includedAngle: 30, fluteLength: 1.5 };

const traced = (...opening: TracedVertex[]): Particulars =>
  workedExample({
    outline: {
      kind: 'traced',
      perimeter: [
        [0, 0],
        [20, 0],
        [20, 20],
        [0, 20],
      ],
      openings: [opening],
    },
    dados: [],
  });

const members = (arch: number): Particulars =>
  workedExample({
    outline: { ...(workedExample().outline as MembersOutline), layout: { opening: { arch } } },
    dados: [],
  });

interface Situation {
  name: string;
  frame: Particulars;
  /** Corners that are sharp, and so are lifted into. */
  corners: number;
}

const situations: Situation[] = [
  { name: 'square corners, line and line', frame: workedExample({ dados: [] }), corners: 8 },
  { name: 'corners of 60°, line and line', frame: traced([4, 4], [14, 4], [9, 4 + 5 * Math.sqrt(3)]), corners: 3 },
  {
    name: 'corners of 120°, line and line',
    frame: traced(
      [4, 10],
      [7, 4.803847577293368],
      [13, 4.803847577293368],
      [16, 10],
      [13, 15.196152422706632],
      [7, 15.196152422706632],
    ),
    corners: 6,
  },
  { name: 'an arch’s springing, line and arc', frame: members(2.5), corners: 4 },
  { name: 'a hollow side, line and arc', frame: traced([4, 4], [14, 4, -0.2], [14, 14], [4, 14]), corners: 4 },
  { name: 'a lens, arc and arc', frame: traced([4, 10, 0.5], [16, 10, 0.5]), corners: 2 },
  { name: 'a hollow and a full arc', frame: traced([4, 4, 0.15], [14, 4, -0.15], [14, 14], [4, 14]), corners: 4 },
];

/** One corner of an opening with all that the cutter does about it; frame view. */
interface Worked {
  corner: Point3;
  path: TipPath;
  /** The opening in the face, where the corner must be sharp. */
  face: Contour;
  cutter: Cutter;
  tipDepth: number;
}

function workCorners(p: Particulars): Worked[] {
  const { front, contours } = workFrame(p);
  const back = unplace(front.placement);
  const cutter = p.cutters.opening;
  const axis = lineSet(front, 'OPENING_AXIS');
  const axes = contoursIn([axis]).map((contour) => placeContour(back, contour));
  const lifts = lineSet(front, 'CORNER_LIFT').shapes.map((shape) => placeShape(back, shape));
  const held = p.edge.sizeHeldAt === 'back' ? p.thickness : 0;
  const widening = radiusAtHeight(cutter, axis.depth) - radiusAtHeight(cutter, axis.depth - held);
  return lifts.map((lift) => {
    if (lift.kind !== 'climb') throw new Error('a lift climbs');
    const corner = lift.points.at(-1)!;
    const index = contours.openings.findIndex((opening) => lift.of.includes(opening.id));
    const face = offsetContour(contours.openings[index]!.contour, widening);
    if (!face.ok) throw new Error('the opening in the face collapses');
    const around = standsOf(axes[index]!, axis.depth, corner, 0.8, STEP);
    return {
      corner,
      path: [...around, ...standsAlong(lift.points, STEP / 2)],
      face: face.contour,
      cutter,
      tipDepth: axis.depth,
    };
  });
}

/** The wall at a depth stands inside the face's by how much narrower the cutter is there. */
const wallInset = ({ cutter, tipDepth }: Worked, depth: number) =>
  radiusAtHeight(cutter, tipDepth) - radiusAtHeight(cutter, tipDepth - depth);

/** Places that must stay at a depth: all along the wall, and those of a grid that lie behind it. */
function placesThatStay(worked: Worked, depth: number): Point[] {
  const wall = offsetContour(worked.face, -wallInset(worked, depth));
  if (!wall.ok) throw new Error('the wall collapses');
  const polygon = flattenContour(wall.contour, 2e-6);
  return [
    ...placesAlong(wall.contour, worked.corner, NEAR, 0.005),
    ...grid(worked.corner).filter((p) => signedDistance(polygon, p) > 0),
  ];
}

/** Places that must be gone at the face: just inside the wall, and further in as far as the cutter's radius. */
function placesThatGo(worked: Worked): Point[] {
  const wide = radiusAtHeight(worked.cutter, worked.tipDepth);
  return [2e-4, 0.01, 0.3 * wide, 0.6 * wide, 0.95 * wide].flatMap((inset) => {
    const ring = offsetContour(worked.face, -inset);
    if (!ring.ok) throw new Error('the ring collapses');
    return placesAlong(ring.contour, worked.corner, NEAR, 0.005);
  });
}

const NEAR = 0.3;
const GRID = 0.025;

function grid(about: Point): Point[] {
  const ticks = Array.from({ length: 2 * Math.round(NEAR / GRID) + 1 }, (_, i) => i * GRID - NEAR);
  return ticks.flatMap((dx) => ticks.map((dy) => ({ x: about.x + dx, y: about.y + dy })));
}

const DEPTHS = [0, 0.01, 0.03, 0.0625, 0.1, 0.25, 0.5, THICKNESS];

const cutters: [string, Cutter, 'face' | 'back'][] = [
  ['a tapered cutter, size held at the face', tapered, 'face'],
  ['a tapered cutter, size held at the back', tapered, 'back'],
  ['a steeper tapered cutter', steep, 'face'],
  ['a V-cutter', vee, 'face'],
];

describe.each(cutters)('When %s lifts into a corner', (_, cutter, sizeHeldAt) => {
  describe.each(situations)('of $name', ({ frame, corners }) => {
    const p: Particulars = {
      ...frame,
      edge: { style: 'square', sizeHeldAt },
      cutters: { ...frame.cutters, opening: cutter },
    };
    const all = workCorners(p);
    // Of square and equal corners two are enough; where line and arc meet, both kinds are among the first four.
    const swept = all.slice(0, corners > 4 ? 2 : 4);

    test('then each sharp corner has one lift, which ends at the corner in the face', () => {
      expect(all).toHaveLength(corners);
      for (const { corner, face } of all) {
        expect(Math.min(...face.vertices.map((v) => Math.hypot(v.x - corner.x, v.y - corner.y)))).toBeLessThan(1e-9);
        expect(Math.abs(corner.z)).toBeLessThan(1e-9);
      }
    });

    test('then nothing behind the wall is cut, at any depth', () => {
      for (const worked of swept) {
        for (const depth of DEPTHS) {
          const cut = Math.max(...reachInto(worked.path, worked.cutter, placesThatStay(worked, depth), depth));
          expect(cut, `at depth ${depth} in the corner at ${worked.corner.x}, ${worked.corner.y}`).toBeLessThan(
            TOLERANCE,
          );
        }
      }
    });

    test('then the face is cut right into the corner', () => {
      for (const worked of swept) {
        const places = placesThatGo(worked);
        expect(places.length).toBeGreaterThan(100);
        expect(Math.min(...reachInto(worked.path, worked.cutter, places, 0))).toBeGreaterThan(-TOLERANCE);
      }
    });
  });
});

describe('When the cutter is not the one that the lift was worked for, then the sweep sees it', () => {
  const [worked] = workCorners(workedExample({ dados: [] }));

  test('a thousandth too wide: the wall is cut', () => {
    const wider: Cutter = { ...tapered, tipRadius: 0.0635 };
    expect(Math.max(...reachInto(worked!.path, wider, placesThatStay(worked!, 0), 0))).toBeGreaterThan(TOLERANCE);
  });

  test('a thousandth too narrow: the corner is not reached', () => {
    const narrower: Cutter = { ...tapered, tipRadius: 0.0615 };
    expect(Math.min(...reachInto(worked!.path, narrower, placesThatGo(worked!), 0))).toBeLessThan(-TOLERANCE);
  });
});

import { describe, expect, test } from 'vitest';
import type { Contour, Point } from '#shared/kernel/contour/contour.ts';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { offsetContour } from '#shared/kernel/contour/offset-contour.ts';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { MembersOutline, Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { unplace, placeContour, placeShape } from '#shared/kernel/placing/place.ts';
import { liftChord } from '#shared/kernel/tolerances.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { contoursIn, lineSet } from '../../../builders/line-sets.ts';
import { reachInto, signedDistance, standsAlong, standsOf, type TipPath } from '../../../builders/sweep.ts';
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
    outline: { kind: 'traced', perimeter: [[0, 0], [20, 0], [20, 20], [0, 20]], openings: [opening] },
    dados: [],
  });

const members = (arch: number): Particulars =>
  workedExample({ outline: { ...(workedExample().outline as MembersOutline), layout: { opening: { arch } } }, dados: [] });

interface Situation {
  name: string;
  frame: Particulars;
  /** Corners that are sharp, and so are lifted into. */
  corners: number;
}

const situations: Situation[] = [
  { name: 'square corners, line and line', frame: workedExample({ dados: [] }), corners: 8 },
  { name: 'corners of 60°, line and line', frame: traced([4, 4], [14, 4], [9, 4 + 5 * Math.sqrt(3)]), corners: 3 },
  { name: 'corners of 120°, line and line', frame: traced([4, 10], [7, 4.803847577293368], [13, 4.803847577293368], [16, 10], [13, 15.196152422706632], [7, 15.196152422706632]), corners: 6 },
  { name: 'an arch’s springing, line and arc', frame: members(2.5), corners: 4 },
  { name: 'a hollow side, line and arc', frame: traced([4, 4], [14, 4, -0.2], [14, 14], [4, 14]), corners: 4 },
  { name: 'a lens, arc and arc', frame: traced([4, 10, 0.5], [16, 10, 0.5]), corners: 2 },
  { name: 'a hollow and a full arc', frame: traced([4, 4, 0.15], [14, 4, -0.15], [14, 14], [4, 14]), corners: 4 },
];

/** One corner of an opening with all that the cutter does about it; frame view. */
interface Worked {
  corner: Point;
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
    return { corner, path: [...around, ...standsAlong(lift.points, STEP / 2)], face: face.contour, cutter, tipDepth: axis.depth };
  });
}

const grid = (about: Point, half: number, step: number): Point[] => {
  const n = Math.round(half / step);
  const places: Point[] = [];
  for (let i = -n; i <= n; i++) for (let j = -n; j <= n; j++) places.push({ x: about.x + i * step, y: about.y + j * step });
  return places;
};

/** The wall at a depth stands inside the face's by how much narrower the cutter is there. */
const wallInset = ({ cutter, tipDepth }: Worked, depth: number) => radiusAtHeight(cutter, tipDepth) - radiusAtHeight(cutter, tipDepth - depth);

/** The deepest cut behind the wall at one depth, over the grid. */
function cutBehindWall(worked: Worked, depth: number, places: readonly { p: Point; distance: number }[]): number {
  const inset = wallInset(worked, depth);
  return Math.max(...places.filter(({ distance }) => distance > -inset).map(({ p }) => reachInto(worked.path, worked.cutter, p, depth)));
}

const cutters: [string, Cutter, 'face' | 'back'][] = [
  ['a tapered cutter, size held at the face', tapered, 'face'],
  ['a tapered cutter, size held at the back', tapered, 'back'],
  ['a steeper tapered cutter', steep, 'face'],
  ['a V-cutter', vee, 'face'],
];

describe.each(cutters)('When %s lifts into a corner', (_, cutter, sizeHeldAt) => {
  describe.each(situations)('of $name', ({ frame, corners }) => {
    const p: Particulars = { ...frame, edge: { style: 'square', sizeHeldAt }, cutters: { ...frame.cutters, opening: cutter } };
    const all = workCorners(p);
    // Corners of one opening that are mirror images of each other tell the same: two of each opening's are swept.
    const swept = all.slice(0, 2).map((worked) => {
      const polygon = flattenContour(worked.face, 1e-6).filter(() => true);
      const nearby = grid(worked.corner, 0.3, 0.0125).map((place) => ({ p: place, distance: signedDistance(polygon, place) }));
      return { worked, nearby };
    });

    test('then each sharp corner has one lift, which ends at the corner in the face', () => {
      expect(all).toHaveLength(corners);
      for (const { corner, face } of all) {
        const nearest = Math.min(...face.vertices.map((v) => Math.hypot(v.x - corner.x, v.y - corner.y)));
        expect(nearest).toBeLessThan(1e-9);
        expect(Math.abs((corner as unknown as { z: number }).z)).toBeLessThan(1e-9);
      }
    });

    test('then nothing behind the wall is cut, at any depth', () => {
      for (const { worked, nearby } of swept) {
        for (const depth of [0, 0.01, 0.03, 0.0625, 0.1, 0.25, 0.5, THICKNESS]) {
          expect(cutBehindWall(worked, depth, nearby), `at depth ${depth}`).toBeLessThan(TOLERANCE);
        }
      }
    });

    test('then the face is cut right into the corner', () => {
      for (const { worked, nearby } of swept) {
        const wide = radiusAtHeight(worked.cutter, worked.tipDepth);
        const inCorner = nearby.filter(({ distance }) => distance < -1e-4 && distance > -wide);
        expect(inCorner.length).toBeGreaterThan(20);
        const missed = inCorner.map(({ p: place }) => -reachInto(worked.path, worked.cutter, place, 0));
        expect(Math.max(...missed)).toBeLessThan(TOLERANCE);
      }
    });
  });
});

describe('When a lift is swept with a cutter that is too wide, then the sweep sees the wall being cut', () => {
  test('by a thousandth more than the tolerance', () => {
    const [worked] = workCorners(workedExample({ dados: [] }));
    const polygon = flattenContour(worked!.face, 1e-6);
    const nearby = grid(worked!.corner, 0.3, 0.0125).map((p) => ({ p, distance: signedDistance(polygon, p) }));
    const wider = { ...worked!, cutter: { ...tapered, tipRadius: 0.0635 } as Cutter };
    const inset = wallInset(worked!, 0);
    const cut = Math.max(...nearby.filter((n) => n.distance > -inset).map((n) => reachInto(wider.path, wider.cutter, n.p, 0)));
    expect(cut).toBeGreaterThan(TOLERANCE);
  });
});

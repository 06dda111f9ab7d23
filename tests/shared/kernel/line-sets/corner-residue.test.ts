import { describe, expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { Particulars, TracedVertex } from '#shared/kernel/particulars/particulars.ts';
import { placeContour, placeShape, unplace } from '#shared/kernel/placing/place.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { contoursIn, lineSet } from '../../../builders/line-sets.ts';
import { reachInto, standsAlong, standsOf, type TipPath } from '../../../builders/sweep.ts';
import { workedExample } from '../../../builders/worked-example.ts';

/** What is said to be left in a corner, held against a sweep of the cutter along the corner's bisector. */
const STEP = 0.001;
const SCAN = 1e-4;

const cos = (degrees: number) => Math.cos((degrees * Math.PI) / 180);
const tapered: Cutter = { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 };

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

/** Openings whose first corner is at (4, 4), with its bisector along +x +y turned by half its angle. */
const corners: [string, number, Particulars][] = [
  ['90°', 90, traced([4, 4], [14, 4], [14, 14], [4, 14])],
  ['60°', 60, traced([4, 4], [14, 4], [9, 4 + 5 * Math.sqrt(3)])],
  ['120°', 120, traced([4, 4], [14, 4], [14, 14], [4 - 10 / Math.sqrt(3), 14])],
];

/** How far from the wall's corner, along the bisector, the first place lies that is cut at a depth. */
function leftOver(path: TipPath, cutter: Cutter, tipDepth: number, degrees: number, depth: number): number {
  const half = ((degrees / 2) * Math.PI) / 180;
  const inset = (radiusAtHeight(cutter, tipDepth) - radiusAtHeight(cutter, tipDepth - depth)) / Math.sin(half);
  const places = Array.from({ length: 1500 }, (_, i) => ({
    x: 4 + (inset + i * SCAN) * Math.cos(half),
    y: 4 + (inset + i * SCAN) * Math.sin(half),
  }));
  const first = reachInto(path, cutter, places, depth).findIndex((reach) => reach >= -1e-6);
  if (first < 0) throw new Error('the corner is never reached');
  return first * SCAN;
}

describe.each(corners)('When a corner of %s is cut with a tapered cutter', (_, degrees, frame) => {
  const worked = workFrame(frame);
  const back = unplace(worked.front.placement);
  const axis = lineSet(worked.front, 'OPENING_AXIS');
  const corner = { x: 4, y: 4 };
  const around = standsOf(placeContour(back, contoursIn([axis])[0]!), axis.depth, corner, 0.6, STEP);
  const lift = lineSet(worked.front, 'CORNER_LIFT')
    .shapes.map((shape) => placeShape(back, shape))
    .flatMap((shape) => (shape.kind === 'climb' ? [shape.points] : []))
    .find((points) => Math.hypot(points.at(-1)!.x - 4, points.at(-1)!.y - 4) < 1e-6);
  const residue = worked.residues.find((r) => Math.abs(r.angle - (degrees * Math.PI) / 180) < 1e-6);

  test('then it is said for the face and three depths below it', () => {
    expect(residue?.levels).toHaveLength(4);
    expect(residue!.levels[0]!.depth).toBe(0);
    expect(residue!.levels.every((level, i, all) => i === 0 || level.depth > all[i - 1]!.depth)).toBe(true);
    expect(residue!.levels.at(-1)!.depth).toBeLessThanOrEqual(0.75);
  });

  test('then without lifting it is ρ(1/sin(θ/2) − 1) on the diagonal: for a square corner ρ(√2 − 1)', () => {
    for (const { depth, unlifted } of residue!.levels) {
      const radius = radiusAtHeight(tapered, axis.depth - depth);
      expect(unlifted.radius).toBeCloseTo(radius, 9);
      expect(unlifted.diagonal).toBeCloseTo(radius * (1 / Math.sin((degrees * Math.PI) / 360) - 1), 9);
      expect(Math.abs(leftOver(around, tapered, axis.depth, degrees, depth) - unlifted.diagonal)).toBeLessThan(
        2 * SCAN,
      );
    }
  });

  test('then lifting leaves nothing at the face and a radius of r·cos a over most of the thickness', () => {
    const [face, ...below] = residue!.levels;
    expect(face!.lifted.diagonal).toBeCloseTo(0, 9);
    for (const { lifted } of below) expect(lifted.radius).toBeCloseTo(0.0625 * cos(1.5), 4);
  });

  test('then no more is left than is said, and hardly less', () => {
    const path = [...around, ...standsAlong(lift!, STEP / 4)];
    for (const { depth, lifted } of residue!.levels) {
      const left = leftOver(path, tapered, axis.depth, degrees, depth);
      expect(left - lifted.diagonal, `at depth ${depth}`).toBeLessThan(2 * SCAN);
      expect(lifted.diagonal - left, `at depth ${depth}`).toBeLessThan(0.1 * 0.0625);
    }
  });
});

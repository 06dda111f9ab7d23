import { describe, expect, test } from 'vitest';
import { flattenContour } from '#shared/kernel/contour/flatten-contour.ts';
import { veeCorners } from '#shared/kernel/line-sets/vee-corners.ts';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import { reachInto, signedDistance, standsAlong } from '../../../builders/sweep.ts';

/** Brute force: the V is stood along its path in small steps and measured against the wall; no formula of the path is used. */
const CUTTER = { kind: 'vee', includedAngle: 30, fluteLength: 1 } as const;
const FLOOR = 0.10375;
const FILLET = 0.0625;

const square: Contour = {
  closed: true,
  vertices: [
    [0, 0],
    [4, 0],
    [4, 3],
    [0, 3],
  ].map(([x, y]) => ({ x: x!, y: y!, bulge: 0 })),
};
const arched: Contour = {
  closed: true,
  vertices: [
    { x: 0, y: 0, bulge: 0 },
    { x: 4, y: 0, bulge: 0 },
    { x: 4, y: 3, bulge: 0.2 },
    { x: 0, y: 3, bulge: 0 },
  ],
};
const hollow: Contour = {
  closed: true,
  vertices: [
    { x: 0, y: 0, bulge: -0.15 },
    { x: 4, y: 0, bulge: -0.15 },
    { x: 4, y: 3, bulge: -0.15 },
    { x: 0, y: 3, bulge: -0.15 },
  ],
};
const sharp: Contour = {
  closed: true,
  vertices: [
    [0, 0],
    [4, 0],
    [0, 2],
  ].map(([x, y]) => ({ x: x!, y: y!, bulge: 0 })),
};

describe.each([
  ['square', square, 4],
  ['an arch’s springings', arched, 4],
  ['between hollow arcs', hollow, 4],
  ['of any angle', sharp, 3],
] as const)('When the quirk’s corners are %s', (_, wall, corners) => {
  const { paths, missed } = veeCorners(wall, {
    floor: FLOOR,
    plane: 0,
    filletRadius: FILLET,
    cutter: CUTTER,
    chord: 0.001,
  });
  const outline = flattenContour(wall, 1e-6);

  test('then each corner has a path', () => {
    expect(missed).toEqual([]);
    expect(paths).toHaveLength(corners);
  });

  test('then the V cuts nothing outside the wall, at the face and below', () => {
    for (const path of paths)
      for (const tip of standsAlong(path, 0.002)) {
        // ρ = depth · tan(β/2) is the cone itself; chords of an arc may lie 0.001 off.
        const radius = -tip.z * Math.tan(Math.PI / 12);
        expect(signedDistance(outline, tip) + radius).toBeLessThan(0.0011);
      }
  });

  test('then at the face nothing is left between the fillet and the corner', () => {
    for (const path of paths) {
      const corner = path.find((p) => p.z === 0)!;
      // Places along the wall itself. The fillet's tangent length is r/tan(θ/2): 0.0417 at the widest corner here, an arch's springing of 112.6°.
      const places = outline.filter((p) => Math.hypot(p.x - corner.x, p.y - corner.y) < 0.0415);
      const stands = standsAlong(path, 0.0002);
      for (const reach of reachInto(stands, CUTTER, [...places, corner], 0)) expect(reach).toBeGreaterThan(-0.0012);
    }
  });
});

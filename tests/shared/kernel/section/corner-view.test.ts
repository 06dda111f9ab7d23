import { describe, expect, test } from 'vitest';
import type { Cutter } from '#shared/kernel/cutters/cutter.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import { openingCut } from '#shared/kernel/line-sets/opening-cut.ts';
import { cornerPicture } from '#shared/kernel/section/corner-picture.ts';
import { cornerSlice, cornerSlices } from '#shared/kernel/section/corner-view.ts';
import type { CornerMethod } from '#shared/kernel/particulars/particulars.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const p = workedExample();
const cut = openingCut(p);
const VEE: Cutter = { kind: 'vee', includedAngle: 30, fluteLength: 1 };
const situation = (method: CornerMethod, cutter = p.cutters.opening, angle = Math.PI / 2) => ({
  cutter,
  cut: openingCut({ ...p, cutters: { ...p.cutters, opening: cutter } }),
  method,
  angle,
  vee: { cutter: VEE, floor: 0.75 },
});

/** Nearest cut board on the bisector from the walls' corner, by trying every stand on a fine grid and walking outwards. */
function bruteDiagonal(method: CornerMethod, angle: number, z: number): number {
  const cutter = p.cutters.opening;
  const s = 1 / Math.sin(angle / 2);
  const wall = (radiusAtHeight(cutter, cut.tipDepth) - radiusAtHeight(cutter, cut.tipDepth - z)) * s;
  const stands: { along: number; radius: number }[] = [];
  const put = (c: Cutter, d: number) => {
    const radius = d > z ? radiusAtHeight(c, d - z) : 0;
    if (radius > 0) stands.push({ along: s * radiusAtHeight(c, d), radius });
  };
  if (method === 'round') put(cutter, cut.tipDepth);
  else for (let i = 0; i <= 5000; i++) put(cutter, cut.tipDepth * (i / 5000) ** 3);
  if (method === 'vee') for (let i = 0; i <= 5000; i++) put(VEE, 0.75 * (i / 5000) ** 3);
  // Stands lie closer towards the plane, where a nose's radius grows fastest.
  for (let t = 0; t < 1; t += 0.00005) if (stands.some((c) => Math.abs(wall + t - c.along) <= c.radius)) return t;
  return Infinity;
}

describe.each(['round', 'lift', 'vee'] as const)('When the corner is worked by method %s', (method) => {
  test.each([0, 0.1875, 0.375, 0.75])(
    'then what is left on the diagonal %d below the face agrees with brute force',
    (z) => {
      for (const angle of [Math.PI / 2, Math.PI / 3, 2])
        expect(
          Math.abs(
            cornerSlice(situation(method, p.cutters.opening, angle), z).diagonal - bruteDiagonal(method, angle, z),
          ),
        ).toBeLessThan(3e-4);
    },
  );
});

test('When nothing is lifted, then a square corner keeps ρ(√2 − 1) on the diagonal', () => {
  for (const slice of cornerSlices(situation('round'), 0.75))
    expect(slice.diagonal).toBeCloseTo(
      radiusAtHeight(p.cutters.opening, cut.tipDepth - slice.depth) * (Math.SQRT2 - 1),
      9,
    );
});

test('When lifted, then the face is sharp and most of the thickness keeps the nose’s radius r·cos a', () => {
  const [face, , half] = cornerSlices(situation('lift'), 0.75);
  expect(face!.diagonal).toBeLessThan(1e-5);
  expect(half!.diagonal).toBeCloseTo(0.0625 * Math.cos((1.5 * Math.PI) / 180) * (Math.SQRT2 - 1), 4);
});

test('When a V follows a straight cutter, then the corner is sharp at the face and keeps tan(β/2)·z a side below it', () => {
  const straight: Cutter = { kind: 'straight', diameter: 0.375, fluteLength: 1.25 };
  expect(cornerSlice(situation('vee', straight), 0).diagonal).toBeLessThan(1e-5);
  const z = 0.1;
  expect(cornerSlice(situation('vee', straight), z).diagonal).toBeCloseTo(z * Math.tan(Math.PI / 12) * Math.SQRT2, 4);
});

test('When the corner is drawn, then each depth says what is left', () => {
  const words = cornerPicture(p, 'lift', Math.PI / 2).shapes.flatMap((s) => (s.kind === 'text' ? [s.text] : []));
  expect(words).toContain('at the face');
  expect(words).toContain('nothing left');
  expect(words.filter((w) => w.endsWith(' left'))).toHaveLength(4);
});

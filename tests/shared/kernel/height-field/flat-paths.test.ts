import { describe, expect, test } from 'vitest';
import type { BeadingCutter, StraightCutter, TaperedCutter, VeeCutter } from '#shared/kernel/cutters/cutter.ts';
import { deepest, faceWith, layer, openLine, samples, sweep, Worst } from './fields.ts';

const straight: StraightCutter = { kind: 'straight', diameter: 0.25, fluteLength: 1 };
const vee: VeeCutter = { kind: 'vee', includedAngle: 30, fluteLength: 1 };
const tapered: TaperedCutter = { kind: 'tapered', tipRadius: 0.0625, sideAngle: 1.5, fluteLength: 1.25 };
const beading: BeadingCutter = { kind: 'beading', profileRadius: 3 / 32, tipFlat: 1 / 32, fluteLength: 0.5 };
const degrees = Math.PI / 180;

/** Depths are kept as 32-bit numbers: 24 bits of a depth under 1. */
const KEPT = 2 ** -24;

/** Lines from a to b, level, upright and slanting, with the distance of a place from the line and its foot along it. */
const lines = [
  { name: 'level', a: [1, 1.003], b: [3, 1.003] },
  { name: 'upright', a: [1.013, 1], b: [1.013, 3] },
  { name: 'slanting up', a: [1, 1.1], b: [3, 2.9] },
  { name: 'slanting down', a: [1.2, 3], b: [2.1, 1] },
] as const;

function beside(line: (typeof lines)[number], x: number, y: number) {
  const [dx, dy] = [line.b[0] - line.a[0], line.b[1] - line.a[1]];
  const length = Math.hypot(dx, dy);
  const along = ((x - line.a[0]) * dx + (y - line.a[1]) * dy) / length;
  return { along, length, off: Math.abs((x - line.a[0]) * dy - (y - line.a[1]) * dx) / length };
}
const region = { minX: 0.5, minY: 0.5, maxX: 3.5, maxY: 3.5 };

describe.each(lines)('When a cutter runs along a $name line', (line) => {
  const cut = (cutter: StraightCutter | VeeCutter | TaperedCutter | BeadingCutter, depth: number) =>
    sweep(faceWith(layer(cutter, depth, { contours: [openLine([...line.a], [...line.b])] })), region, 0.01);

  /** Holds the samples beside the line, not beyond its ends, against a depth by distance. */
  const against = (cutter: Parameters<typeof cut>[0], depth: number, wanted: (off: number) => number): Worst => {
    const worst = new Worst();
    for (const sample of samples(cut(cutter, depth))) {
      const { along, length, off } = beside(line, sample.x, sample.y);
      if (along < 0 || along > length || off > 0.3) continue;
      worst.take(
        Math.abs(sample.depth - wanted(off)),
        () => `${off} beside the line: got ${sample.depth}, wanted ${wanted(off)}`,
      );
    }
    expect(worst.count).toBeGreaterThan(5000);
    return worst;
  };

  test('then a straight one leaves a slot of its width and depth, with round ends', () => {
    let cleared = 0;
    const worst = new Worst();
    for (const { x, y, depth } of samples(cut(straight, 0.2))) {
      const { along, length, off } = beside(line, x, y);
      const away = Math.hypot(off, Math.max(0, -along, along - length));
      if (Math.abs(away - 0.125) > 1e-9)
        worst.take(Math.abs(depth - (away < 0.125 ? 0.2 : 0)), () => `${away} from the line: got ${depth}`);
      if (depth > 0) cleared += 0.01 ** 2;
    }
    expect(worst.error, worst.where).toBeLessThan(KEPT);
    // Area of a slot: length × width and two half discs.
    expect(cleared).toBeCloseTo(
      Math.hypot(line.b[0] - line.a[0], line.b[1] - line.a[1]) * 0.25 + Math.PI * 0.125 ** 2,
      2,
    );
  });

  test('then a V leaves a groove whose sides lean by half its angle', () => {
    const worst = against(vee, 0.3, (off) => Math.max(0, 0.3 - off / Math.tan(15 * degrees)));
    expect(worst.error, worst.where).toBeLessThan(KEPT);
  });

  test('then a tapered one leaves walls that lean by its side angle, above a round floor', () => {
    const worst = against(tapered, 0.6, (off) => {
      // The nose is a circle of the tip radius about 0.6 − r below the face; the flank is tangent to it.
      const isOnNose = off < 0.0625 * Math.cos(1.5 * degrees);
      const height = isOnNose
        ? 0.0625 - Math.sqrt(0.0625 ** 2 - off ** 2)
        : 0.0625 + (off - 0.0625 / Math.cos(1.5 * degrees)) / Math.tan(1.5 * degrees);
      return Math.max(0, 0.6 - height);
    });
    expect(worst.error, worst.where).toBeLessThan(KEPT);
  });

  test('then a beading one leaves a quarter round beside a flat', () => {
    const [R, t] = [3 / 32, 1 / 32];
    const worst = against(beading, 0.09, (off) => {
      if (off > t / 2 + R) return 0;
      return Math.max(0, 0.09 - (off <= t / 2 ? 0 : Math.sqrt(R * R - (t / 2 + R - off) ** 2)));
    });
    expect(worst.error, worst.where).toBeLessThan(KEPT);
  });
});

describe('When a V runs along an arc', () => {
  // A quarter, a half and most of a circle of radius 1 about 2, 2; bulge = tan(angle/4).
  test.each([
    ['a quarter', 90],
    ['more than a half', 250],
    ['a quarter, clockwise', -90],
  ])('then %s of a circle leaves its groove along the arc itself, without chords', (_, angle) => {
    const end = angle * degrees;
    const arc = openLine([3, 2, Math.tan(end / 4)], [2 + Math.cos(end), 2 + Math.sin(end)]);
    const field = sweep(faceWith(layer(vee, 0.3, { contours: [arc] })), region, 0.01);
    const worst = new Worst();
    for (const { x, y, depth } of samples(field)) {
      const turn = Math.atan2(y - 2, x - 2) / degrees;
      const along = angle > 0 ? (turn + 360) % 360 : (360 - turn) % 360;
      if (along > Math.abs(angle)) continue;
      const off = Math.abs(Math.hypot(x - 2, y - 2) - 1);
      worst.take(Math.abs(depth - Math.max(0, 0.3 - off / Math.tan(15 * degrees))), () => `${x}, ${y}: got ${depth}`);
    }
    expect(worst.count).toBeGreaterThan(5000);
    expect(worst.error, worst.where).toBeLessThan(KEPT);
  });
});

describe('When several layers cut one face', () => {
  const slot = layer(straight, 0.2, { contours: [openLine([0, 1], [3, 1])] });
  const groove = layer(vee, 0.4, { contours: [openLine([0, 1], [3, 1])] });
  const face = faceWith(slot, groove);

  test('then the deepest cut counts at each place, and says whose it is', () => {
    for (const { y, depth, by } of samples(sweep(face, { minX: 1, maxX: 1.1, minY: 0.7003, maxY: 1.3 }, 0.01))) {
      const off = Math.abs(y - 1);
      const [flat, lean] = [off <= 0.125 ? 0.2 : 0, Math.max(0, 0.4 - off / Math.tan(15 * degrees))];
      expect(depth).toBeCloseTo(Math.max(flat, lean), 6);
      expect(by).toBe(lean > flat ? 2 : flat > 0 ? 1 : 0);
    }
  });

  test('then no cut is deeper than the board', () => {
    const deep = sweep(
      faceWith(layer(straight, 0.9, { contours: [openLine([0, 1], [3, 1])] })),
      { minX: 1, maxX: 1.1, minY: 0.7003, maxY: 1.3 },
      0.01,
    );
    expect(deepest(deep)).toBe(0.75);
  });
});

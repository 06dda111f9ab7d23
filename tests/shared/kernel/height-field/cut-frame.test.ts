import { describe, expect, test } from 'vitest';
import { openingCut } from '#shared/kernel/line-sets/opening-cut.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { envelopeDepth } from '#shared/kernel/section/envelope-depth.ts';
import { sectionPasses } from '#shared/kernel/section/section-passes.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { GONE, PART } from '#shared/kernel/height-field/cut-part.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { asDrawn, cutFrame, deepest, depthAt, samples, Worst } from './fields.ts';

const tan = (degrees: number) => Math.tan((degrees * Math.PI) / 180);
/** Numbers of a file have six decimals; a flank of 1.5° turns half of the last one into 1/tan 1.5° times as much depth. */
const ROUNDED = 0.5e-6 / tan(1.5) + 1e-7;

describe('When the worked example is cut', () => {
  test('then the walls of an opening lean by the cutter’s side angle: s = z·tan 1.5° inside the entered line, 0.019639 at the back', () => {
    // A strip across the left side of opening A, x = 1.75, far from its corners.
    const { front } = cutFrame(workedExample(), {
      cell: 0.0005,
      region: { minX: 1.74, maxX: 1.79, minY: 14.9995, maxY: 15.0005 },
    });
    const worst = new Worst();
    for (const { x, depth } of samples(front)) {
      const wanted = Math.min(0.75, Math.max(0, (x - 1.75) / tan(1.5)));
      worst.take(Math.abs(depth - wanted), () => `${x}: got ${depth}, wanted ${wanted}`);
    }
    expect(worst.count).toBeGreaterThanOrEqual(200);
    expect(worst.error, worst.where).toBeLessThan(ROUNDED);
    // Spec's number for the back.
    expect(depthAt(front, 1.75 + 0.019639 + 0.0005, 15)).toBe(0.75);
    expect(depthAt(front, 1.75 + 0.019639 - 0.0005, 15)).toBeLessThan(0.75);
  });

  test('then dados are cut from the back where frame view says', () => {
    const { back } = cutFrame(workedExample(), { cell: 0.01, region: { minX: 0.0013, maxX: 2, minY: 10, maxY: 10.1 } });
    // Left end, frame view: x 0.245 … 1.005.
    for (const { x, depth } of samples(back)) expect(depth, `at ${x}`).toBe(x > 0.245 && x < 1.005 ? 0.25 : 0);
  });

  test('then what comes free is two offcuts and the board about the frame; the trim is all chips', () => {
    const part = cutFrame(workedExample(), { cell: 0.05 });
    expect(part.loosePieces).toBe(3);
    // With more trim than the squaring cutter is wide a strip is left as well.
    expect(
      cutFrame(workedExample({ setup: { ...workedExample().setup, trim: 0.75 } }), { cell: 0.05 }).loosePieces,
    ).toBe(4);
    const standing = (x: number, y: number) =>
      part.standing[
        Math.floor((y - part.grid.minY) / 0.05) * part.grid.columns + Math.floor((x - part.grid.minX) / 0.05)
      ];
    // On a stile, in an opening's kerf, in its offcut.
    expect(standing(1.5, 15)).toBe(PART);
    expect(standing(1.85, 15)).toBe(GONE);
    expect(standing(8, 15)).not.toBe(PART);
  });

  test('then stopping after a step leaves out what comes later', () => {
    const worked = workFrame(workedExample());
    const cuts = [...worked.back.lineSets, ...worked.front.lineSets].filter(
      (s) => s.cutter !== null && s.set !== 'OPENING',
    ).length;
    const before = cutFrame(workedExample(), { cell: 0.1, steps: 0 });
    expect([deepest(before.front), deepest(before.back), before.loosePieces]).toEqual([0, 0, 0]);
    const dados = cutFrame(workedExample(), { cell: 0.1, steps: 1 });
    expect([deepest(dados.front), deepest(dados.back), dados.loosePieces]).toEqual([0, 0.25, 0]);
    // The corners are too small for samples so far apart: openings and perimeter are seen.
    const all = cutFrame(workedExample(), { cell: 0.1, steps: cuts });
    expect(all.front.depth).toEqual(cutFrame(workedExample(), { cell: 0.1 }).front.depth);
    expect(new Set(all.front.by)).toEqual(new Set([0, 1, 3]));
  });
});

/** Frames that must come out alike on the part itself: at each sample that stands, the same depths on both faces. */
function expectAlike(a: ReturnType<typeof cutFrame>, b: ReturnType<typeof cutFrame>, tolerance: number): void {
  const worst = new Worst();
  for (let at = 0; at < a.front.depth.length; at++) {
    if (a.standing[at] !== PART && b.standing[at] !== PART) continue;
    worst.take(
      Math.abs(a.front.depth[at]! - b.front.depth[at]!),
      () => `front, sample ${at}: ${a.front.depth[at]} and ${b.front.depth[at]}`,
    );
    worst.take(
      Math.abs(a.back.depth[at]! - b.back.depth[at]!),
      () => `back, sample ${at}: ${a.back.depth[at]} and ${b.back.depth[at]}`,
    );
  }
  expect(worst.count).toBeGreaterThan(10000);
  expect(worst.error, worst.where).toBeLessThan(tolerance);
}

describe('When a frame is made another way that must not matter', () => {
  // Off the lines by an odd share of a cell, so that no sample lies on a wall.
  const region = { minX: -0.0137, minY: -0.0137, maxX: 33.0137, maxY: 30.5137 };
  const look = (p: Particulars, profile = asDrawn) => cutFrame(p, { cell: 0.0731, region, profile });
  const setup = workedExample().setup;
  const usual = look(workedExample());

  test('then turning it end over end gives the same part', () => {
    expectAlike(usual, look(workedExample({ setup: { ...setup, flip: 'end-over-end' } })), 1e-6);
  });

  test('then squaring all edges gives the same part', () => {
    expectAlike(usual, look(workedExample({ setup: { ...setup, squaring: 'all-edges' } })), 1e-6);
  });

  test('then the entered openings alone, cut inside, give the same part as their axes', () => {
    expectAlike(usual, look(workedExample(), { ...asDrawn, openingLines: 'entered' }), 2 * ROUNDED);
    expectAlike(usual, look(workedExample(), { ...asDrawn, openingLines: 'axis' }), 1e-6);
  });

  test('then files with the frame’s corner as origin, or in millimetres, give the same part', () => {
    expectAlike(usual, look(workedExample(), { ...asDrawn, origin: 'frame' }), 2 * ROUNDED);
    expectAlike(usual, look(workedExample(), { ...asDrawn, unit: 'mm' }), 2 * ROUNDED);
  });

  test('then a file of four decimals differs by what it rounds away', () => {
    const coarse = look(workedExample(), { ...asDrawn, decimals: 4 });
    expectAlike(usual, coarse, (0.5e-4 * Math.SQRT2) / tan(1.5));
    expect(coarse.front.depth).not.toEqual(usual.front.depth);
  });
});

describe('When an opening’s corner is lifted', () => {
  const { residues } = workFrame(workedExample());
  const region = { minX: 1.73, minY: 1.23, maxX: 1.93, maxY: 1.43 };
  const { front } = cutFrame(workedExample(), { cell: 0.0004, region });

  test('then it is cut sharp at the face, and nothing outside the entered opening', () => {
    const worst = new Worst();
    for (const { x, y, depth } of samples(front)) {
      // The lift follows its curve within 0.0002 in; nothing may reach further out than that.
      if (x < 1.75 - 0.0002 || y < 1.25 - 0.0002) worst.take(depth, () => `${x}, ${y} is outside and cut`);
    }
    expect(worst.count).toBeGreaterThan(10000);
    expect(worst.error, worst.where).toBe(0);
    expect(depthAt(front, 1.75 + 0.0006, 1.25 + 0.0006)).toBeGreaterThan(0);
  });

  test.each(residues[0]!.levels.map((level) => ({ ...level })))(
    'then at $depth below the face the diagonal keeps what the corner’s numbers say',
    ({ depth, lifted }) => {
      const wall = depth * tan(1.5);
      let first = Infinity;
      for (let d = 0.0002; d < 0.17; d += 0.0002) {
        const got = depthAt(front, 1.75 + d, 1.25 + d);
        if (got > 0 && got >= depth - 1e-6) first = Math.min(first, d);
      }
      const diagonal = (first - wall) * Math.SQRT2;
      expect(Math.abs(diagonal - lifted.diagonal)).toBeLessThan(0.0004 * Math.SQRT2 + 0.0002);
    },
  );
});

describe('When a beaded edge is cut', () => {
  const p = beadedExample();
  const [R, e, q] = [3 / 32, 0.01, 0.125];
  // A strip across the right side of opening A, far from its corners; the edge in the bead's base is x = 15.75.
  const { front } = cutFrame(p, { cell: 0.0004, region: { minX: 15.65, maxX: 16.15, minY: 14.9998, maxY: 15.0002 } });
  const out = [...samples(front)].map(({ x, depth }) => ({ y: x - 15.75, depth }));

  test('then bead and quirk have the depths of the section: e + R − √(R² − (y − R)²), then e + R, then the face', () => {
    const worst = new Worst();
    for (const { y, depth } of out) {
      // Beside upright walls a file's last decimal decides.
      if ([0, 2 * R, 2 * R + q].some((wall) => Math.abs(y - wall) < 0.001) || y < 0) continue;
      const wanted = y < 2 * R ? e + R - Math.sqrt(R * R - (y - R) ** 2) : y < 2 * R + q ? e + R : 0;
      worst.take(Math.abs(depth - wanted), () => `${y} outside the edge: got ${depth}, wanted ${wanted}`);
    }
    expect(worst.count).toBeGreaterThan(900);
    // A bead's side is upright at its foot: half a last decimal off sideways is up to 0.5e-6 · √(2R/0.001) in depth.
    expect(worst.error, worst.where).toBeLessThan(1e-5);
  });

  test('then it is the envelope of the passes that the section view draws', () => {
    const passes = sectionPasses(p);
    const axis = openingCut(p).atPlane;
    expect(axis).toBe(0);
    const worst = new Worst();
    for (const { y, depth } of out) {
      if (y < -0.05) continue;
      const near = [-1e-6, 0, 1e-6].map((d) => envelopeDepth(passes, y + d, p.thickness));
      const [least, most] = [Math.min(...near), Math.max(...near)];
      worst.take(Math.max(least - depth, depth - most), () => `${y}: got ${depth}, section has ${near[1]}`);
    }
    expect(worst.count).toBeGreaterThan(1000);
    expect(worst.error, worst.where).toBeLessThan(1e-6);
  });
});

describe('When a dado is stopped inside the frame', () => {
  test('then its corners keep the cutter’s radius, past the panel’s end', () => {
    const p = workedExample({ dados: [dado({ from: 5, to: 20, ends: ['stopped', 'stopped'] })] });
    // Relief 0.144488 (spec), so that it ends at 4.855512; x 0.245 … 1.005.
    const { back } = cutFrame(p, { cell: 0.001, region: { minX: 0.2, maxX: 0.5, minY: 4.8, maxY: 5.1 } });
    let first = Infinity;
    for (let d = 0.0005; d < 0.2; d += 0.0005)
      if (depthAt(back, 0.245 + d, 4.855512 + d) > 0) first = Math.min(first, d);
    expect(Math.abs(first * Math.SQRT2 - 0.1875 * (Math.SQRT2 - 1))).toBeLessThan(0.001 * Math.SQRT2);
    // The panel's square corner passes: x 0.25, y 5.
    expect(depthAt(back, 0.2505, 5.0005)).toBe(0.25);
  });
});

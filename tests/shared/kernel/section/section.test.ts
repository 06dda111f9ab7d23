import { describe, expect, test } from 'vitest';
import { envelopeDepth } from '#shared/kernel/section/envelope-depth.ts';
import { intendedDepth } from '#shared/kernel/section/intended-depth.ts';
import { sectionDifference } from '#shared/kernel/section/section-difference.ts';
import { sectionPasses } from '#shared/kernel/section/section-passes.ts';
import { sectionPicture } from '#shared/kernel/section/section-picture.ts';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { BeadedEdge, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { beadCutterSet, beadedExample } from '../../../builders/beaded-example.ts';
import { workedExample } from '../../../builders/worked-example.ts';

const edge = beadedExample().edge as BeadedEdge;
const straightOpening = (p: Particulars): Particulars => ({
  ...p,
  cutters: { ...p.cutters, opening: { kind: 'straight', diameter: 0.25, fluteLength: 1.25 } },
});

/** Depth left at y by brute force: every pass as a stack of thin discs, the widest at or below each height. */
function stacked(p: Particulars, y: number): number {
  let depth = 0;
  for (const pass of sectionPasses(p)) {
    if (pass.set === 'OPENING_AXIS' && y <= pass.offset) return p.thickness;
    for (let h = 0; h <= pass.tipDepth; h += 0.0001)
      if (radiusAtHeight(pass.cutter, h) >= Math.abs(y - pass.offset)) {
        depth = Math.max(depth, pass.tipDepth - h);
        break;
      }
  }
  return Math.min(depth, p.thickness);
}

describe('When the bead example is cut with a straight opening cutter, then the envelope is the entered bead', () => {
  const p = straightOpening(beadedExample());
  const passes = sectionPasses(p);

  test('over the bead, e + R − √(R² − (y − R)²), to 1e-12', () => {
    for (let i = 1; i <= 200; i++) {
      const y = (i * 2 * edge.bead.radius) / 200;
      expect(envelopeDepth(passes, y, p.thickness)).toBeCloseTo(intendedDepth(edge.bead, y), 12);
    }
  });

  test('over the quirk the floor, beyond it the face', () => {
    expect(envelopeDepth(passes, 0.2, 0.75)).toBeCloseTo(0.10375, 12);
    expect(envelopeDepth(passes, 0.3124, 0.75)).toBeCloseTo(0.10375, 12);
    expect(envelopeDepth(passes, 0.3126, 0.75)).toBe(0);
  });
});

test('When the envelope is held against a stack of thin discs, then both agree to the discs’ thickness', () => {
  const p = beadedExample();
  const passes = sectionPasses(p);
  for (let y = -0.2; y < 0.5; y += 0.0037)
    expect(Math.abs(envelopeDepth(passes, y, p.thickness) - stacked(p, y))).toBeLessThan(2e-4);
});

test('When the quirk is narrower than flat and radius together, then the scar beyond it is t + R − q wide', () => {
  const narrow = beadedExample({
    edge: { style: 'beaded', bead: { ...edge.bead, quirk: 0.125 } },
    cutters: {
      ...beadedExample().cutters,
      bead: { ...beadCutterSet.bead, tipFlat: 1 / 16 } as typeof beadCutterSet.bead,
    },
  });
  const passes = sectionPasses(narrow);
  const end = 2 * edge.bead.radius + 0.125;
  const scar = 1 / 16 + 3 / 32 - 0.125;
  expect(envelopeDepth(passes, end + scar - 1e-4, 0.75)).toBeGreaterThan(0);
  expect(envelopeDepth(passes, end + scar + 1e-4, 0.75)).toBe(0);
});

describe('When the cutters differ from what the bead needs', () => {
  test('then a V-shaped opening cutter takes (R·tan(β/2))-deep flank off the bead: R(1/cos(β/2) − 1) at most, along the flank', () => {
    const p = beadedExample({
      cutters: { ...beadedExample().cutters, opening: { kind: 'vee', includedAngle: 60, fluteLength: 1.25 } },
    });
    const { below } = sectionDifference(p, edge);
    // Flank y = u·tan 30° meets the circle (y − R)² + u² = R²; the chord's greatest vertical depth below it, by fine steps.
    let wanted = 0;
    const R = edge.bead.radius;
    const slope = Math.tan(Math.PI / 6);
    for (let y = 1e-6; y < 2 * R; y += 1e-6)
      wanted = Math.max(wanted, Math.sqrt(Math.max(0, R * R - (y - R) ** 2)) - y / slope);
    expect(below).toBeCloseTo(wanted, 4);
  });

  test('then a beading cutter of another radius leaves or takes what its circle differs', () => {
    const p = beadedExample({
      cutters: {
        ...beadedExample().cutters,
        bead: { ...beadCutterSet.bead, profileRadius: 1 / 16 } as typeof beadCutterSet.bead,
      },
    });
    const { below, above } = sectionDifference(p, edge);
    expect(Math.max(below, above)).toBeGreaterThan(0.02);
  });
});

test('When a square edge is shown, then its wall leans by T·tan a over the board', () => {
  const p = workedExample();
  const passes = sectionPasses(p);
  const lean = 0.75 * Math.tan((1.5 * Math.PI) / 180);
  // Just inside the wall at the back there is board left from the face's line on.
  expect(envelopeDepth(passes, 1e-6, 0.75)).toBe(0);
  expect(envelopeDepth(passes, -lean / 2, 0.75)).toBeCloseTo(0.375, 6);
  expect(envelopeDepth(passes, -lean - 1e-6, 0.75)).toBe(0.75);
});

test('When sections are drawn, then every offset and depth of the bead example is written on them', () => {
  const picture = sectionPicture(beadedExample());
  const words = picture.shapes.flatMap((s) => (s.kind === 'text' ? [s.text] : [])).join('\n');
  for (const wanted of [
    '-1/64  bead axis',
    '13/64  bead axis',
    '1/4  quirk axis',
    '3/16  bead ends',
    '5/16  quirk ends',
    '0.01 bead top',
    '0.10375 bead base',
  ])
    expect(words).toContain(wanted);
  for (const shape of picture.shapes) if (shape.kind === 'path') expect(shape.d).not.toMatch(/NaN|Infinity/);
});

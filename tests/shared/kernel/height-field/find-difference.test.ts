import { describe, expect, test } from 'vitest';
import type { Contour } from '#shared/kernel/contour/contour.ts';
import { boardExtents, cutBoard, finishedStage } from '#shared/kernel/height-field/cut-board.ts';
import type { Stage } from '#shared/kernel/height-field/cut-part.ts';
import { findDifference, type LargestDifference } from '#shared/kernel/height-field/find-difference.ts';
import type { FaceCut, LayerLines } from '#shared/kernel/height-field/face-cut.ts';
import { makeGrid } from '#shared/kernel/height-field/grid.ts';
import { measureFrame } from '#shared/kernel/height-field/measure-frame.ts';
import { runThrough } from '#shared/kernel/height-field/sweep-face.ts';
import type { Face, SetName } from '#shared/kernel/line-sets/line-set.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { asDrawn } from './fields.ts';

const CELL = 0.04;

/** The worked example with one opening less, and small: 8 × 8. */
const small = (changes: Partial<Particulars> = {}): Particulars =>
  workedExample({
    outline: {
      kind: 'members',
      width: 8,
      height: 8,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.75 },
      feet: 0,
      layout: { opening: { label: 'A' } },
    },
    dados: [dado({ from: 0, to: 8 })],
    ...changes,
  });

/** Differences of a face when one set of its lines is changed before it is cut. */
function differenceWith(
  p: Particulars,
  face: Face,
  set: SetName,
  change: (l: LayerLines) => Partial<LayerLines>,
  cell = CELL,
): LargestDifference {
  const worked = workFrame(p);
  const stage = finishedStage(worked, asDrawn);
  const changed = (cut: FaceCut): FaceCut => ({
    ...cut,
    layers: cut.layers.map((l) => (l.set === set ? { ...l, ...change(l) } : l)),
  });
  const other: Stage = { ...stage, [face]: changed(stage[face]) };
  const part = runThrough(cutBoard(other, makeGrid(boardExtents(worked, stage), cell)));
  return runThrough(findDifference(worked, part, face));
}

const moved = (contours: readonly Contour[], dx: number): Contour[] =>
  contours.map((c) => ({ ...c, vertices: c.vertices.map((v) => ({ ...v, x: v.x + dx })) }));

describe('When a cut frame is held against what is meant', () => {
  const measured = runThrough(measureFrame(workFrame(small()), asDrawn, CELL));

  test('then the corners of an opening keep what a lift cannot reach: the nose’s r·cos a · (1 − 1/√2) from either wall', () => {
    // A round corner of radius ρ leaves ρ(√2 − 1) on the diagonal, 1/√2 of it from either side.
    const rho = 0.0625 * Math.cos((1.5 * Math.PI) / 180);
    const left = measured.front.left!;
    expect(Math.abs(left.off - rho * (1 - Math.SQRT1_2))).toBeLessThan(2 * measured.fineCell);
    expect(left.of).toBe('opening-0');
    expect(
      [1.75, 6.25].some((x) => Math.abs(left.x - x) < 0.05) && [1.75, 6.25].some((y) => Math.abs(left.y - y) < 0.05),
    ).toBe(true);
    expect(measured.front.cut?.off ?? 0).toBeLessThan(2e-4);
  });

  test('then dados that run out over the edge have none', () => {
    expect(measured.back).toEqual({ left: null, cut: null });
  });

  test('then a stopped dado keeps r(1 − 1/√2) in its corners', () => {
    const { back } = runThrough(
      measureFrame(
        workFrame(small({ dados: [dado({ from: 2, to: 6, ends: ['stopped', 'stopped'] })] })),
        asDrawn,
        CELL,
      ),
    );
    expect(Math.abs(back.left!.off - 0.1875 * (1 - Math.SQRT1_2))).toBeLessThan(0.25 * CELL);
    expect(back.left!.of).toBe('dado-0');
    expect(back.cut).toBeNull();
  });

  test('then a bead has no difference along its sides: what there is lies in its corners', () => {
    const { front } = runThrough(measureFrame(workFrame(beadedExample()), asDrawn, CELL));
    for (const found of [front.left, front.cut]) {
      if (!found || found.off < 1e-4) continue;
      const off = (value: number, corners: number[]) => Math.min(...corners.map((c) => Math.abs(value - c)));
      expect(off(found.x, [1.75, 15.75, 17.25, 31.25]), `x ${found.x}`).toBeLessThan(0.4);
      expect(off(found.y, [1.25, 28.75]), `y ${found.y}`).toBeLessThan(0.4);
    }
    expect(front.left).not.toBeNull();
  });
});

describe('When the lines are not what they should be', () => {
  test('then an opening moved sideways is off by as much on both sides', () => {
    const { left, cut } = differenceWith(
      small(),
      'front',
      'OPENING_AXIS',
      (l) => ({ contours: moved(l.contours, 0.03) }),
      0.01,
    );
    // No more than it was moved, and no less but for the cell.
    for (const found of [left!, cut!]) {
      expect(found.off).toBeLessThan(0.03 + 1e-6);
      expect(found.off).toBeGreaterThan(0.02);
    }
    expect(cut!.x).toBeGreaterThan(6.2);
    expect(left!.x).toBeLessThan(1.8);
  });

  test('then a dado cut too deep is off by that depth, and one too shallow likewise', () => {
    expect(differenceWith(small(), 'back', 'DADO', () => ({ depth: 0.27 }))).toMatchObject({
      left: null,
      cut: { of: 'dado-0', intended: 0.25 },
    });
    expect(differenceWith(small(), 'back', 'DADO', () => ({ depth: 0.27 })).cut!.off).toBeCloseTo(0.02, 6);
    expect(differenceWith(small(), 'back', 'DADO', () => ({ depth: 0.24 })).left!.off).toBeCloseTo(0.01, 6);
  });

  test('then a missing corner lift shows in the corners: ρ(D)·(1 − 1/√2) at the face', () => {
    const p = small();
    const { left } = differenceWith(p, 'front', 'CORNER_LIFT', () => ({ climbs: [] }));
    // ρ(D) = 0.082161 (spec).
    expect(Math.abs(left!.off - 0.082161 * (1 - Math.SQRT1_2))).toBeLessThan(CELL / 4);
  });

  test('then an opening that is not cut at all is off by no less than to its nearest wall', () => {
    const { left } = differenceWith(small(), 'front', 'OPENING_AXIS', () => ({ contours: [] }));
    // Straight down through the board is nearer than sideways from the middle.
    expect(left).toMatchObject({ off: 0.75, depth: 0, intended: 0.75 });
  });
});

import { describe, expect, test } from 'vitest';
import { radiusAtHeight } from '#shared/kernel/cutters/radius-at-height.ts';
import type { Point3 } from '#shared/kernel/contour/contour.ts';
import type { BeadedEdge, CornerMethod, MembersOutline, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { beadedExample } from '../../../builders/beaded-example.ts';

const base = beadedExample();
const { radius: R, drop } = (base.edge as BeadedEdge).bead;
const BASE = R + drop;
const cutter = base.cutters.opening;

const lifts = (p: Particulars): (readonly Point3[])[] =>
  workFrame(p)
    .front.lineSets.filter((s) => s.set === 'CORNER_LIFT')
    .flatMap((s) => s.shapes.flatMap((shape) => (shape.kind === 'climb' ? [shape.points] : [])));

/**
 * How much a cutter whose tip is `h` below the bead's base takes off the bead beside it, by brute force: it touches the
 * opening's edge at the base, and u above the base it reaches ρ(h + u) − ρ(h) beyond that edge, where the bead
 * y = R − √(R² − u²) must stand free of it. The depth taken is measured straight down.
 */
function takenOff(h: number): number {
  let most = 0;
  for (let u = 0; u <= R; u += R / 2000) {
    const y = radiusAtHeight(cutter, h + u) - radiusAtHeight(cutter, h);
    const bead = Math.sqrt(Math.max(0, R * R - (R - y) ** 2));
    most = Math.max(most, bead - u);
  }
  return most;
}

describe('When a tapered cutter climbs into the corners of a beaded opening', () => {
  test('then going on to the base, as in a square edge, would cut into the bead', () => {
    // The formula of the square edge, taken to the bead's base: proved wrong here, 0.049 in as the swept field shows too.
    expect(takenOff(0)).toBeGreaterThan(0.02);
  });

  test('then no stand of it takes more off the bead than the flank does all along the edge', () => {
    const paths = lifts(base);
    expect(paths).toHaveLength(8);
    // Along the edge a flank of angle a takes R·tan(a/2) off the circle, straight down: plane trigonometry.
    const alongEdge = R * Math.tan((0.75 * Math.PI) / 180);
    expect(takenOff(0.8125 - BASE)).toBeCloseTo(alongEdge, 5);
    for (const path of paths) for (const p of path) expect(takenOff(-p.z - BASE)).toBeLessThan(alongEdge + 1e-6);
  });

  test('then it ends where its flank passes the base, r(1 − sin a) above the tip, and says what that leaves', () => {
    const a = (1.5 * Math.PI) / 180;
    const end = lifts(base)[0]!.at(-1)!;
    expect(-end.z).toBeCloseTo(BASE + 0.0625 * (1 - Math.sin(a)), 9);
    const [residue] = workFrame(base).residues;
    expect(residue!.levels[0]!.depth).toBeCloseTo(BASE, 12);
    // A square corner keeps r·cos a: r·cos a·(√2 − 1) on the diagonal.
    expect(residue!.levels[0]!.lifted.diagonal).toBeCloseTo(0.0625 * Math.cos(a) * (Math.SQRT2 - 1), 6);
    expect(workFrame(base).findings.find((f) => f.code === 'corner-residue')!.text).toContain('at the bead’s base');
  });
});

describe('When an edge is square', () => {
  test('then the climb ends in the corner itself, at the face', () => {
    const square = { ...base, edge: { style: 'square', sizeHeldAt: 'face' } } as Particulars;
    for (const path of lifts(square)) expect(path.at(-1)!.z).toBeCloseTo(0, 12);
  });

  test('then an opening kept square in a beaded frame climbs to the face as well', () => {
    const outline = {
      ...(base.outline as MembersOutline),
      layout: { columns: [{ opening: {} }, { opening: { edge: 'square' as const } }], between: 1.5 },
    };
    const ends = lifts({ ...base, outline }).map((path) => path.at(-1)!.z);
    expect(ends.filter((z) => Math.abs(z) < 1e-9)).toHaveLength(4);
    expect(ends.filter((z) => z < -BASE)).toHaveLength(4);
  });
});

describe('When corners are left round', () => {
  const round = { ...base, edge: { style: 'square', sizeHeldAt: 'face', corners: 'round' } } as Particulars;

  test('then there is no climb, and what is said to be left is what the axis leaves', () => {
    expect(lifts(round)).toEqual([]);
    const face = workFrame(round).residues[0]!.levels[0]!;
    expect(face.lifted).toEqual(face.unlifted);
    // ρ(0.8125)(√2 − 1): worked example.
    expect(face.lifted.diagonal).toBeCloseTo(0.082161 * (Math.SQRT2 - 1), 6);
  });
});

describe('When a V-cutter follows in beaded corners', () => {
  const vee = (includedAngle: number): Particulars => ({
    ...base,
    edge: { ...(base.edge as BeadedEdge), corners: 'vee' satisfies CornerMethod },
    cutters: { ...base.cutters, corner: { kind: 'vee', includedAngle, fluteLength: 1 } },
  });
  const said = (p: Particulars) => workFrame(p).findings.filter((f) => f.code === 'bead-shaved');

  test('then its flank in the bead is a caution: 30° takes R·tan(15°/2) off, straight down', () => {
    const [finding] = said(vee(30));
    expect(finding!.level).toBe('caution');
    expect(finding!.numbers['below']).toBeCloseTo(R * Math.tan(Math.PI / 24), 4);
  });

  test('then one so slim that it takes under 0.002 off is none', () => {
    expect(said(vee(4))).toEqual([]);
  });
});

import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { contourArea } from '#shared/kernel/contour/contour-area.ts';
import { contourExtents } from '#shared/kernel/contour/contour-extents.ts';
import { contourLength } from '#shared/kernel/contour/contour-length.ts';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import type { HealCounts, HealedDrawing } from '#shared/kernel/tracing/heal/healed-drawing.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { curvesOf, type Row } from './loose-curves.ts';

/** A situation: segments, and what plain geometry says must come of them. Areas and lengths are formulas, no output of ours. */
interface Case {
  readonly says: string;
  readonly unit: Unit;
  readonly arcsFromLines?: number;
  readonly segments: readonly Row[];
  readonly loops: readonly {
    readonly kind: string;
    readonly area: number;
    readonly length: number;
    readonly vertices: number;
    readonly width: number;
    readonly height: number;
  }[];
  readonly open: number;
  readonly counts: Partial<HealCounts>;
  readonly problems: Readonly<Record<string, number>>;
}

const folder = join(import.meta.dirname, 'cases');
const cases = readdirSync(folder).map((name): [string, Case] => [
  name.replace('.json', ''),
  JSON.parse(readFileSync(join(folder, name), 'utf8')) as Case,
]);

const TURNS = [0, 1, 2, 3].flatMap((quarters) => [false, true].map((mirrored) => ({ quarters, mirrored })));

/** The drawing turned by quarters about 0, 0, and mirrored about the Y axis before. */
function turned([ax, ay, bx, by, bulge]: Row, { quarters, mirrored }: (typeof TURNS)[number]): Row {
  const turn = (x: number, y: number): [number, number] => {
    let p: [number, number] = [mirrored ? -x : x, y];
    for (let i = 0; i < quarters; i++) p = [-p[1], p[0]];
    return p;
  };
  return [...turn(ax, ay), ...turn(bx, by), mirrored ? -bulge : bulge];
}

const described = ({ loops }: HealedDrawing, quarters: number) =>
  loops
    .map(({ contour, kind }) => {
      const e = contourExtents(contour);
      const size = [e.maxX - e.minX, e.maxY - e.minY];
      if (quarters % 2 === 1) size.reverse();
      return { kind, area: contourArea(contour), length: contourLength(contour), count: contour.vertices.length, size };
    })
    .sort((p, q) => p.area - q.area || p.size[1]! - q.size[1]!);

const tally = ({ problems }: HealedDrawing) => {
  const counts: Record<string, number> = {};
  for (const { code } of problems) counts[code] = (counts[code] ?? 0) + 1;
  return counts;
};

const sizeOrder = (loops: Case['loops']) => loops.toSorted((p, q) => p.area - q.area || p.height - q.height);

describe.each(cases)('When a drawing is healed: %s', (_, wanted) => {
  test.each(TURNS)('turned by $quarters quarters, mirrored $mirrored, then its loops are those expected', (turning) => {
    const rows = wanted.segments.map((row) => turned(row, turning));
    const arcs = wanted.arcsFromLines;
    const healed = healCurves(curvesOf(rows), {
      unit: wanted.unit,
      ...(arcs === undefined ? {} : { arcsFromLines: { tolerance: arcs } }),
    });
    const loops = described(healed, turning.quarters);
    const expected = sizeOrder(wanted.loops);
    expect(loops.map(({ kind }) => kind).sort()).toEqual(expected.map(({ kind }) => kind).sort());
    // A sliver that goes takes its corner along, by less than its length.
    const slack = wanted.counts.slivers ? 0.3 : 1e-8;
    loops.forEach((loop, i) => {
      const want = expected[i]!;
      expect(Math.abs(loop.area - want.area), `area ${loop.area}, wanted ${want.area}`).toBeLessThan(slack);
      expect(Math.abs(loop.length - want.length), `length ${loop.length}`).toBeLessThan(slack);
      expect(loop.count).toBe(want.vertices);
    });
    const sizes = (list: readonly (readonly number[])[]) =>
      list.map((size) => size.map((n) => n.toFixed(wanted.counts.slivers ? 1 : 6)).join(' × ')).sort();
    expect(sizes(loops.map(({ size }) => size))).toEqual(sizes(expected.map(({ width, height }) => [width, height])));
    expect(healed.open).toHaveLength(wanted.open);
    expect(healed.counts).toMatchObject(wanted.counts);
    expect(tally(healed)).toEqual(wanted.problems);
    const { counts } = healed;
    expect(counts.segments - counts.slivers - counts.duplicates + counts.splits - counts.overlaps).toBe(counts.edges);
    expect(counts.inLoops + counts.inOpen + counts.leftOut).toBe(counts.edges);
  });
});

test('When the situations are read, then there are some', () => {
  expect(cases.length).toBeGreaterThan(25);
});

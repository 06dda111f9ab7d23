import makerjs from 'makerjs';
import type { FoundCurves } from '#shared/kernel/tracing/found-drawing.ts';
import { healCurves } from '#shared/kernel/tracing/heal/heal-curves.ts';
import { median, type BenchRow } from './bench-row.ts';

const LOOSE = 50_000;
const FEW = 10_000;
const MANY = 300_000;
const WARM_UPS = 2;
const RUNS = 9;

type Line = readonly [x: number, y: number, toX: number, toY: number];

/** Sides of rectangles of several sizes, at places that are no neat decimals, in no order: 7919 has no divisor in common with the counts. */
function looseSides(count: number): Line[] {
  const sides: Line[] = [];
  const columns = Math.ceil(Math.sqrt(count / 4));
  for (let i = 0; 4 * i < count; i++) {
    const [x, y] = [(i % columns) * 31.7 + i / 96, Math.floor(i / columns) * 30.3];
    const [w, h] = [20 + (i % 7), 15 + (i % 5)];
    sides.push([x, y, x + w, y], [x + w, y, x + w, y + h], [x + w, y + h, x, y + h], [x, y + h, x, y]);
  }
  return sides.map((_, i) => sides[(i * 7919) % sides.length]!);
}

const curvesOf = (lines: readonly Line[]): FoundCurves => ({
  count: lines.length,
  segments: Float64Array.from(lines.flatMap((line) => [...line, 0])),
  entityOf: Uint32Array.from(lines, (_, i) => i),
});

const modelOf = (lines: readonly Line[]) => ({
  paths: Object.fromEntries(
    lines.map(([ax, ay, bx, by], i) => [`line${i}`, new makerjs.paths.Line([ax, ay], [bx, by])]),
  ),
});

const timed = (work: () => number, loops: number): number => {
  const from = performance.now();
  const found = work();
  const time = performance.now() - from;
  if (found !== loops) throw new Error(`got ${found} loops, takes ${loops}`);
  return time;
};

/** Healing 50,000 loose lines against makerjs chaining them, taking turns; and how the time grows to 300,000. */
export async function run(): Promise<BenchRow[]> {
  const lines = looseSides(LOOSE);
  const curves = curvesOf(lines);
  const model = modelOf(lines);
  const ratios: number[] = [];
  for (let i = 0; i < WARM_UPS + RUNS; i++) {
    const theirs = timed(() => {
      const chains = makerjs.model.findChains(model);
      return Array.isArray(chains) ? chains.filter((chain) => chain.endless).length : 0;
    }, LOOSE / 4);
    const ours = timed(() => healCurves(curves, { unit: 'mm' }).loops.length, LOOSE / 4);
    if (i >= WARM_UPS) ratios.push(ours / theirs);
    // Lets the collector's work fall between the runs.
    await new Promise((done) => setImmediate(done));
  }
  return [
    row('heal 50,000 loose lines', 'makerjs findChains', median(ratios), 0.5),
    row('heal 300,000 loose lines', '10,000, grown as n log n', await growth(), 1),
  ];
}

/** Time of 300,000 lines over that of 10,000 grown as n log n: as many healings of the few as make the same number of lines, taking turns. */
async function growth(): Promise<number> {
  const few = curvesOf(looseSides(FEW));
  const many = curvesOf(looseSides(MANY));
  const times = MANY / FEW;
  const ratios: number[] = [];
  for (let i = 0; i < WARM_UPS + RUNS; i++) {
    // Without a pause between them, so that the collector's work counts on both sides.
    let fewTime = 0;
    for (let j = 0; j < times; j++) fewTime += timed(() => healCurves(few, { unit: 'mm' }).loops.length, FEW / 4);
    const manyTime = timed(() => healCurves(many, { unit: 'mm' }).loops.length, MANY / 4);
    if (i >= WARM_UPS) ratios.push(manyTime / ((fewTime * Math.log(MANY)) / Math.log(FEW)));
    await new Promise((done) => setImmediate(done));
  }
  return median(ratios);
}

const row = (name: string, against: string, ratio: number, limit: number): BenchRow => ({
  name,
  against,
  ratio,
  limit,
  ok: ratio <= limit,
});

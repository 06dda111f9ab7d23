import type { Extents } from '#shared/kernel/contour/contour.ts';
import { boardExtents, cutBoard, finishedStage } from '#shared/kernel/height-field/cut-board.ts';
import { makeGrid } from '#shared/kernel/height-field/grid.ts';
import { measureFrame } from '#shared/kernel/height-field/measure-frame.ts';
import { runThrough, sweepFace } from '#shared/kernel/height-field/sweep-face.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { beadedExample } from '../builders/beaded-example.ts';
import { dado } from '../builders/worked-example.ts';
import type { BenchRow } from './bench-row.ts';

/** What a person may have to wait for, in milliseconds of one thread. */
const ALLOWED = { faces: 2000, corner: 150, measured: 4000 };
/** Four times the samples may take this much more than four times the time: caches. */
const LINEAR = 1.3;

const MM = 1 / 25.4;
const WARM_UPS = 2;
const RUNS = 7;

/** Processor time of one call in milliseconds, the least of several: what else the machine does is not counted. */
function leastTime(work: () => unknown): number {
  let least = Infinity;
  for (let i = 0; i < WARM_UPS + RUNS; i++) {
    const before = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(before);
    if (i >= WARM_UPS) least = Math.min(least, (user + system) / 1000);
  }
  return least;
}

/** A beaded frame of 36 × 30 in with two openings and four dados. */
const frame = beadedExample({
  outline: {
    kind: 'members',
    width: 36,
    height: 30,
    stiles: { left: 1.75, right: 1.75 },
    rails: { top: 1.75, bottom: 1.25 },
    feet: 0,
    layout: { columns: [{ opening: { label: 'A' } }, { opening: { label: 'B' } }], between: 1.5 },
  },
  dados: [
    dado({ to: 30 }),
    dado({ part: 'Right end', at: 35, to: 30 }),
    dado({ part: 'Partition', at: 17.625, from: 1.25, to: 30, ends: ['meets', 'open'] }),
    dado({ part: 'Bottom', runs: 'horizontal', at: 0.4, from: 1, to: 35, ends: ['meets', 'meets'] }),
  ],
});

/** Height fields of both faces of a frame, of a corner, and the search for differences: processor time over what is allowed, and its growth with the samples. */
export async function run(): Promise<BenchRow[]> {
  const worked = workFrame(frame);
  const { profile } = BUILTIN_PROFILES[0]!;
  const stage = finishedStage(worked, profile);
  const area: Extents = { minX: 0, minY: 0, maxX: 36, maxY: 30 };
  const bothFaces = (cell: number) => [
    runThrough(sweepFace(stage.back, makeGrid(area, cell))),
    runThrough(sweepFace(stage.front, makeGrid(area, cell))),
  ];
  const whole = runThrough(cutBoard(stage, makeGrid(boardExtents(worked, stage), MM)));
  const half = (25.5 * MM) / 2;
  const corner = { minX: 1.75 - half, maxX: 1.75 + half, minY: 1.25 - half, maxY: 1.25 + half };

  const usual = leastTime(() => bothFaces(0.5 * MM));
  const coarser = leastTime(() => bothFaces(MM));
  const close = leastTime(() => {
    const fresh = finishedStage(worked, profile);
    return runThrough(cutBoard(fresh, makeGrid(corner, 0.05 * MM), whole));
  });
  const measured = leastTime(() => runThrough(measureFrame(worked, profile, 0.5 * MM)));
  const row = (name: string, against: string, ratio: number, limit: number): BenchRow => ({
    name,
    against,
    ratio,
    limit,
    ok: ratio <= limit,
  });
  return [
    row(
      'height fields of both faces, 36 × 30 in at 0.5 mm',
      `${ALLOWED.faces} ms of one thread`,
      usual / ALLOWED.faces,
      1,
    ),
    row('the same', 'four times the time at 1 mm', usual / (4 * coarser), LINEAR),
    row('a corner of 25.5 mm at 0.05 mm, both faces', `${ALLOWED.corner} ms of one thread`, close / ALLOWED.corner, 1),
    row(
      'differences from what is meant, whole board at 0.5 mm',
      `${ALLOWED.measured} ms of one thread`,
      measured / ALLOWED.measured,
      1,
    ),
  ];
}

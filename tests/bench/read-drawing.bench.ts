import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import DxfParser from 'dxf-parser';
import { readDrawing } from '#shared/kernel/tracing/read/read-drawing.ts';
import type { BenchRow } from './bench-row.ts';
import { manyEntities } from './many-entities.ts';

/** About 40 MB: more than is taken of anybody, so the limit is lifted here. */
const ENTITIES = 205_000;
const LIFTED = { limits: { bytes: 2 ** 30 } };
const RUNS = 7;

/** Processor time of a call in milliseconds, the collector's work included: what else the machine does is not counted. */
const time = (work: () => unknown): number => {
  const before = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
};

const rest = () => new Promise((done) => setImmediate(done));

const row = (name: string, against: string, ratio: number, limit: number): BenchRow => ({
  name,
  against,
  ratio,
  limit,
  ok: ratio <= limit,
});

const entitiesOf = (bytes: Uint8Array): number =>
  readDrawing(bytes, LIFTED).census.reduce((sum, { count }) => sum + count, 0);

/** The two take turns, and the least processor time of each counts. */
async function timeRatio(bytes: Uint8Array): Promise<number> {
  const text = new TextDecoder().decode(bytes);
  const readers = [() => entitiesOf(bytes), () => new DxfParser().parseSync(text)!.entities.length];
  const least = readers.map(() => Infinity);
  for (let i = 0; i < RUNS; i++)
    for (const [k, read] of readers.entries()) {
      let entities = 0;
      least[k] = Math.min(
        least[k]!,
        time(() => (entities = read())),
      );
      if (entities !== ENTITIES) throw new Error(`read ${entities} of ${ENTITIES} entities`);
      await rest();
    }
  return least[0]! / least[1]!;
}

/** Greatest memory in megabytes of a process that reads the file once, by either reader. */
function peakMemory(file: string, reader: 'ours' | 'dxf-parser'): number {
  const kernel = join(import.meta.dirname, '../../shared/kernel/tracing/read/read-drawing.ts');
  const work =
    reader === 'ours'
      ? `const { readDrawing } = await import(${JSON.stringify(kernel)});
         if (readDrawing(readFileSync(file), ${JSON.stringify(LIFTED)}).curves.count === 0) throw new Error('nothing read');`
      : `const { default: DxfParser } = await import('dxf-parser');
         if (new DxfParser().parseSync(readFileSync(file, 'utf8')).entities.length === 0) throw new Error('nothing read');`;
  const script = `import { readFileSync } from 'node:fs';
    const file = ${JSON.stringify(file)};
    ${work}
    console.log(process.resourceUsage().maxRSS / 1024);`;
  const run = spawnSync(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script], {
    encoding: 'utf8',
    cwd: join(import.meta.dirname, '../..'),
  });
  if (run.status !== 0) throw new Error(`${reader}: ${run.stderr}`);
  return Number(run.stdout);
}

function memoryRatio(bytes: Uint8Array): number {
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-bench-'));
  try {
    const file = join(folder, 'many.dxf');
    writeFileSync(file, bytes);
    return peakMemory(file, 'ours') / peakMemory(file, 'dxf-parser');
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Least processor time of 10,000 and of 300,000 entities, read in turns, the second over n log n of the first. */
async function growth(): Promise<number> {
  const counts = [10_000, 300_000] as const;
  const files = counts.map(manyEntities);
  const least = counts.map(() => Infinity);
  for (let i = 0; i < 4 * RUNS; i++) {
    for (const k of i % 4 === 0 ? [0, 1] : [0])
      least[k] = Math.min(
        least[k]!,
        time(() => entitiesOf(files[k]!)),
      );
    await rest();
  }
  const [few, many] = counts;
  return least[1]! / least[0]! / ((many * Math.log(many)) / (few * Math.log(few)));
}

/** Reading somebody's drawing of about 40 MB, against dxf-parser alone: processor time, memory, and how time grows. */
export async function run(): Promise<BenchRow[]> {
  const bytes = manyEntities(ENTITIES);
  const size = `${Math.round(bytes.length / 2 ** 20)} MB`;
  return [
    row(`read a drawing of ${size}`, 'processor time of dxf-parser alone', await timeRatio(bytes), 1 / 3),
    row('the same, greatest memory of the process', 'dxf-parser alone', memoryRatio(bytes), 1 / 2),
    row('read 300,000 entities', 'n log n of the processor time of 10,000', await growth(), 1),
  ];
}

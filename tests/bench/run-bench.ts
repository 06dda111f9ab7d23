import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Bench, BenchRow } from './bench-row.ts';

/** `npm run bench`: runs every tests/bench/*.bench.ts one after the other and prints their ratios; fails when one is over its limit. */

const folder = import.meta.dirname;

async function runFile(name: string): Promise<BenchRow[]> {
  const bench = (await import(join(folder, name))) as Partial<Bench>;
  if (typeof bench.run !== 'function') throw new Error(`${name} exports no function run`);
  return bench.run();
}

const column = (values: string[], pad: 'padEnd' | 'padStart') => {
  const width = Math.max(...values.map((value) => value.length));
  return values.map((value) => value[pad](width));
};

function table(rows: readonly BenchRow[]): string[] {
  const short = (n: number) => n.toPrecision(3);
  const names = column(['what', ...rows.map((row) => row.name)], 'padEnd');
  const against = column(['against', ...rows.map((row) => row.against)], 'padEnd');
  const ratios = column(['ratio', ...rows.map((row) => short(row.ratio))], 'padStart');
  const limits = column(['at most', ...rows.map((row) => short(row.limit))], 'padStart');
  const verdicts = ['', ...rows.map((row) => (row.ok ? 'ok' : 'too slow'))];
  return names.map((name, i) => `${name}  ${against[i]}  ${ratios[i]}  ${limits[i]}  ${verdicts[i]}`.trimEnd());
}

const files = readdirSync(folder).filter((name) => name.endsWith('.bench.ts'));
const rows: BenchRow[] = [];
for (const name of files.sort()) rows.push(...(await runFile(name)));
console.log(table(rows).join('\n'));
if (rows.length === 0 || rows.some((row) => !row.ok)) process.exitCode = 1;

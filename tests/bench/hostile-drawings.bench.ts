import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import { PLAIN_TRACE } from '#shared/kernel/tracing/traced-drawing.ts';
import { buildWhenChanged } from '../../server/cli/build-product.ts';
import { HttpClient } from '../setup/http-client.ts';
import { runServer } from '../setup/run-server.ts';
import type { BenchRow } from './bench-row.ts';

/** Nobody's small request may wait longer than this for somebody else's drawing. */
const LONGEST_WAIT_MS = 200;
const MB = 1024 * 1024;
const BYTES = 31 * MB;

const entities = (body: string): string => `0\nSECTION\n2\nENTITIES\n${body}0\nENDSEC\n0\nEOF\n`;
const filled = (piece: (i: number) => string): string => {
  const pieces: string[] = [];
  for (let length = 0, i = 0; length < BYTES - 100; i++) {
    const next = piece(i);
    pieces.push(next);
    length += next.length;
  }
  return pieces.join('');
};

/** What is dear to read, or to heal, or to send back, as large as is taken. */
const DRAWINGS: Record<string, () => string> = {
  'numbers that are none': () => filled((i) => `${(i * 7919) % 1013}\n${'x'.repeat(i % 60)}\n`),
  'one polyline of 31 MB': () =>
    entities(`0\nLWPOLYLINE\n8\n0\n90\n999999999\n${filled((i) => `10\n${i % 977}\n20\n${i}\n`)}`),
  '390,000 lines that cross each other': () => {
    const lines: string[] = [];
    for (let i = 0; i < 390_000; i++)
      lines.push(
        `0\nLINE\n8\n0\n10\n${(i * 37) % 1000}\n20\n${(i * 91) % 1000}\n11\n${(i * 53) % 1000}\n21\n${(i * 17) % 1000}\n`,
      );
    return entities(lines.join(''));
  },
};

/** Longest wait for an answer that costs nothing, while `work` goes on. */
async function longestWait(url: string, work: () => Promise<void>): Promise<number> {
  const watch = new Worker(new URL('./watch-waits.mjs', import.meta.url), { workerData: url });
  await new Promise((done) => watch.once('online', done));
  await work();
  const told = new Promise<{ longest: number; answers: number }>((done) => watch.once('message', done));
  watch.postMessage('stop');
  const { longest, answers } = await told;
  if (answers < 10) throw new Error(`only ${answers} answers meanwhile`);
  return longest;
}

/** How long other people wait while somebody uploads and reads the worst drawings. */
export async function run(): Promise<BenchRow[]> {
  await buildWhenChanged(join(import.meta.dirname, '../..'), console.log);
  const server = await runServer({ DEMO: 'off' });
  try {
    const visitor = new HttpClient(server.url);
    const owner = { shopName: 'Bench', name: 'Bench', email: 'bench@shop.example', password: 'correct horse battery' };
    const opened = await visitor.post('/api/sign-up', owner);
    if (opened.status !== 201) throw new Error(`sign-up: ${opened.status}`);
    const job = (await visitor.post('/api/jobs', { name: 'Bench' })).json<{ id: string }>();
    const rows: BenchRow[] = [];
    for (const [what, make] of Object.entries(DRAWINGS)) {
      const form = new FormData();
      form.append('file', new Blob([make()]), 'worst.dxf');
      const work = async () => {
        const uploaded = await visitor.send('POST', `/api/jobs/${job.id}/tracings`, { body: form });
        if (uploaded.status !== 201) throw new Error(`upload: ${uploaded.status}`);
        const { id } = uploaded.json<{ id: string }>();
        const read = await visitor.post(`/api/tracings/${id}/reading`, { options: { ...PLAIN_TRACE, unit: 'mm' } });
        if (![200, 413, 422].includes(read.status)) throw new Error(`reading: ${read.status}`);
      };
      const ratio = (await longestWait(`${server.url}/healthz`, work)) / LONGEST_WAIT_MS;
      rows.push({
        name: `longest wait of others during a drawing: ${what}`,
        against: `${LONGEST_WAIT_MS} ms`,
        ratio,
        limit: 1,
        ok: ratio <= 1,
      });
    }
    return rows;
  } finally {
    await server.stop();
  }
}

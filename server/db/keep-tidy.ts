import type { PGlite } from '@electric-sql/pglite';

const MINUTE = 60_000;
const CHECKPOINT_EVERY = 5 * MINUTE;
const VACUUM_EVERY = 24 * 60 * MINUTE;

/** PGlite has no background workers: without this its log grows without end and its statistics go stale. */
export function keepTidy(client: PGlite): { stop(): void } {
  const run = (statement: string) => () => {
    client.exec(statement).catch((error: unknown) => {
      if (!client.closed) process.stderr.write(`${statement} failed: ${String(error)}\n`);
    });
  };
  const timers = [setInterval(run('CHECKPOINT'), CHECKPOINT_EVERY), setInterval(run('VACUUM ANALYZE'), VACUUM_EVERY)];
  for (const timer of timers) timer.unref();
  return { stop: () => timers.forEach((timer) => clearInterval(timer)) };
}

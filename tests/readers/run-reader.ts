import { spawnSync } from 'node:child_process';
import { READERS } from '../setup/readers.ts';

/**
 * Runs a program from outside the product and returns what it printed. Throws when it is missing, with what to
 * install, and when it ends badly, with what it said.
 */
export function runReader(command: string, args: readonly string[], input?: string): string {
  const env = { ...process.env, QT_QPA_PLATFORM: 'offscreen', LC_ALL: 'C.UTF-8' };
  const run = spawnSync(command, args, {
    input,
    env,
    encoding: 'utf8',
    maxBuffer: 256 * 1024 * 1024,
    timeout: 120_000,
  });
  if (run.error) {
    const reader = READERS.find((r) => r.command === command);
    throw new Error(
      `${reader?.name ?? command} cannot be run (${run.error.message}); install ${reader?.packageName ?? command}`,
    );
  }
  if (run.status !== 0) throw new Error(`${command} ended with ${run.status}: ${run.stderr || run.stdout}`);
  return run.stdout;
}

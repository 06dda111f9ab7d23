import { spawnSync } from 'node:child_process';
import { READERS } from '../setup/readers.ts';

/**
 * Runs a program from outside the product and returns the bytes that it printed. Throws when it is missing, with what
 * to install, and when it ends badly, with what it said.
 */
export function readerBytes(command: string, args: readonly string[]): Buffer {
  const env = { ...process.env, QT_QPA_PLATFORM: 'offscreen', LC_ALL: 'C.UTF-8' };
  const run = spawnSync(command, args, { env, maxBuffer: 256 * 1024 * 1024, timeout: 120_000 });
  if (run.error) {
    const reader = READERS.find((r) => r.command === command);
    const install = `install ${reader?.packageName ?? command}`;
    throw new Error(`${reader?.name ?? command} cannot be run (${run.error.message}); ${install}`);
  }
  if (run.status !== 0)
    throw new Error(`${command} ended with ${run.status}: ${run.stderr.toString()}${run.stdout.toString()}`);
  return run.stdout;
}

/** The same as text. */
export const runReader = (command: string, args: readonly string[]): string =>
  readerBytes(command, args).toString('utf8');

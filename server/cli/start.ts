import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { join } from 'node:path';
import { buildWhenChanged } from './build-product.ts';

const root = join(import.meta.dirname, '../..');

/** A key pressed in a terminal reaches this process more than once: from the terminal and from the program that started it. */
const SAME_PRESS_MS = 500;

/** Runs the built server, hands signals on to it, and ends with its exit code. */
function runServer(): void {
  const child = spawn(process.execPath, ['--enable-source-maps', join(root, 'dist/server/main.js')], {
    env: { ...process.env, NODE_ENV: 'production' },
    stdio: 'inherit',
    // A group of its own, or the terminal would send it every signal a second time, which it takes for impatience.
    detached: true,
  });
  let handedOn = -Infinity;
  const handOn = (signal: 'SIGINT' | 'SIGTERM') => () => {
    if (performance.now() - handedOn < SAME_PRESS_MS) return;
    handedOn = performance.now();
    child.kill(signal);
  };
  process.on('SIGINT', handOn('SIGINT'));
  process.on('SIGTERM', handOn('SIGTERM'));
  process.on('SIGHUP', handOn('SIGTERM'));
  child.once('error', (error) => {
    console.error(`The server could not be started: ${error.message}`);
    process.exitCode = 1;
  });
  child.once('exit', (code, signal) => {
    // A server ended by a signal counts as 128 and the signal's number, as shells count it.
    process.exit(code ?? 128 + (signal ? constants.signals[signal] : 0));
  });
}

try {
  await buildWhenChanged(root, console.log);
  runServer();
} catch (error) {
  console.error((error as Error).message);
  process.exitCode = 1;
}

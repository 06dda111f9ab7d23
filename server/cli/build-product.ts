import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { sourceStamp } from './source-stamp.ts';

const vite = join(dirname(createRequire(import.meta.url).resolve('vite/package.json')), 'bin/vite.js');

const stampFile = (root: string) => join(root, 'dist/sources.sha256');

/** Runs one vite build in a process of its own; its output is kept back and shown only when it fails. */
function runVite(root: string, args: string[]): Promise<void> {
  return new Promise((done, failed) => {
    const child = spawn(process.execPath, [vite, 'build', '--logLevel', 'warn', ...args], {
      cwd: root,
      env: { ...process.env, NODE_ENV: 'production' },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let said = '';
    child.stdout.on('data', (chunk: Buffer) => (said += chunk.toString()));
    child.stderr.on('data', (chunk: Buffer) => (said += chunk.toString()));
    child.once('error', failed);
    child.once('close', (code) =>
      code === 0 ? done() : failed(new Error(`vite build ${args.join(' ')} failed\n${said}`)),
    );
  });
}

function lastStamp(root: string): string {
  try {
    return readFileSync(stampFile(root), 'utf8').trim();
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return '';
    throw error;
  }
}

/** True when dist/ was built from the sources as they are now. */
export const isBuilt = (root: string): boolean => lastStamp(root) === sourceStamp(root);

/**
 * Builds the client into dist/client and the server into dist/server, and notes what they were built from.
 * `say` gets one line a step. Throws with the builder's output when a step fails; no stamp is left then.
 */
export async function buildProduct(root: string, say: (line: string) => void): Promise<void> {
  const stamp = sourceStamp(root);
  rmSync(join(root, 'dist'), { recursive: true, force: true });
  say('Building the pages (1 of 2)');
  await runVite(root, []);
  say('Building the server (2 of 2)');
  await runVite(root, ['--ssr']);
  mkdirSync(join(root, 'dist'), { recursive: true });
  writeFileSync(stampFile(root), `${stamp}\n`);
}

/** Builds unless dist/ already holds a build of the sources as they are. */
export async function buildWhenChanged(root: string, say: (line: string) => void): Promise<void> {
  if (isBuilt(root)) return;
  await buildProduct(root, say);
}

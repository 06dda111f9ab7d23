import { spawn, type ChildProcess } from 'node:child_process';
import { join } from 'node:path';

const root = join(import.meta.dirname, '../..');

export interface ServerProcess {
  readonly child: ChildProcess;
  readonly url: string;
  /** All that it has written so far. */
  output(): string;
}

/** Starts the server in a process of its own: server/main.ts, or tests/setup/serve-api.ts without the client. Rejects with its output when it ends before it listens. */
export function startServerProcess(
  entry: 'server/main.ts' | 'tests/setup/serve-api.ts',
  env: Record<string, string>,
): Promise<ServerProcess> {
  const child = spawn(process.execPath, ['--import', 'tsx', join(root, entry)], {
    cwd: root,
    env: { PATH: process.env.PATH, HOME: process.env.HOME, PORT: '0', DEMO: 'off', ...env },
  });
  let text = '';
  return new Promise((resolve, reject) => {
    const read = (chunk: Buffer) => {
      text += chunk.toString();
      const url = /ready: (http:\/\/\S+)/.exec(text)?.[1];
      if (url) resolve({ child, url, output: () => text });
    };
    child.stdout.on('data', read);
    child.stderr.on('data', read);
    child.once('error', reject);
    child.once('exit', (code) => reject(new Error(`ended with ${code}: ${text}`)));
  });
}

/** Sends a signal and waits for the end. */
export const endProcess = (child: ChildProcess, signal: NodeJS.Signals): Promise<number | null> =>
  new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve(child.exitCode);
    child.once('exit', (code) => resolve(code));
    child.kill(signal);
  });

import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const root = join(import.meta.dirname, '../..');

/** A server of our own, with a data folder of its own that goes when it stops. */
export interface RunningServer {
  readonly url: string;
  /** All that it printed so far. */
  readonly output: () => string;
  readonly stop: () => Promise<void>;
}

const ended = (child: ChildProcess) => new Promise<void>((done) => child.once('close', () => done()));

/** The first address that the server prints. Rejects with its output when it ends or is silent for `patience` ms. */
function addressOf(child: ChildProcess, output: () => string, patience: number): Promise<string> {
  return new Promise((done, failed) => {
    const giveUp = (why: string) => {
      clearTimeout(timer);
      failed(new Error(`${why}\n${output()}`));
    };
    const timer = setTimeout(() => giveUp(`The server printed no address within ${patience / 1000} s`), patience);
    child.once('close', (code) => giveUp(`The server ended with ${code} before it printed an address`));
    child.stdout?.on('data', () => {
      const found = /http:\/\/[\w.[\]:]+:(\d+)/.exec(output());
      if (!found) return;
      clearTimeout(timer);
      done(`http://localhost:${found[1]}`);
    });
  });
}

/** Starts the built server on a free port with an empty embedded database. */
export async function runServer(env: Record<string, string> = {}): Promise<RunningServer> {
  const dataDir = mkdtempSync(join(tmpdir(), 'stilepost-'));
  const child = spawn(process.execPath, ['--enable-source-maps', join(root, 'dist/server/main.js')], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', PORT: '0', DATA_DIR: dataDir, DATABASE_URL: '', ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  child.stdout.on('data', (chunk: Buffer) => (said += chunk.toString()));
  child.stderr.on('data', (chunk: Buffer) => (said += chunk.toString()));
  const output = () => said;
  const stop = async () => {
    if (child.exitCode === null && child.signalCode === null) {
      const end = ended(child);
      child.kill('SIGTERM');
      await end;
    }
    rmSync(dataDir, { recursive: true, force: true });
  };
  try {
    return { url: await addressOf(child, output, 120_000), output, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

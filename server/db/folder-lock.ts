import { linkSync, readFileSync, renameSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { join } from 'node:path';
import { randomUUID } from 'node:crypto';
import { z } from 'zod';
import { processStart } from './process-identity.ts';

const holder = z.object({ pid: z.number(), started: z.string(), host: z.string(), token: z.string() });
type Holder = z.infer<typeof holder>;

/** How often the holder shows that it lives, and after how long a holder on another machine is given up. */
const SIGN_OF_LIFE_MS = 10_000;
const GIVEN_UP_AFTER_MS = 60_000;

/** Somebody else has the data folder open. */
export class FolderInUse extends Error {
  constructor(folder: string, who: Holder) {
    super(
      `The data folder ${folder} is in use by another Stilepost (process ${who.pid} on ${who.host}). ` +
        'Two at once would lose data. Stop that one first, or start this one with another DATA_DIR.',
    );
    this.name = 'FolderInUse';
  }
}

export interface FolderLock {
  release(): void;
}

/**
 * Takes the lock file of a data folder: one process a folder, as two would silently lose each other's rows.
 * A lock left by a killed process is taken over. Throws FolderInUse.
 */
export function lockFolder(folder: string): FolderLock {
  const path = join(folder, 'lock.json');
  const mine: Holder = {
    pid: process.pid,
    started: processStart(process.pid) ?? 'unknown',
    host: hostname(),
    token: randomUUID(),
  };
  const written = `${path}.${mine.token}`;
  writeFileSync(written, `${JSON.stringify(mine)}\n`);
  try {
    // A link is made whole or not at all, so two that start together cannot both have it.
    while (!linked(written, path)) {
      const other = readHolder(path);
      if (other === 'gone') continue;
      if (other !== 'unreadable' && lives(other, path)) throw new FolderInUse(folder, other);
      setAside(path, other);
    }
  } finally {
    rmSync(written, { force: true });
  }
  const signOfLife = setInterval(() => utimesSync(path, new Date(), new Date()), SIGN_OF_LIFE_MS);
  signOfLife.unref();
  return {
    release: () => {
      clearInterval(signOfLife);
      const now = readHolder(path);
      if (typeof now !== 'string' && now.token === mine.token) rmSync(path, { force: true });
    },
  };
}

function linked(from: string, to: string): boolean {
  try {
    linkSync(from, to);
    return true;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'EEXIST') return false;
    throw error;
  }
}

function readHolder(path: string): Holder | 'gone' | 'unreadable' {
  let text: string;
  try {
    text = readFileSync(path, 'utf8');
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return 'gone';
    throw error;
  }
  try {
    return holder.parse(JSON.parse(text));
  } catch {
    return 'unreadable';
  }
}

/** On this machine the process tells; on another one (a shared folder) only the sign of life does. */
function lives(other: Holder, path: string): boolean {
  if (other.host === hostname()) return processStart(other.pid) === other.started;
  return Date.now() - statSync(path).mtimeMs < GIVEN_UP_AFTER_MS;
}

/** Moves a dead lock away, unless another process has put its own there meanwhile: then that one is put back. */
function setAside(path: string, dead: Holder | 'unreadable'): void {
  const aside = `${path}.${randomUUID()}`;
  try {
    renameSync(path, aside);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return;
    throw error;
  }
  const moved = readHolder(aside);
  if (typeof moved !== 'string' && typeof dead !== 'string' && moved.token !== dead.token) linked(aside, path);
  rmSync(aside, { force: true });
}

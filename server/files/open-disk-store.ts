import { createHash, randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, rmSync } from 'node:fs';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import type { Readable } from 'node:stream';
import type { FileStore, KeptFile } from './file-store.ts';

const HASH = /^[0-9a-f]{64}$/;

/** Makes a rename last through a power cut. */
async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}

/** Writes a stream to a new file and flushes it; null when it is longer than `longest`: the rest is read and thrown away. */
async function writeThrough(path: string, stream: Readable, longest: number): Promise<KeptFile | null> {
  const hash = createHash('sha256');
  let bytes = 0;
  const handle = await open(path, 'wx', 0o600);
  try {
    for await (const chunk of stream as AsyncIterable<Buffer>) {
      bytes += chunk.length;
      if (bytes > longest) continue;
      hash.update(chunk);
      await handle.write(chunk);
    }
    await handle.sync();
  } finally {
    await handle.close();
  }
  return bytes > longest ? null : { sha256: hash.digest('hex'), bytes };
}

/**
 * Files in a folder on this machine, each under its hash. A file is written under another name, flushed and then renamed, so that
 * under its hash there is never half of one; what an earlier run left unfinished is cleared away.
 */
export function openDiskStore(folder: string): FileStore {
  const unfinished = join(folder, 'unfinished');
  mkdirSync(unfinished, { recursive: true });
  for (const name of readdirSync(unfinished)) rmSync(join(unfinished, name), { force: true });
  const pathOf = (sha256: string): string => {
    if (!HASH.test(sha256)) throw new RangeError(`file: got ${JSON.stringify(sha256)}, takes 64 hexadecimal digits`);
    return join(folder, sha256.slice(0, 2), sha256.slice(2));
  };

  return {
    async keep(stream, longest) {
      const path = join(unfinished, randomUUID());
      try {
        const kept = await writeThrough(path, stream, longest);
        if (kept === null) return null;
        const place = pathOf(kept.sha256);
        await mkdir(dirname(place), { recursive: true });
        await rename(path, place);
        await syncFolder(dirname(place));
        return kept;
      } finally {
        await rm(path, { force: true });
      }
    },

    async read(sha256) {
      const bytes = await readFile(pathOf(sha256));
      const found = createHash('sha256').update(bytes).digest('hex');
      if (found !== sha256) throw new Error(`file ${sha256} is damaged: its hash is ${found}`);
      return bytes;
    },
  };
}

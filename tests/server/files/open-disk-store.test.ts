import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { FileStore } from '../../../server/files/file-store.ts';
import { openDiskStore } from '../../../server/files/open-disk-store.ts';

let folder: string;
let files: FileStore;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'stilepost-files-'));
  files = openDiskStore(folder);
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const streamOf = (...chunks: string[]): Readable => Readable.from(chunks.map((chunk) => Buffer.from(chunk)));
const hashOf = (text: string): string => createHash('sha256').update(text).digest('hex');
const left = (): string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((e) => e.isFile())
    .map((e) => e.name);

describe('Files on disk', () => {
  it('When a file is kept, then it is read again under the SHA-256 of its bytes', async () => {
    const kept = await files.keep(streamOf('one ', 'two'), 100);
    expect(kept).toEqual({ sha256: hashOf('one two'), bytes: 7 });
    expect(Buffer.from(await files.read(kept!.sha256)).toString()).toBe('one two');
  });

  it('When the same file is kept twice, then it lies there once', async () => {
    await files.keep(streamOf('same'), 100);
    await files.keep(streamOf('sa', 'me'), 100);
    expect(left()).toEqual([hashOf('same').slice(2)]);
  });

  it('When a file is as long as allowed it is kept, and when it is a byte longer nothing of it is left', async () => {
    expect(await files.keep(streamOf('12345'), 5)).not.toBeNull();
    expect(await files.keep(streamOf('123', '456'), 5)).toBeNull();
    expect(left()).toEqual([hashOf('12345').slice(2)]);
  });

  it('When the sender breaks off, then that is an error and nothing is left', async () => {
    const broken = new Readable({
      read() {
        this.push(Buffer.from('half'));
        this.destroy(new Error('gone'));
      },
    });
    await expect(files.keep(broken, 100)).rejects.toThrow('gone');
    expect(left()).toEqual([]);
  });

  it('When the server was killed in the middle of a file, then the next start clears it away and keeps the others', async () => {
    await files.keep(streamOf('whole'), 100);
    writeFileSync(join(folder, 'unfinished', 'half'), 'ha');
    openDiskStore(folder);
    expect(left()).toEqual([hashOf('whole').slice(2)]);
  });

  it('When a file was changed on disk, then it is not handed out', async () => {
    const { sha256 } = (await files.keep(streamOf('right'), 100))!;
    writeFileSync(join(folder, sha256.slice(0, 2), sha256.slice(2)), 'wrong');
    await expect(files.read(sha256)).rejects.toThrow(/is damaged/);
  });

  it.each(['', '../../etc/passwd', 'A'.repeat(64)])(
    'When "%s" is asked for, then it is refused as no hash',
    async (name) => {
      await expect(files.read(name)).rejects.toThrow(RangeError);
    },
  );
});

import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { FolderInUse, lockFolder } from '../../../server/db/folder-lock.ts';
import { processStart } from '../../../server/db/process-identity.ts';

let folder: string;
let other: ChildProcess | undefined;
beforeEach(() => void (folder = mkdtempSync(join(tmpdir(), 'stilepost-lock-'))));
afterEach(() => {
  other?.kill('SIGKILL');
  other = undefined;
  rmSync(folder, { recursive: true, force: true });
});

const path = () => join(folder, 'lock.json');
const write = (holder: object) =>
  writeFileSync(path(), JSON.stringify({ pid: process.pid, started: 'x', host: hostname(), token: 't', ...holder }));
const startOther = () => (other = spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)']));

describe('The lock of a data folder', () => {
  it('When it is free, then it is taken, and free again afterwards with nothing left behind', () => {
    lockFolder(folder).release();
    expect(readdirSync(folder)).toEqual([]);
    lockFolder(folder).release();
  });

  it('When this process has it already, then it is refused', () => {
    const lock = lockFolder(folder);
    expect(() => lockFolder(folder)).toThrow(FolderInUse);
    expect(readdirSync(folder)).toEqual(['lock.json']);
    lock.release();
  });

  it('When a living process has it, then it is refused with what to do', () => {
    const { pid } = startOther();
    write({ pid, started: processStart(pid!) });
    expect(() => lockFolder(folder)).toThrow(new RegExp(`process ${pid}.*DATA_DIR`));
  });

  it('When its holder was killed, then it is taken over', async () => {
    const child = startOther();
    write({ pid: child.pid, started: processStart(child.pid!) });
    child.kill('SIGKILL');
    await new Promise((resolve) => child.once('exit', resolve));
    const lock = lockFolder(folder);
    expect(JSON.parse(readFileSync(path(), 'utf8'))).toMatchObject({ pid: process.pid });
    lock.release();
  });

  it('When another process has been given the number of its holder, then it is taken over', () => {
    const { pid } = startOther();
    write({ pid, started: 'ticks 1' });
    lockFolder(folder).release();
  });

  it('When its holder is on another machine, then it is refused as long as that shows signs of life', () => {
    write({ host: 'another-machine' });
    expect(() => lockFolder(folder)).toThrow('another-machine');
    const longAgo = new Date(Date.now() - 10 * 60_000);
    utimesSync(path(), longAgo, longAgo);
    lockFolder(folder).release();
  });

  it('When the file is torn, then it is taken over', () => {
    writeFileSync(path(), '{"pid": 12');
    lockFolder(folder).release();
  });

  it('When somebody else has taken it over meanwhile, then releasing leaves theirs alone', () => {
    const lock = lockFolder(folder);
    write({ token: 'theirs' });
    lock.release();
    expect(JSON.parse(readFileSync(path(), 'utf8'))).toMatchObject({ token: 'theirs' });
  });
});

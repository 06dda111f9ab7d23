import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import type { Download } from '@playwright/test';
import JSZip from 'jszip';

/** The files of a downloaded zip, unpacked into a folder of their own. */
export interface Unpacked {
  readonly folder: string;
  /** Names within the zip, sorted; folders are left out. */
  readonly names: readonly string[];
  readonly read: (name: string) => string;
  readonly path: (name: string) => string;
}

export async function unpack(download: Download): Promise<Unpacked> {
  const zip = await JSZip.loadAsync(readFileSync(await download.path()));
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-set-'));
  const path = (name: string) => join(folder, name);
  const names = Object.keys(zip.files).filter((name) => !zip.files[name]!.dir);
  for (const name of names) {
    mkdirSync(dirname(path(name)), { recursive: true });
    writeFileSync(path(name), await zip.files[name]!.async('nodebuffer'));
  }
  return { folder, names: names.sort(), path, read: (name) => readFileSync(path(name), 'utf8') };
}

/** `sha256sum -c` in the folder of a SHA256SUMS: one line a file, each ending in OK; throws when one differs. */
export function checkSums({ folder, path }: Unpacked, sums: string): string[] {
  const said = execFileSync('sha256sum', ['-c', 'SHA256SUMS'], { cwd: dirname(path(sums)), encoding: 'utf8' });
  if (folder === '') throw new Error('nothing unpacked');
  return said.trim().split('\n');
}

/** The one file whose name ends so; throws when there are none or several. */
export function theOne(names: readonly string[], ending: string): string {
  const found = names.filter((name) => name.endsWith(ending));
  if (found.length !== 1) throw new Error(`${found.length} files end in ${ending}: ${names.join(', ')}`);
  return found[0]!;
}

import { mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { InputError } from './input-error.ts';

/**
 * Writes all files into a folder, made when missing, or none: each under a name of its own first, then all are renamed.
 * Returns the paths. Throws InputError when the folder cannot be written to.
 */
export function saveFiles(
  folder: string,
  files: readonly { readonly name: string; readonly bytes: Uint8Array }[],
): string[] {
  const paths = files.map(({ name }) => join(folder, name));
  const partial = (path: string) => `${path}.${process.pid}.part`;
  const begun: string[] = [];
  try {
    mkdirSync(folder, { recursive: true });
    files.forEach(({ bytes }, i) => {
      begun.push(partial(paths[i]!));
      writeFileSync(partial(paths[i]!), bytes);
    });
    for (const path of paths) renameSync(partial(path), path);
  } catch (error) {
    for (const path of begun) rmSync(path, { force: true });
    throw new InputError(`--out: got "${folder}", takes a folder that can be written to (${(error as Error).message})`);
  }
  return paths;
}

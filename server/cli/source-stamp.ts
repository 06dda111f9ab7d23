import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** What the build is made from, relative to the product's folder. */
const SOURCES = [
  'src',
  'server',
  'shared',
  'public',
  'index.html',
  'vite.config.ts',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
];

function filesUnder(path: string): string[] {
  if (!statSync(path).isDirectory()) return [path];
  const entries = readdirSync(path, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  return entries.flatMap((entry) => filesUnder(join(path, entry.name)));
}

/**
 * SHA-256 over the names and bytes of all that the build is made from. Contents and not times:
 * a fresh clone or a changed branch sets times that say nothing.
 */
export function sourceStamp(root: string): string {
  const hash = createHash('sha256');
  for (const source of SOURCES) {
    const path = join(root, source);
    if (!existsSync(path)) continue;
    for (const file of filesUnder(path)) {
      const bytes = readFileSync(file);
      hash.update(`${file.slice(root.length)}\n${bytes.length}\n`).update(bytes);
    }
  }
  return hash.digest('hex');
}

import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';

export const ROOT = join(import.meta.dirname, '../..');

export interface SourceFile {
  /** From the product's folder, with forward slashes. */
  readonly path: string;
  readonly text: string;
}

/** Not ours, or made anew by a command. */
const PASSED_OVER = new Set([
  'node_modules',
  'dist',
  'data',
  '.git',
  '.cache',
  'coverage',
  'test-results',
  'playwright-report',
]);
const TEXT = /(\.(ts|tsx|js|cjs|mjs|css|html|json|md|sql|svg|yml|yaml)|\.npmrc|\.prettierrc|\.ci\/run)$/;

function pathsUnder(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    if (PASSED_OVER.has(entry.name)) return [];
    const path = join(folder, entry.name);
    return entry.isDirectory() ? pathsUnder(path) : [path];
  });
}

/** Every text file of the product. */
export const sourceFiles = (): SourceFile[] =>
  pathsUnder(ROOT)
    .filter((path) => TEXT.test(path))
    .map((path) => ({ path: relative(ROOT, path), text: readFileSync(path, 'utf8') }));

export const isCode = (path: string): boolean => /\.(ts|tsx|js|cjs)$/.test(path);
export const isProductCode = (path: string): boolean => /^(src|server|shared)\//.test(path) && isCode(path);

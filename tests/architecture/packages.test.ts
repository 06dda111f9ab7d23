import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { ROOT } from './source-files.ts';

const read = (name: string) =>
  JSON.parse(readFileSync(join(ROOT, name), 'utf8')) as Record<string, Record<string, unknown>>;

const isExact = (version: unknown) => typeof version === 'string' && /^\d+\.\d+\.\d+(-[\w.]+)?$/.test(version);

describe('When the packages are listed', () => {
  const manifest = read('package.json');
  const wanted = { ...manifest['dependencies'], ...manifest['devDependencies'] };
  const lock = read('package-lock.json')['packages'] as Record<string, Record<string, unknown>>;

  test('then each version is pinned exactly', () => {
    expect(Object.keys(wanted).length).toBeGreaterThan(20);
    expect(Object.entries(wanted).filter(([, version]) => !isExact(version))).toEqual([]);
  });

  test('then the lockfile holds those very versions, each with its checksum', () => {
    const other = Object.entries(wanted).filter(
      ([name, version]) => lock[`node_modules/${name}`]?.['version'] !== version,
    );
    expect(other).toEqual([]);
    const unchecked = Object.entries(lock).filter(
      ([path, entry]) => path !== '' && !entry['link'] && !entry['integrity'] && !entry['inBundle'],
    );
    expect(unchecked.map(([path]) => path)).toEqual([]);
  });

  test.each(['^1.2.3', '~1.2.3', '1.x', 'latest', '*', '>=1.0.0'])('then %s would not pass for exact', (version) => {
    expect(isExact(version)).toBe(false);
  });
});

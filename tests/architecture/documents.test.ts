import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { CAUTIONS } from '#shared/kernel/sheet/cautions.ts';
import { ROOT } from './source-files.ts';

const read = (name: string) => readFileSync(join(ROOT, name), 'utf8');
const flat = (text: string) => text.replace(/\s+/g, ' ');
const foldersIn = (path: string) =>
  readdirSync(join(ROOT, path), { withFileTypes: true }).flatMap((entry) =>
    entry.isDirectory() ? [`${path}/${entry.name}/`] : [],
  );

describe('When README is read', () => {
  const readme = read('README.md');

  test('then it has the two commands, literally', () => {
    expect(readme).toContain('\n    npm ci && npm start\n');
    expect(readme).toContain('\n    npm ci && npm test\n');
  });

  test('then it has every caution, word for word', () => {
    for (const caution of CAUTIONS) expect(flat(readme)).toContain(caution);
  });

  test('then its pictures and files are there, the pictures under 300 kB', () => {
    const links = [...readme.matchAll(/\]\(([^)#:]+)\)/g)].map((match) => match[1]!);
    expect(links.length).toBeGreaterThan(1);
    expect(links.filter((link) => !existsSync(join(ROOT, link)))).toEqual([]);
    const pictures = links.filter((link) => link.endsWith('.png'));
    expect(pictures.length).toBeGreaterThan(0);
    for (const picture of pictures) expect(statSync(join(ROOT, picture)).size).toBeLessThan(300_000);
  });

  test('then every command that it names is one', () => {
    const scripts = Object.keys((JSON.parse(read('package.json')) as { scripts: Record<string, string> }).scripts);
    for (const document of [readme, read('DEVELOPERS.md')]) {
      const named = [...document.matchAll(/npm run ([\w:]+)/g)].map((match) => match[1]!);
      expect(named.filter((name) => !scripts.includes(name))).toEqual([]);
    }
  });
});

describe('When DEVELOPERS is read', () => {
  const developers = read('DEVELOPERS.md');

  test.each(['src', 'server', 'shared', 'shared/kernel', 'tests'])(
    'then it tells what is in each folder of %s',
    (path) => {
      const folders = foldersIn(path).filter((folder) => readdirSync(join(ROOT, folder)).length > 0);
      expect(folders.length).toBeGreaterThan(1);
      expect(folders.filter((folder) => !developers.includes(`\`${folder}\``))).toEqual([]);
    },
  );

  test('then every folder that it names is there', () => {
    const named = [...developers.matchAll(/^\| `([\w/-]+\/)`/gm)].map((match) => match[1]!);
    expect(named.length).toBeGreaterThan(20);
    expect(named.filter((folder) => !existsSync(join(ROOT, folder)))).toEqual([]);
  });
});

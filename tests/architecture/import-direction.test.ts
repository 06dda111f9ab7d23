import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { cruiseTree, RULES } from './cruise-tree.ts';
import { RULE_BREAKERS } from './rule-breakers.ts';

const root = join(import.meta.dirname, '../..');
const made: string[] = [];

function writeTree(files: Record<string, string>): string {
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-imports-'));
  made.push(folder);
  for (const [name, text] of Object.entries({ 'package.json': '{"type":"module"}', ...files })) {
    mkdirSync(dirname(join(folder, name)), { recursive: true });
    writeFileSync(join(folder, name), text);
  }
  return folder;
}

afterAll(() => made.forEach((folder) => rmSync(folder, { recursive: true })));

describe('When the product is cruised', async () => {
  const { modules, summary } = await cruiseTree(root, ['src', 'server', 'shared'], 'tsconfig.json');
  const imports = modules.flatMap((module) => module.dependencies);

  test.each(['src/', 'server/', 'shared/kernel/', 'shared/contracts/'])('then modules under %s were seen', (folder) => {
    expect(modules.filter((module) => module.source.startsWith(folder)).length).toBeGreaterThan(5);
  });

  test('then imports were followed, those through #shared too', () => {
    expect(summary.totalDependenciesCruised).toBeGreaterThan(100);
    const aliased = imports.filter((dependency) => dependency.module.startsWith('#shared/'));
    expect(aliased.length).toBeGreaterThan(10);
    expect(aliased.filter((dependency) => !dependency.resolved.startsWith('shared/'))).toEqual([]);
  });

  test('then no import goes a forbidden way', () => {
    const broken = summary.violations.map(({ rule, from, to }) => `${rule.name}: ${from} → ${to}`);
    expect(broken).toEqual([]);
  });
});

describe('When a tree breaks a rule, then that rule says so', () => {
  test.each(RULE_BREAKERS)('$rule', async ({ rule, files, folders }) => {
    const { summary } = await cruiseTree(writeTree(files), folders);
    expect(summary.violations.map((violation) => violation.rule.name)).toContain(rule);
  });

  test('and each rule has such a tree', () => {
    const tried = new Set(RULE_BREAKERS.map((breaker) => breaker.rule));
    expect((RULES.forbidden ?? []).map((rule) => rule.name).filter((name) => !tried.has(name ?? ''))).toEqual([]);
  });
});

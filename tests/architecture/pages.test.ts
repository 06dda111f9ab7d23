import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { OPEN_PAGES, SHOP_PAGES } from '../e2e/pages.ts';
import { ROOT } from './source-files.ts';

test('When the router has a page, then it is among those that are held against WCAG and looked at', () => {
  const router = readFileSync(join(ROOT, 'src/app/router.tsx'), 'utf8');
  const paths = [...router.matchAll(/path: '([^']+)'/g)].map((match) => match[1]!);
  expect(paths.length).toBeGreaterThan(5);
  expect([...OPEN_PAGES, ...SHOP_PAGES].sort()).toEqual(paths.sort());
});

import type { Page } from '@playwright/test';
import { demoIds, OPEN_PAGES, pageName, SHOP_PAGES, visit } from './pages.ts';
import { expect, test } from './watched-test.ts';

const SIZES = [
  { name: 'desk', width: 1280, height: 800 },
  { name: 'wide', width: 1920, height: 1080 },
  { name: 'tablet', width: 820, height: 1180 },
] as const;

/** Keeps a picture with the test's results, and expects a page no wider than its window, in its own letters. */
async function look(page: Page, path: string, size: string): Promise<void> {
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: `test-results/looks/${size}-${pageName(path)}.png` });
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(over, `${path} on ${size} is wider than its window`).toBeLessThanOrEqual(0);
  const font = await page.evaluate(() => document.fonts.check('16px "JetBrains Mono"'));
  expect(font, 'JetBrains Mono is loaded').toBe(true);
}

for (const { name: size, width, height } of SIZES) {
  test(`When the pages are seen at ${width} × ${height}, then they fit`, async ({ page }) => {
    test.setTimeout(180_000);
    await page.setViewportSize({ width, height });
    for (const path of OPEN_PAGES) {
      await visit(page, path);
      await look(page, path, size);
    }
    const ids = await demoIds(page);
    for (const path of SHOP_PAGES) {
      await visit(page, path, ids);
      await look(page, path, size);
    }
  });
}

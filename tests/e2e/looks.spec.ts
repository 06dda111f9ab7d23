import type { Page } from '@playwright/test';
import { openDemo } from './steps.ts';
import { expect, test } from './watched-test.ts';

const SIZES = [
  { name: 'desk', width: 1280, height: 800 },
  { name: 'wide', width: 1920, height: 1080 },
  { name: 'tablet', width: 820, height: 1180 },
] as const;

/** Pages that fit the window's width and show no text cut off by it; a picture of each is kept with the test's results. */
async function look(page: Page, name: string, size: string): Promise<void> {
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: `test-results/looks/${size}-${name}.png` });
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(over, `${name} on ${size} is wider than its window`).toBeLessThanOrEqual(0);
  const font = await page.evaluate(() => document.fonts.check('16px "JetBrains Mono"'));
  expect(font, 'JetBrains Mono is loaded').toBe(true);
}

for (const { name: size, width, height } of SIZES) {
  test(`When the pages are seen at ${width} × ${height}, then they fit`, async ({ page }) => {
    await page.setViewportSize({ width, height });
    await page.goto('/sign-up');
    await expect(page.getByRole('button', { name: 'Open the shop' })).toBeVisible();
    await look(page, 'sign-up', size);
    await page.goto('/sign-in');
    await expect(page.getByRole('button', { name: 'Open the demo shop' })).toBeVisible();
    await look(page, 'sign-in', size);
    await openDemo(page);
    await expect(page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first()).toBeVisible();
    await look(page, 'jobs', size);
    for (const path of ['profiles', 'shop']) {
      await page.goto(`/${path}`);
      await page.waitForLoadState('networkidle');
      await look(page, path, size);
    }
    await page.goto('/jobs');
    await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
    await expect(page.locator('table a[href^="/frames/"]').first()).toBeVisible();
    await look(page, 'job', size);
    await page.locator('table a[href^="/frames/"]').first().click();
    await expect(page.getByRole('img', { name: 'Front face' })).toBeVisible();
    await look(page, 'frame', size);
    await page.goto(`${page.url()}/sheet`);
    await page.waitForLoadState('networkidle');
    await look(page, 'sheet', size);
  });
}

import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { openDemo } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** WCAG 2.2 AA and axe's own good practice; findings that are serious or worse fail. */
async function expectAccessible(page: Page): Promise<void> {
  const { violations, passes } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
    .analyze();
  expect(passes.length).toBeGreaterThan(5);
  const bad = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical');
  expect(
    bad.map(
      ({ id, nodes }) =>
        `${id}: ${nodes
          .map((node) => node.html)
          .join(' | ')
          .slice(0, 400)}`,
    ),
  ).toEqual([]);
}

const OPEN_PAGES = ['/sign-in', '/sign-up', '/no-such-page'];
const PAGES = ['/jobs', '/profiles', '/shop'];

for (const path of OPEN_PAGES) {
  test(`When ${path} is held against WCAG, then nothing serious is found`, async ({ page }) => {
    await page.goto(path);
    await expect(page.getByRole('heading').first()).toBeVisible();
    await expectAccessible(page);
  });
}

test('When the pages of a shop are held against WCAG, then nothing serious is found', async ({ page }) => {
  test.setTimeout(180_000);
  await openDemo(page);
  for (const path of PAGES) {
    await page.goto(path);
    await expect(page.getByRole('heading').first()).toBeVisible();
    await page.waitForLoadState('networkidle');
    await test.step(path, () => expectAccessible(page));
  }
  await page.goto('/jobs');
  await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
  await expect(page.locator('table a[href^="/frames/"]').first()).toBeVisible();
  await test.step('job', () => expectAccessible(page));

  await page.locator('table a[href^="/frames/"]').first().click();
  await expect(page.getByRole('img', { name: 'Front face' })).toBeVisible();
  await test.step('frame', () => expectAccessible(page));
  await page.getByRole('button', { name: 'Files' }).click();
  await expect(page.getByRole('dialog')).toBeVisible();
  await test.step('files of a frame', () => expectAccessible(page));
  await page.getByRole('link', { name: 'Setup sheet of the draft' }).click();
  await expect(page).toHaveURL(/\/sheet/);
  await page.waitForLoadState('networkidle');
  await test.step('setup sheet', () => expectAccessible(page));
});

import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { demoIds, OPEN_PAGES, SHOP_PAGES, visit } from './pages.ts';
import { DEMO_VIEWS, EMPTY_VIEWS, openEmptyShop } from './shop-views.ts';
import { expect, test } from './watched-test.ts';

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** WCAG 2.2 AA and axe's own good practice; findings that are serious or worse fail. */
async function expectAccessible(page: Page): Promise<void> {
  const { violations, passes } = await new AxeBuilder({ page }).withTags(RULES).analyze();
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

for (const path of OPEN_PAGES) {
  test(`When ${path} is held against WCAG, then nothing serious is found`, async ({ page }) => {
    await visit(page, path);
    await expectAccessible(page);
  });
}

test('When the pages of a shop are held against WCAG, then nothing serious is found', async ({ page }) => {
  test.setTimeout(240_000);
  const ids = await demoIds(page);
  for (const path of SHOP_PAGES) {
    await test.step(path, async () => {
      await visit(page, path, ids);
      await expectAccessible(page);
    });
  }
});

test('When the dialogs of a frame are held against WCAG, then nothing serious is found', async ({ page }) => {
  test.setTimeout(120_000);
  await visit(page, 'frames/:frameId', await demoIds(page));
  await page.getByRole('button', { name: 'Files' }).click();
  await expect(page.getByRole('dialog')).toBeVisible();
  await expectAccessible(page);
});

test('When the dialogs and views of a shop are held against WCAG, then nothing serious is found', async ({ page }) => {
  test.setTimeout(240_000);
  const ids = await demoIds(page);
  for (const { name, open } of DEMO_VIEWS) {
    await test.step(name, async () => {
      await open(page, ids);
      await expectAccessible(page);
    });
  }
});

test('When the pages of a shop with nothing in it are held against WCAG, then nothing serious is found', async ({
  page,
}) => {
  test.setTimeout(120_000);
  const ids = await openEmptyShop(page);
  for (const { name, open } of EMPTY_VIEWS) {
    await test.step(name, async () => {
      await open(page, ids);
      await expectAccessible(page);
    });
  }
});

test('When a page has a picture without words, then axe says so', async ({ page, complaints }) => {
  complaints.allow(/./);
  await visit(page, 'sign-in');
  await page.evaluate(() => document.querySelector('main')?.append(document.createElement('img')));
  await expect(expectAccessible(page)).rejects.toThrow(/image-alt/);
});

import type { Page } from '@playwright/test';
import { entry, saved } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** What the element with the focus is called; run in the page. */
function nameOfFocus(): string {
  const on = document.activeElement;
  const label = on instanceof HTMLInputElement ? on.labels?.[0]?.textContent : undefined;
  return (on?.getAttribute('aria-label') ?? label ?? on?.textContent ?? '').trim();
}

/** Presses Tab until what has the focus is called so; throws after a whole round without it. */
async function tabTo(page: Page, name: string): Promise<void> {
  for (let i = 0; i < 300; i++) {
    if ((await page.evaluate(nameOfFocus)) === name) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab never reaches ${name}`);
}

test('When there is only a keyboard, then a frame can be entered, released and downloaded', async ({ page }) => {
  await page.goto('/sign-up');
  await tabTo(page, 'Name of the shop');
  await page.keyboard.type('Keys Only Cabinets');
  await page.keyboard.press('Tab');
  await page.keyboard.type('Ada Field');
  await page.keyboard.press('Tab');
  await page.keyboard.type(`keys-${process.pid}@example.com`);
  await page.keyboard.press('Tab');
  await page.keyboard.type('seven dry boards');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/jobs$/);

  await expect(page.getByRole('button', { name: 'New job' }).first()).toBeVisible();
  await tabTo(page, 'New job');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('dialog')).toBeVisible();
  await tabTo(page, 'Name');
  await page.keyboard.type('Keyboard kitchen');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/jobs\/.+/);

  await expect(page.getByRole('button', { name: 'New frame' }).first()).toBeVisible();
  await tabTo(page, 'New frame');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('dialog')).toBeVisible();
  await tabTo(page, 'Name');
  await page.keyboard.type('Keyboard base');
  await page.keyboard.press('Enter');
  await expect(page).toHaveURL(/\/frames\/.+/);

  await expect(entry(page, 'outline.width')).toBeVisible();
  await tabTo(page, 'Width');
  await page.keyboard.press('Control+A');
  await page.keyboard.type('36 1/2');
  await page.keyboard.press('Enter');
  await expect(entry(page, 'outline.height')).toBeFocused();
  await saved(page);
  await expect(entry(page, 'outline.width')).toHaveValue('36 1/2');

  await tabTo(page, 'Release revision A');
  await page.keyboard.press('Enter');
  const dialog = page.getByRole('dialog');
  await expect(dialog).toBeVisible();
  for (const caution of await dialog.getByRole('checkbox').all()) {
    await caution.focus();
    await page.keyboard.press('Space');
  }
  await tabTo(page, 'Release revision A');
  await page.keyboard.press('Enter');
  await expect(dialog.getByText('Revision A is frozen.')).toBeVisible({ timeout: 30_000 });

  await tabTo(page, 'Layer set A');
  const [download] = await Promise.all([page.waitForEvent('download'), page.keyboard.press('Enter')]);
  expect(await download.failure()).toBeNull();
  expect(download.suggestedFilename()).toMatch(/_rev-A\.zip$/);
});

test('When the spread has the focus, then its keys zoom and fit, and the focus can leave again', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Open the demo shop' }).click();
  await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
  await page.locator('table a[href^="/frames/"]').first().click();
  const spread = page.getByRole('group', { name: 'Spread: both faces about the fold' });
  await spread.focus();
  await expect(spread).toBeFocused();
  await page.keyboard.press('Tab');
  await expect(spread).not.toBeFocused();
});

import AxeBuilder from '@axe-core/playwright';
import { demoIds } from './pages.ts';
import { release, saved, type } from './steps.ts';
import { expect, test } from './watched-test.ts';

test('When a frame is changed after its release, then what moved is reached from its files, drawn, told and listed', async ({
  page,
}) => {
  const { frameId } = await demoIds(page);
  await page.goto(`/frames/${frameId}`);
  await page.getByRole('button', { name: 'Files', exact: true }).click();
  const dialog = page.getByRole('dialog');
  // The draft is as it was released: there is nothing to compare.
  await expect(dialog.getByRole('link', { name: 'Setup sheet', exact: true })).toBeVisible();
  await expect(dialog.getByRole('link', { name: /^Compare/ })).toHaveCount(0);
  await dialog.getByRole('button', { name: 'Close' }).click();

  await type(page, 'outline.rails.top', '2 1/4');
  await saved(page);
  await page.getByRole('button', { name: 'Files', exact: true }).click();
  await page.getByRole('link', { name: 'Compare A with the draft' }).click();
  await expect(page).toHaveURL(/\/compare\?from=A&to=draft$/);

  const parts = page.getByRole('list', { name: 'Parts that changed' });
  const rail = parts.getByRole('button', { name: /^Top rail/ });
  // By hand: 1/2 more for the rail, 1/2 less for what is under it.
  await expect(rail).toContainText('width 1 3/4 → 2 1/4 (+1/2)');
  await expect(parts.getByRole('button', { name: /^Opening/ }).first()).toContainText('(−1/2)');
  await rail.focus();
  await page.keyboard.press('Enter');
  await expect(page.locator('[data-lit="rail-top"]').first()).toBeVisible();
  await page.getByRole('slider').focus();
  await page.keyboard.press('End');
  await expect(page.getByText('Fade from revision A to the draft: the draft alone')).toBeVisible();

  for (const view of ['Overlaid', 'Side by side', 'Table']) {
    await page.getByText(view, { exact: true }).click();
    const { violations, passes } = await new AxeBuilder({ page }).analyze();
    expect(passes.length).toBeGreaterThan(5);
    expect(violations.map(({ id }) => id)).toEqual([]);
  }
  const table = page.getByRole('table', { name: 'What differs between revision A and the draft' });
  await expect(table.getByRole('row', { name: 'Top rail width 1 3/4 2 1/4 +1/2' })).toBeVisible();

  await page.getByRole('link', { name: 'To the frame' }).click();
  await release(page, 'B');
  await dialog.getByRole('link', { name: 'Compare A with B' }).click();
  await expect(page).toHaveURL(/\/compare\?from=A&to=B$/);
  await expect(rail).toContainText('width 1 3/4 → 2 1/4 (+1/2)');
  await page.getByLabel('From', { exact: true }).selectOption('B');
  await page.getByLabel('To', { exact: true }).selectOption('A');
  await expect(rail).toContainText('width 2 1/4 → 1 3/4 (−1/2)');

  await page.getByLabel('From', { exact: true }).selectOption('draft');
  await page.getByLabel('To', { exact: true }).selectOption('B');
  await expect(page.getByText('Nothing has changed between the draft and revision B.')).toBeVisible();
});

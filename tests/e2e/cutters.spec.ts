import { newFrame, newJob, signUp } from './steps.ts';
import { expect, test } from './watched-test.ts';

test('When a cutter is half typed and Escape is pressed again and again, then nothing typed is lost without a word', async ({
  page,
}) => {
  await signUp(page);
  await page.getByRole('link', { name: 'Cutters' }).click();
  await page.getByRole('button', { name: 'Put in a cutter' }).click();
  const cutter = page.getByRole('dialog', { name: 'New cutter' });
  const asks = page.getByRole('dialog', { name: 'The new cutter is not saved' });
  await cutter.getByLabel('Name').fill('Half typed');
  // A browser lets a page keep a dialog open once, then closes it at the next Escape whatever the page says.
  for (let i = 0; i < 3; i++) {
    await page.keyboard.press('Escape');
    await expect(asks).toBeVisible();
    await page.keyboard.press('Escape');
    await expect(asks).toHaveCount(0);
    await expect(cutter.getByLabel('Name')).toHaveValue('Half typed');
  }
  await page.keyboard.press('Escape');
  await asks.getByRole('button', { name: 'Leave without saving' }).click();
  await expect(page.getByRole('dialog')).toHaveCount(0);
});

test('When a file changes a cutter that drafts carry, then that is shown first, and the drafts can be updated', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'Reground');
  await newFrame(page, 'Carries it');
  await page.getByRole('link', { name: 'Cutters' }).click();
  // By its place and not by its role: behind a dialog it has none.
  const drawer = page.locator('table', { has: page.locator('caption', { hasText: 'Cutters of the drawer' }) });
  const row = drawer.locator('tr', { hasText: 'Straight 3/8' });
  await expect(row).toContainText('diameter 3/8 in');

  const lines = [
    'name,unit,kind,diameter,flute length',
    'Straight 3/8,in,straight,0.374,1.25',
    'Straight 1/4,in,straight,0.25,1',
    'Straight 3/16,in,straight,0.1875,0.75',
  ];
  await page
    .getByLabel('CSV file of cutters')
    .setInputFiles({ name: 'ours.csv', mimeType: 'text/csv', buffer: Buffer.from(lines.join('\r\n')) });
  const dialog = page.getByRole('dialog', { name: 'Cutters of ours.csv' });
  await expect(dialog).toContainText('1 new, 1 changed, 1 in the drawer as it is.');
  await expect(dialog.getByRole('row', { name: /Straight 3\/8/ })).toContainText('diameter: 0.374, was 0.375');
  await expect(row).toContainText('diameter 3/8 in');
  await dialog.getByRole('button', { name: 'Take 2 rows' }).click();

  await expect(page.getByText('1 cutter put in and 1 changed from ours.csv.')).toBeVisible();
  await expect(row).toContainText('diameter 0.374 in');
  await expect(drawer.locator('tr', { hasText: 'Straight 3/16' })).toBeVisible();
  await page.getByRole('button', { name: 'Update 1 draft' }).click();
  await expect(page.getByRole('listitem').filter({ hasText: 'Carries it' })).toContainText('updated');
});

import { readFile } from 'node:fs/promises';
import AxeBuilder from '@axe-core/playwright';
import { parseFrameTable } from '#shared/contracts/parse-frame-table.ts';
import { downloadBy, entry, newJob, signUp } from './steps.ts';
import { expect, test } from './watched-test.ts';

const SAMPLES = `${import.meta.dirname}/../../samples`;

test('When a kitchen comes as a table, then its frames are in the job, and the job comes out as that table', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'Kitchen from a table');
  await page.getByRole('link', { name: 'From a table', exact: true }).click();
  const file = page.getByLabel('CSV file of frames');

  // First the one with mistakes: looked at, and left.
  await file.setInputFiles(`${SAMPLES}/kitchen-with-mistakes.csv`);
  await expect(page.getByRole('row', { name: /^3 height "30,5" a length such as/ })).toBeVisible();
  await expect(page.getByRole('button', { name: 'Add the 2 good ones' })).toBeVisible();
  const { violations, passes } = await new AxeBuilder({ page }).analyze();
  expect(passes.length).toBeGreaterThan(5);
  expect(violations.map(({ id }) => id)).toEqual([]);
  await page.getByRole('button', { name: 'Take nothing' }).click();
  await expect(page.getByRole('button', { name: 'Choose a file' })).toBeFocused();

  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), page.keyboard.press('Enter')]);
  await chooser.setFiles(`${SAMPLES}/kitchen.csv`);
  const table = page.getByRole('table', { name: 'Frames of the table' });
  await expect(table.locator('tbody tr')).toHaveCount(8);
  await expect(table.locator('svg')).toHaveCount(8);
  await page.getByRole('button', { name: 'Add all 8 frames' }).click();

  await expect(page).toHaveURL(/\/jobs\/[^/]+$/);
  const names = page.locator('tbody th[scope=row]');
  const wanted = parseFrameTable(await readFile(`${SAMPLES}/kitchen.csv`, 'utf8')).rows;
  await expect(names).toHaveText(wanted.map(({ name }) => name));

  await page.getByRole('link', { name: 'Frames from a table' }).click();
  const download = await downloadBy(page, () =>
    page.getByRole('button', { name: 'Download this job’s frames as a table' }).click(),
  );
  expect(download.suggestedFilename()).toBe('Kitchen-from-a-table_frames.csv');
  const again = parseFrameTable(await readFile(await download.path(), 'utf8'));
  expect(again.rows.map(({ particulars }) => particulars)).toEqual(wanted.map(({ particulars }) => particulars));

  await page.goBack();
  await page.getByRole('link', { name: 'V36 vanity on feet' }).click();
  await expect(entry(page, 'outline.feet')).toHaveValue('4');
  await expect(entry(page, 'outline.width')).toHaveValue('36');
});

import { entry, newFrame, newJob, saved, signIn, signUp, type } from './steps.ts';
import { expect, test } from './watched-test.ts';

test('When two people change one draft, then the second is told what changed and loses nothing', async ({
  page,
  browser,
  baseURL,
  complaints,
}) => {
  // The refused save is what this is about; browsers report each answer of 409 on the console.
  complaints.allow(/status of 409/);
  const person = await signUp(page);
  await newJob(page, 'Two at once');
  await newFrame(page, 'Base');
  await saved(page);

  const context = await browser.newContext({ baseURL });
  const other = await context.newPage();
  await complaints.watch(other);
  await signIn(other, person);
  await other.goto(page.url());
  await expect(entry(other, 'outline.width')).toBeVisible();

  await type(page, 'outline.width', '44');
  await saved(page);
  await type(other, 'outline.height', '29');

  const dialog = other.getByRole('dialog');
  await expect(dialog.getByText('Somebody else saved this frame meanwhile')).toBeVisible({ timeout: 20_000 });
  await expect(dialog.getByRole('cell', { name: '44' })).toBeVisible();
  await expect(dialog.getByRole('cell', { name: '29' })).toBeVisible();
  await dialog.getByRole('button', { name: 'Keep mine where theirs changed nothing' }).click();
  await saved(other);
  await expect(entry(other, 'outline.width')).toHaveValue('44');
  await expect(entry(other, 'outline.height')).toHaveValue('29');

  await page.reload();
  await expect(entry(page, 'outline.width')).toHaveValue('44');
  await expect(entry(page, 'outline.height')).toHaveValue('29');
  await context.close();
});

import { entry, newFrame, newJob, saved, signUp, type } from './steps.ts';
import { expect, test } from './watched-test.ts';

test.beforeEach(async ({ page }) => {
  await signUp(page);
  await newJob(page, 'Entries');
  await newFrame(page, 'Base');
});

test('When an entry cannot be read, then the text stays, it says what it takes, and the frame is not released', async ({
  page,
}) => {
  const before = await entry(page, 'outline.height').inputValue();
  await type(page, 'outline.width', '30,5');
  await entry(page, 'outline.height').focus();
  await expect(entry(page, 'outline.width')).toHaveValue('30,5');
  await expect(entry(page, 'outline.width')).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByText('Got “30,5”; takes a length such as')).toBeVisible();
  await page.getByRole('button', { name: 'Release revision A' }).click();
  await expect(page.getByRole('dialog').getByText('1 entry of the form could not be taken.')).toBeVisible();
  await expect(page.getByRole('dialog').getByRole('button', { name: 'Release revision A' })).toBeDisabled();
  await page.keyboard.press('Escape');
  await expect(entry(page, 'outline.height')).toHaveValue(before);
});

test('When a frame has a stop, then the draft is saved but cannot be released', async ({ page }) => {
  await type(page, 'outline.width', '2');
  await saved(page);
  await expect(page.getByText(/[1-9]\d* stops?/).first()).toBeVisible();
  await page.getByRole('button', { name: 'Release revision A' }).click();
  await expect(page.getByRole('dialog').getByRole('button', { name: 'Release revision A' })).toBeDisabled();
  await page.keyboard.press('Escape');
  await page.reload();
  await expect(entry(page, 'outline.width')).toHaveValue('2');
});

test('When steps are undone and redone, then the whole frame goes back and forth', async ({ page }) => {
  const start = await entry(page, 'outline.width').inputValue();
  await type(page, 'outline.width', '38');
  await entry(page, 'outline.height').focus();
  await type(page, 'outline.height', '28 1/4');
  await entry(page, 'thickness').focus();

  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(entry(page, 'outline.width')).toHaveValue('38');
  await expect(entry(page, 'outline.height')).not.toHaveValue('28 1/4');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(entry(page, 'outline.width')).toHaveValue(start);
  await page.getByRole('button', { name: 'Redo' }).click();
  await page.getByRole('button', { name: 'Redo' }).click();
  await expect(entry(page, 'outline.width')).toHaveValue('38');
  await expect(entry(page, 'outline.height')).toHaveValue('28 1/4');
  await saved(page);
});

test('When an entry is left with Enter, then the next one has the focus', async ({ page }) => {
  await entry(page, 'outline.width').focus();
  await page.keyboard.press('Enter');
  await expect(entry(page, 'outline.height')).toBeFocused();
});

test('When a digit is typed, then both faces are drawn anew', async ({ page }) => {
  const back = page.getByRole('img', { name: 'Back face' });
  const front = page.getByRole('img', { name: 'Front face' });
  const [was, wasFront] = [await back.innerHTML(), await front.innerHTML()];
  await type(page, 'outline.width', '41');
  await expect.poll(() => back.innerHTML()).not.toBe(was);
  await expect.poll(() => front.innerHTML()).not.toBe(wasFront);
});

test('When the page is loaded again, then the draft is as it was left', async ({ page }) => {
  await type(page, 'outline.width', '37 5/8');
  await saved(page);
  await page.reload();
  await expect(entry(page, 'outline.width')).toHaveValue('37 5/8');
});

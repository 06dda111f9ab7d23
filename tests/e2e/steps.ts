import type { Download, Locator, Page } from '@playwright/test';
import { expect } from './watched-test.ts';

/** Steps that people take, each ending when the page shows that it is done. */

let count = 0;

/** An e-mail address that no other test has; example.com is set aside for this (RFC 2606). */
const newAddress = () => `designer-${process.pid}-${++count}@example.com`;

export interface Person {
  readonly email: string;
  readonly password: string;
}

/** Opens a shop of one's own and ends on the page of its jobs. */
export async function signUp(page: Page, shopName = 'Marsh Lane Cabinets'): Promise<Person> {
  const person = { email: newAddress(), password: 'seven dry boards' };
  await page.goto('/sign-up');
  await page.getByLabel('Name of the shop').fill(shopName);
  await page.getByLabel('Your name').fill('Ida Brook');
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Open the shop' }).click();
  await expect(page).toHaveURL(/\/jobs$/);
  return person;
}

export async function signIn(page: Page, { email, password }: Person): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).toHaveURL(/\/jobs$/);
}

export async function openDemo(page: Page): Promise<void> {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Open the demo shop' }).click();
  await expect(page).toHaveURL(/\/jobs$/);
}

export async function newJob(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: 'New job' }).first().click();
  await page.getByRole('dialog').getByLabel('Name').fill(name);
  await page.getByRole('button', { name: 'Create the job' }).click();
  await expect(page).toHaveURL(/\/jobs\/.+/);
}

export async function newFrame(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: 'New frame' }).first().click();
  await page.getByRole('dialog').getByLabel('Name').fill(name);
  await page.getByRole('button', { name: 'Create the frame' }).click();
  await expect(page).toHaveURL(/\/frames\/.+/);
  await expect(entry(page, 'outline.width')).toBeVisible();
}

/** The input of one entry of the particulars, by its path in the frame file. */
export const entry = (page: Page, path: string): Locator => page.locator(`input[data-entry="${path}"]`);

export async function type(page: Page, path: string, text: string): Promise<void> {
  await entry(page, path).fill(text);
}

/** Waits until the draft is saved; it says so in the title block. */
export const saved = (page: Page): Promise<void> =>
  expect(page.locator('[data-saving]')).toHaveAttribute('data-saving', 'saved');

/** Looks at each caution, releases, and ends on the dialog with the files. */
export async function release(page: Page, letter: string): Promise<void> {
  await page.getByRole('button', { name: `Release revision ${letter}` }).click();
  const dialog = page.getByRole('dialog');
  for (const caution of await dialog.getByRole('checkbox').all()) await caution.check();
  await dialog.getByRole('button', { name: `Release revision ${letter}` }).click();
  await expect(dialog.getByText(`Revision ${letter} is frozen.`)).toBeVisible({ timeout: 30_000 });
}

/** Starts a download by pressing something, and waits for the whole file. */
export async function downloadBy(page: Page, press: () => Promise<unknown>): Promise<Download> {
  const [download] = await Promise.all([page.waitForEvent('download', { timeout: 60_000 }), press()]);
  expect(await download.failure()).toBeNull();
  return download;
}

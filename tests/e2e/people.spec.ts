import type { Page } from '@playwright/test';
import { signIn, signUp } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** Opens the newest mail of the outbox and reads the link in it. */
async function newestLink(page: Page, subject: string): Promise<string> {
  await page.getByRole('link', { name: 'Outbox', exact: true }).click();
  await page.getByRole('button', { name: subject }).first().click();
  const link = page.getByRole('dialog', { name: subject }).getByRole('link');
  const address = (await link.getAttribute('href'))!;
  await page.keyboard.press('Escape');
  return address;
}

test('When a colleague is invited, joins, changes roles, loses access and forgets the password, then each takes hold at once', async ({
  page,
  browser,
  baseURL,
  complaints,
}) => {
  // Refused calls of somebody without access, and a dead link, on purpose.
  complaints.allow(/status of 40[14]/);
  await signUp(page, 'Oak Lane Joinery');
  await page.getByRole('link', { name: 'People' }).click();
  await expect(page.getByText('Nobody is invited')).toBeVisible();
  await page.getByRole('button', { name: 'Invite somebody', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: 'Invite somebody' });
  const email = `newcomer-${process.pid}@example.com`;
  await dialog.getByLabel('E-mail').fill(email);
  await dialog.getByLabel('Role').selectOption('designer');
  await dialog.getByRole('button', { name: 'Send the invitation' }).press('Enter');
  await expect(page.getByRole('table', { name: 'Open invitations' })).toContainText(email);
  const link = await newestLink(page, 'Join Oak Lane Joinery on Stilepost');

  const theirs = await browser.newContext({ baseURL });
  const newcomer = await theirs.newPage();
  await complaints.watch(newcomer);
  await newcomer.goto(link);
  await expect(newcomer.getByText('Into Oak Lane Joinery, as designer')).toBeVisible();
  await newcomer.getByLabel('Your name').fill('Wren Ashby');
  await newcomer.getByLabel('Password').fill('nine dry boards');
  await newcomer.getByRole('button', { name: 'Join the shop' }).click();
  await expect(newcomer).toHaveURL(/\/jobs$/);
  await expect(newcomer.getByRole('button', { name: 'New job' }).first()).toBeVisible();
  await expect(newcomer.getByRole('link', { name: 'People' })).toHaveCount(0);

  await page.getByRole('link', { name: 'People' }).click();
  const row = page.getByRole('row', { name: /Wren Ashby/ });
  await expect(row).toContainText('designer');
  await page.getByRole('button', { name: 'Change the role of Wren Ashby' }).click();
  await page.getByRole('dialog').getByLabel('Role').selectOption('operator');
  await page.getByRole('button', { name: 'Change the role', exact: true }).click();
  await expect(row).toContainText('operator');
  await newcomer.reload();
  await expect(newcomer.getByText('Wren Ashby, operator')).toBeVisible();
  await expect(newcomer.getByRole('button', { name: 'New job' })).toHaveCount(0);

  await page.getByRole('button', { name: 'Take away the access of Wren Ashby' }).click();
  await page.getByRole('button', { name: 'Take away access', exact: true }).click();
  await expect(row).toContainText('no access');
  await newcomer.reload();
  await expect(newcomer).toHaveURL(/\/sign-in/);
  await newcomer.getByLabel('E-mail').fill(email);
  await newcomer.getByLabel('Password').fill('nine dry boards');
  await newcomer.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(newcomer.getByRole('alert')).toContainText('No account with this e-mail address and password');

  await page.getByRole('button', { name: 'Give access back to Wren Ashby' }).click();
  await expect(page.getByText('Wren Ashby can sign in again.')).toBeVisible();
  await newcomer.getByRole('link', { name: 'Forgot the password' }).click();
  // Sign-in has an e-mail entry too: what is typed before the page has changed would be typed there.
  await expect(newcomer.getByRole('button', { name: 'Mail me a link' })).toBeVisible();
  await newcomer.getByLabel('E-mail').fill(email);
  await newcomer.getByRole('button', { name: 'Mail me a link' }).click();
  await expect(newcomer.getByText(`If ${email} has an account`)).toBeVisible();
  const reset = await newestLink(page, 'Set a new password for Stilepost');
  await newcomer.goto(reset);
  await newcomer.getByLabel('New password').fill('ten wet boards');
  await newcomer.getByRole('button', { name: 'Set the password' }).click();
  await expect(newcomer.getByText('The new password holds')).toBeVisible();
  await signIn(newcomer, { email, password: 'ten wet boards' });

  await newcomer.goto(link);
  await expect(newcomer.getByText('This link opens nothing')).toBeVisible();
  await theirs.close();
});

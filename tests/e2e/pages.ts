import type { Page } from '@playwright/test';
import { frameDrawing } from '../builders/drawings.ts';
import { expect } from './watched-test.ts';
import { openDemo } from './steps.ts';

/** Every page by its path in src/app/router.tsx; tests/architecture/pages.test.ts sees to it that none is left out. */
export const OPEN_PAGES = ['sign-in', 'sign-up', 'join/:token', 'forgot-password', 'reset-password/:token', '*'];
export const SHOP_PAGES = [
  'jobs',
  'jobs/:jobId',
  'jobs/:jobId/box',
  'jobs/:jobId/table',
  'jobs/:jobId/drawings',
  'drawings/:tracingId',
  'frames/:frameId',
  'frames/:frameId/sheet',
  'frames/:frameId/compare',
  'cutters',
  'profiles',
  'outbox',
  'shop',
  'people',
];

/** Ids of the demo's job and of its first frame. */
export interface DemoIds {
  readonly jobId: string;
  readonly frameId: string;
}

/** Opens the demo shop and finds the ids by following its links. */
export async function demoIds(page: Page): Promise<DemoIds> {
  await openDemo(page);
  await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
  await expect(page).toHaveURL(/\/jobs\/[^/]+$/);
  const jobId = new URL(page.url()).pathname.split('/')[2]!;
  const link = page.locator('table a[href^="/frames/"]').first();
  const frameId = (await link.getAttribute('href'))!.split('/')[2]!;
  return { jobId, frameId };
}

/** Id of a drawing of the job, uploaded when there is none yet: the demo has none. */
async function drawingOf(page: Page, jobId: string): Promise<string> {
  const address = new URL(`/api/jobs/${jobId}/tracings`, page.url()).href;
  const list = (await (await page.request.get(address)).json()) as { tracings: { id: string }[] };
  const [newest] = list.tracings;
  if (newest) return newest.id;
  const file = { name: 'base.dxf', mimeType: 'application/dxf', buffer: Buffer.from(frameDrawing()) };
  const added = await page.request.post(address, { multipart: { file } });
  expect(added.status()).toBe(201);
  return ((await added.json()) as { id: string }).id;
}

/** Token of an invitation into the demo shop, out of its outbox; the page's own visitor stays who they are. */
async function invitationToken(page: Page): Promise<string> {
  const owner = await page.context().browser()!.newContext({ baseURL: process.env['PRODUCT_URL'] });
  const { request } = owner;
  await request.post('/api/demo-sign-in', { data: { role: 'owner' } });
  // The same address each time: a new invitation takes the place of the last.
  const invited = await request.post('/api/invitations', { data: { email: 'visitor@example.com', role: 'designer' } });
  expect(invited.status()).toBe(201);
  const { mails } = (await (await request.get('/api/outbox')).json()) as { mails: { id: string }[] };
  const { text } = (await (await request.get(`/api/outbox/${mails[0]!.id}`)).json()) as { text: string };
  await owner.close();
  return /\/join\/(\S+)/.exec(text)![1]!;
}

/** Goes to a page and waits until it has what it shows. */
export async function visit(page: Page, path: string, ids: DemoIds = { jobId: '', frameId: '' }): Promise<void> {
  const tracingId = path.includes(':tracingId') ? await drawingOf(page, ids.jobId) : '';
  const address = path
    .replace('*', 'no-such-page')
    .replace(':jobId', ids.jobId)
    .replace(':frameId', ids.frameId)
    .replace(':tracingId', tracingId)
    .replace(':token', path.startsWith('join/') ? await invitationToken(page) : 'a-token');
  await page.goto(`/${address}`);
  await expect(page.getByRole('heading').first()).toBeVisible();
  await page.waitForLoadState('networkidle');
}

/** A file name for a page. */
export const pageName = (path: string): string => path.replace('*', 'not-found').replace(/[/: ]+/g, '-');

import type { Page } from '@playwright/test';
import { visit, type DemoIds } from './pages.ts';
import { newJob, signUp } from './steps.ts';
import { expect } from './watched-test.ts';

/** What a page of a shop can show beside its first sight: a dialog, a view, an empty list. */
interface ShopView {
  readonly name: string;
  /** Ends when all of it is there. The page is left as it was found, but for a dialog or view that is open. */
  readonly open: (page: Page, ids: DemoIds) => Promise<void>;
}

const dialogOf = (page: Page) => expect(page.getByRole('dialog')).toBeVisible();

async function openJob(page: Page, ids: DemoIds): Promise<void> {
  await visit(page, 'jobs/:jobId', ids);
  await expect(page.getByRole('table', { name: 'Frames of the job' })).toBeVisible();
}

/** A beaded, arched frame has the most to show. */
async function openArched(page: Page, ids: DemoIds): Promise<void> {
  await openJob(page, ids);
  await page.getByRole('link', { name: 'K46 arched bookcase', exact: true }).click();
  await expect(page.getByLabel('Width', { exact: true }).first()).toBeVisible();
}

/** Opens the panel of the first opening, or of the member to its right, by keyboard. */
async function openOnDrawing(page: Page, ids: DemoIds, keys: readonly string[], name: RegExp): Promise<void> {
  await openArched(page, ids);
  await page.getByRole('group', { name: 'Spread: both faces about the fold' }).focus();
  for (const key of keys) await page.keyboard.press(key);
  await expect(page.getByRole('group', { name })).toBeVisible();
}

/** For a person of the demo shop. */
export const DEMO_VIEWS: readonly ShopView[] = [
  {
    name: 'a cutter of the drawer',
    open: async (page) => {
      await visit(page, 'cutters');
      await page
        .getByRole('button', { name: /^Change / })
        .first()
        .click();
      await dialogOf(page);
    },
  },
  {
    name: 'a cutter half typed and about to be left',
    open: async (page) => {
      await visit(page, 'cutters');
      await page.getByRole('button', { name: 'Put in a cutter' }).click();
      await page.getByRole('dialog').getByLabel('Name').fill('Half typed');
      await page.keyboard.press('Escape');
      await expect(page.getByRole('dialog', { name: 'The new cutter is not saved' })).toBeVisible();
    },
  },
  {
    name: 'a file of cutters against the drawer',
    open: async (page) => {
      await visit(page, 'cutters');
      const rows = [
        'name,unit,kind,diameter,flute length',
        'Straight 3/8,in,straight,0.374,1.25',
        'Wrong,in,straight,,1',
      ];
      await page
        .getByLabel('CSV file of cutters')
        .setInputFiles({ name: 'ours.csv', mimeType: 'text/csv', buffer: Buffer.from(rows.join('\n')) });
      await expect(page.getByRole('dialog', { name: 'Cutters of ours.csv' })).toBeVisible();
    },
  },
  {
    name: 'a new frame with its starters',
    open: async (page, ids) => {
      await openJob(page, ids);
      await page.getByRole('button', { name: 'New frame' }).first().click();
      await page.getByRole('dialog').getByLabel('Begin from').selectOption({ label: 'Corner pair' });
      await expect(page.getByRole('button', { name: 'Create 2 frames' })).toBeVisible();
    },
  },
  {
    name: 'the box parts of a frame',
    open: async (page, ids) => {
      await openJob(page, ids);
      await page
        .getByRole('button', { name: /^Box parts of/ })
        .first()
        .click();
      await expect(page.getByRole('dialog').getByRole('table', { name: 'Box parts' })).toBeVisible();
    },
  },
  {
    name: 'a member changed in many frames',
    open: async (page, ids) => {
      await openJob(page, ids);
      await page.getByRole('button', { name: 'Choose all' }).click();
      await page.getByRole('button', { name: 'Change a member' }).click();
      await expect(page.getByRole('dialog').getByRole('rowheader').first()).toBeVisible();
    },
  },
  {
    name: 'an opening edited on the drawing',
    open: (page, ids) => openOnDrawing(page, ids, ['o', 'Enter'], /^Opening .*, on the drawing$/),
  },
  {
    name: 'a member edited on the drawing',
    open: (page, ids) => openOnDrawing(page, ids, ['o', 'ArrowRight', 'Enter'], /^Mid-stile.*, on the drawing$/),
  },
  {
    name: 'the section across the edge',
    open: async (page, ids) => {
      await openArched(page, ids);
      await page.getByRole('button', { name: 'Section', exact: true }).click();
      await expect(page.getByRole('img', { name: /^Section across/ }).first()).toBeVisible();
    },
  },
  {
    name: 'the corners',
    open: async (page, ids) => {
      await openArched(page, ids);
      await page.getByRole('button', { name: 'Corners', exact: true }).click();
      await expect(page.getByRole('img', { name: /^What is left in an inside corner/ })).toHaveCount(3);
    },
  },
  {
    name: 'the cut part',
    open: async (page, ids) => {
      await openArched(page, ids);
      await page.getByRole('button', { name: 'Cut part', exact: true }).click();
      await expect(page.getByRole('application', { name: 'Cut part' })).toBeVisible();
      await expect(page.getByRole('application')).toHaveAccessibleDescription(/Seen from the front/);
    },
  },
  {
    name: 'somebody about to be invited',
    open: async (page) => {
      await visit(page, 'people');
      await page.getByRole('button', { name: 'Invite somebody', exact: true }).click();
      await page.getByRole('dialog').getByLabel('E-mail').fill('nobody');
      await page.getByRole('button', { name: 'Send the invitation' }).click();
      await expect(page.getByText(/takes an e-mail address/)).toBeVisible();
    },
  },
];

/** Opens a shop of one's own with nothing in its drawer and one job without frames. */
export async function openEmptyShop(page: Page): Promise<DemoIds> {
  // Whoever is signed in is led past the page that opens a shop.
  await page.context().clearCookies();
  await signUp(page);
  await newJob(page, 'Fen Road');
  const jobId = new URL(page.url()).pathname.split('/')[2]!;
  await visit(page, 'cutters');
  const all = page.getByRole('button', { name: /^Delete / });
  await expect(all.first()).toBeVisible();
  for (let left = await all.count(); left > 0; left--) {
    await all.first().click();
    await expect(all).toHaveCount(left - 1);
  }
  return { jobId, frameId: '' };
}

/** For the owner of such a shop. */
export const EMPTY_VIEWS: readonly ShopView[] = [
  {
    name: 'a shop with nobody invited',
    open: async (page) => {
      await visit(page, 'people');
      await expect(page.getByText('Nobody is invited')).toBeVisible();
    },
  },
  {
    name: 'an empty drawer',
    open: async (page) => {
      await visit(page, 'cutters');
      await expect(page.getByText('The drawer is empty')).toBeVisible();
    },
  },
  {
    name: 'an empty job',
    open: async (page, ids) => {
      await visit(page, 'jobs/:jobId', ids);
      await expect(page.getByText('No frames yet')).toBeVisible();
    },
  },
  {
    name: 'a box that follows what is typed',
    open: async (page, ids) => {
      await visit(page, 'jobs/:jobId/box', ids);
      await page.getByLabel('Width, outside').fill('36');
      await page.getByLabel('How many').selectOption('2');
      await expect(page.getByText('36 1/2 × 30 1/2 in').first()).toBeVisible();
    },
  },
  {
    name: 'a box whose entries are cleared',
    open: async (page, ids) => {
      await visit(page, 'jobs/:jobId/box', ids);
      await page.getByLabel('Width, outside').fill('');
      await page.getByRole('button', { name: 'Create the frame' }).click();
      await expect(page.getByText('An entry of the box is wrong.').first()).toBeVisible();
    },
  },
];

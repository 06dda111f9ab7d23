import { statSync } from 'node:fs';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import { buildWhenChanged } from '../../server/cli/build-product.ts';
import { CHROMIUM, CHROMIUM_FLAGS } from '../setup/readers.ts';
import { runServer } from '../setup/run-server.ts';

/** `npm run picture`: the frame page of the demo's first frame, as README.md shows it. */

const root = join(import.meta.dirname, '../..');
const picture = join(root, 'samples/frame-page.png');
const LARGEST_BYTES = 300_000;

await buildWhenChanged(root, console.log);
const server = await runServer();
const browser = await chromium.launch({ executablePath: CHROMIUM, args: CHROMIUM_FLAGS });
try {
  const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  await page.goto(`${server.url}/sign-in`);
  await page.getByRole('button', { name: 'Open the demo shop' }).click();
  await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
  await page
    .getByRole('link', { name: /two-door base/i })
    .first()
    .click();
  await page.getByRole('img', { name: 'Front face' }).waitFor();
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: picture });
} finally {
  await browser.close();
  await server.stop();
}
const { size } = statSync(picture);
if (size >= LARGEST_BYTES) throw new Error(`the picture has ${size} bytes, takes fewer than ${LARGEST_BYTES}`);
console.log(`samples/frame-page.png, ${Math.round(size / 1000)} kB`);

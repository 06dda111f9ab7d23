import { join } from 'node:path';
import { chromium, type Page } from '@playwright/test';
import { buildWhenChanged } from '../../server/cli/build-product.ts';
import { CHROMIUM, CHROMIUM_FLAGS } from '../setup/readers.ts';
import { runServer } from '../setup/run-server.ts';
import { median, type BenchRow } from './bench-row.ts';

/** One frame of an animation at 60 Hz; the page's whole work for one digit must fit into it on a processor slowed so much. */
const FRAME_MS = 1000 / 60;
const SLOWED = 4;
const BATCHES = 8;
const DIGITS = 12;

/**
 * Milliseconds of work for one digit typed into the entry with the focus: from the keystroke until its handlers are done, and
 * from the start of the next frame until it is painted. The wait between both is the screen's and not ours.
 */
async function timeDigit(page: Page, digit: string): Promise<number> {
  await page.keyboard.press('Backspace');
  const work = page.evaluate(
    () =>
      new Promise<number>((done) => {
        window.addEventListener(
          'beforeinput',
          () => {
            const typed = performance.now();
            requestAnimationFrame(() => {
              const frame = performance.now();
              const painted = new MessageChannel();
              painted.port1.onmessage = () => done(handled - typed + performance.now() - frame);
              painted.port2.postMessage('');
            });
            let handled = typed;
            // Runs when all handlers of the keystroke have run, React's drawing included.
            window.addEventListener('input', () => queueMicrotask(() => (handled = performance.now())), { once: true });
          },
          { once: true, capture: true },
        );
      }),
  );
  await page.keyboard.press(digit);
  return work;
}

/** A digit typed on the frame page until both faces are painted, against one frame at 60 Hz, the processor slowed four times. */
export async function run(): Promise<BenchRow[]> {
  await buildWhenChanged(join(import.meta.dirname, '../..'), () => {});
  const server = await runServer();
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: CHROMIUM_FLAGS });
  try {
    const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
    await page.goto(`${server.url}/sign-in`);
    await page.getByRole('button', { name: 'Open the demo shop' }).click();
    await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
    await page
      .getByRole('link', { name: /two-door base/i })
      .first()
      .click();
    const width = page.locator('input[data-entry="outline.width"]');
    await width.fill('33');
    const session = await page.context().newCDPSession(page);
    await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWED });
    const medians: number[] = [];
    for (let batch = 0; batch < BATCHES; batch++) {
      const times: number[] = [];
      for (let digit = 0; digit < DIGITS; digit++) times.push(await timeDigit(page, String(2 + (digit % 7))));
      medians.push(median(times));
    }
    const ratio = Math.min(...medians) / FRAME_MS;
    return [
      {
        name: `a typed digit repaints both faces, processor slowed ${SLOWED} times`,
        against: 'one frame at 60 Hz',
        ratio,
        limit: 1,
        ok: ratio <= 1,
      },
    ];
  } finally {
    await browser.close();
    await server.stop();
  }
}

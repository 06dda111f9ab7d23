import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type Browser, type Page } from '@playwright/test';
import type { LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { buildWhenChanged } from '../../server/cli/build-product.ts';
import { dado, workedExample } from '../builders/worked-example.ts';
import { CHROMIUM, CHROMIUM_FLAGS } from '../setup/readers.ts';
import { runServer } from '../setup/run-server.ts';
import type { BenchRow } from './bench-row.ts';
import { PAINT_CATEGORIES, paintTimes } from './paint-time.ts';

const FRAME_MS = 1000 / 60;
const SLOWED = 4;
const WARM_UPS = 8;
const KEYSTROKES = 30;
/** Between keystrokes, longer than everything that a keystroke sets off but the save. */
const PAUSE_MS = 200;

const opening = (label: string): LayoutPart => ({ opening: { label } });
const twelveOpenings = (): Particulars =>
  workedExample({
    name: 'Twelve openings',
    outline: {
      kind: 'members',
      width: 72,
      height: 40,
      stiles: { left: 1.75, right: 1.75 },
      rails: { top: 1.75, bottom: 1.25 },
      feet: 0,
      layout: {
        columns: ['A', 'B', 'C', 'D'].map((c) => ({
          rows: [1, 2, 3].map((row) => opening(`${c}${row}`)),
          between: 1.5,
        })),
        between: 1.5,
      },
    },
    dados: [
      dado({ to: 40 }),
      dado({ part: 'Right end', at: 71, to: 40 }),
      dado({ part: 'Bottom', runs: 'horizontal', at: 0.5, from: 1, to: 71, ends: ['meets', 'meets'] }),
    ],
  });

/** Puts a frame into a new job, as the page itself would; answers the address of its page. */
async function makeFrame(page: Page, particulars: Particulars): Promise<string> {
  const post = async (path: string, data: unknown): Promise<string> => {
    const response = await page.request.post(path, { data, headers: { origin: new URL(page.url()).origin } });
    if (!response.ok()) throw new Error(`${path}: ${response.status()} ${await response.text()}`);
    return ((await response.json()) as { id: string }).id;
  };
  const job = await post('/api/jobs', { name: 'Bench' });
  return `/frames/${await post(`/api/jobs/${job}/frames`, { particulars })}`;
}

/** One entry and one line that follows it: what the browser alone takes. When this is over a frame, the machine is busy with something else. */
const BARE_PAGE = `<input data-entry="outline.width" value="33"><svg data-face="front"><path d="M0 0H1"/></svg>
  <script>document.querySelector('input').oninput = (e) => document.querySelector('path').setAttribute('d', 'M0 0H1' + e.target.value)</script>`;

/** Median main thread time in milliseconds, on a CPU slowed four times, from a digit going down to what follows it being painted. */
async function timeOfDigit(browser: Browser, page: Page): Promise<number> {
  const folder = mkdtempSync(join(tmpdir(), 'stilepost-trace-'));
  const trace = join(folder, 'trace.json');
  try {
    const width = page.locator('input[data-entry="outline.width"]');
    await width.focus();
    await page.keyboard.press('End');
    await page.keyboard.type('.');
    const cdp = await page.context().newCDPSession(page);
    await cdp.send('Emulation.setCPUThrottlingRate', { rate: SLOWED });
    const stroke = async (i: number) => {
      await page.keyboard.press(i % 2 === 0 ? String(1 + (i % 9)) : 'Backspace');
      await page.waitForTimeout(PAUSE_MS);
    };
    for (let i = 0; i < WARM_UPS; i++) await stroke(i);
    const drawn = () =>
      page.locator('svg[data-face] path').evaluateAll((paths) => paths.map((path) => path.getAttribute('d')).join());
    const before = await drawn();
    await browser.startTracing(page, { path: trace, categories: PAINT_CATEGORIES });
    for (let i = 0; i < KEYSTROKES; i++) await stroke(i);
    await browser.stopTracing();
    await page.keyboard.press('7');
    if ((await drawn()) === before) throw new Error('a digit changed nothing that is drawn');
    await cdp.detach();
    const times = paintTimes(trace);
    if (times.length !== KEYSTROKES) throw new Error(`traced ${times.length} of ${KEYSTROKES} keystrokes`);
    return times.sort((a, b) => a - b)[Math.floor(times.length / 2)]!;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Rows for a running product with its demo shop. */
export async function measureTyping(baseUrl: string): Promise<BenchRow[]> {
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: CHROMIUM_FLAGS });
  try {
    const page = await browser.newPage({ baseURL: baseUrl, viewport: { width: 1280, height: 800 } });
    await page.goto('/sign-in');
    await page.getByRole('button', { name: 'Open the demo shop' }).click();
    await page.waitForURL(/\/jobs$/);
    const rows: BenchRow[] = [];
    const measure = async (what: string) => {
      const ratio = (await timeOfDigit(browser, page)) / FRAME_MS;
      const against = `one frame at 60 Hz, CPU slowed ${SLOWED} times`;
      rows.push({ name: `typed digit to ${what}`, against, ratio, limit: 1, ok: ratio <= 1 });
    };
    for (const [what, particulars] of [
      ['both faces, worked example', workedExample()],
      ['both faces, 12 openings', twelveOpenings()],
    ] as const) {
      await page.goto(await makeFrame(page, particulars));
      await measure(what);
    }
    // The product's own pages allow no script of ours.
    await page.goto('about:blank');
    await page.setContent(BARE_PAGE);
    await measure('one line on a bare page');
    return rows;
  } finally {
    await browser.close();
  }
}

/** A typed digit repaints both faces within one frame on a CPU slowed four times. */
export async function run(): Promise<BenchRow[]> {
  await buildWhenChanged(join(import.meta.dirname, '../..'), console.log);
  const server = await runServer();
  try {
    return await measureTyping(server.url);
  } finally {
    await server.stop();
  }
}

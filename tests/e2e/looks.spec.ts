import type { Page } from '@playwright/test';
import { demoIds, OPEN_PAGES, pageName, SHOP_PAGES, visit } from './pages.ts';
import { DEMO_VIEWS, EMPTY_VIEWS, openEmptyShop } from './shop-views.ts';
import { expect, test } from './watched-test.ts';

const SIZES = [
  { name: 'desk', width: 1280, height: 800 },
  { name: 'wide', width: 1920, height: 1080 },
  { name: 'tablet', width: 820, height: 1180 },
] as const;

/**
 * What of a page cannot be seen whole: controls and pictures that stand out past what shows them, and controls that lie
 * under another one. Run in the page. What scrolls by itself may hold more than it shows.
 */
function findCut(): string[] {
  const found: string[] = [];
  const nameOf = (element: Element) =>
    `${element.tagName.toLowerCase()} ${(element.getAttribute('aria-label') ?? element.textContent ?? '').trim().slice(0, 40)}`;
  const dialogs = document.querySelectorAll('dialog[open]');
  const top = dialogs[dialogs.length - 1] ?? document;
  for (const element of top.querySelectorAll('button, select, input, label, a, th, canvas, svg[role=img]')) {
    if (element.closest('.sr-only') || !element.checkVisibility()) continue;
    const box = element.getBoundingClientRect();
    // Hidden radio buttons and checkboxes lie in a box of one pixel.
    if (box.width <= 1 || box.height <= 1) continue;
    let [high, low] = [0, window.innerHeight];
    let scrollsAside = false;
    // A dialog lies over the page and is cut by nothing that holds it.
    const outermost = element.closest('dialog');
    for (
      let holder = element.parentElement;
      holder !== null;
      holder = holder === outermost ? null : holder.parentElement
    ) {
      const { overflowX, overflowY } = getComputedStyle(holder);
      const room = holder.getBoundingClientRect();
      const isOut = box.left < room.left - 1 || box.right > room.right + 1;
      if (overflowY !== 'visible') [high, low] = [Math.max(high, room.top), Math.min(low, room.bottom)];
      if (!isOut || overflowX === 'visible' || scrollsAside) continue;
      // What a person can scroll to, by keyboard too, is not cut; and what holds the scroller holds no more than it.
      scrollsAside = overflowX === 'auto' || overflowX === 'scroll';
      if (!scrollsAside) found.push(`${nameOf(element)} is cut`);
      else if (holder.tabIndex < 0) found.push(`${nameOf(element)} goes past what scrolls`);
    }
    if (scrollsAside || !element.matches('button, select, input')) continue;
    const y = (box.top + box.bottom) / 2;
    // Scrolled out of sight: another thing is rightly there.
    if (y < high || y > low) continue;
    for (const x of [box.left + 3, (box.left + box.right) / 2, box.right - 3]) {
      const over = document.elementFromPoint(x, y)?.closest('button, select, input, a');
      if (over && over !== element && !over.contains(element))
        found.push(`${nameOf(element)} lies under ${nameOf(over)}`);
    }
  }
  return [...new Set(found)];
}

/** Keeps a picture with the test's results, and expects a page no wider than its window, in its own letters, with nothing cut. */
async function look(page: Page, path: string, size: string): Promise<void> {
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: `test-results/looks/${size}-${pageName(path)}.png` });
  const over = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
  expect(over, `${path} on ${size} is wider than its window`).toBeLessThanOrEqual(0);
  expect(await page.evaluate(findCut), `${path} on ${size} is seen whole`).toEqual([]);
  const font = await page.evaluate(() => document.fonts.check('16px "JetBrains Mono"'));
  expect(font, 'JetBrains Mono is loaded').toBe(true);
}

for (const { name: size, width, height } of SIZES) {
  test(`When the pages are seen at ${width} × ${height}, then they fit`, async ({ page }) => {
    test.setTimeout(180_000);
    await page.setViewportSize({ width, height });
    for (const path of OPEN_PAGES) {
      await visit(page, path);
      await look(page, path, size);
    }
    const ids = await demoIds(page);
    for (const path of SHOP_PAGES) {
      await visit(page, path, ids);
      await look(page, path, size);
    }
  });

  test(`When dialogs and views are seen at ${width} × ${height}, then they fit`, async ({ page }) => {
    test.setTimeout(240_000);
    await page.setViewportSize({ width, height });
    const demo = await demoIds(page);
    for (const { name, open } of DEMO_VIEWS) {
      await open(page, demo);
      await look(page, name, size);
    }
    const empty = await openEmptyShop(page);
    for (const { name, open } of EMPTY_VIEWS) {
      await open(page, empty);
      await look(page, name, size);
    }
  });
}

test('When a control lies under another one, or stands out of what shows it, then it is found', async ({ page }) => {
  await visit(page, 'sign-in');
  expect(await page.evaluate(findCut)).toEqual([]);
  await page.evaluate(() => {
    const put = (tag: string, text: string, style: Partial<CSSStyleDeclaration>, into: Element): HTMLElement => {
      const element = into.appendChild(document.createElement(tag));
      element.textContent = text;
      Object.assign(element.style, style);
      return element;
    };
    const main = document.querySelector('main')!;
    const line = put('div', '', { position: 'relative', height: '40px' }, main);
    put('button', 'Lower', { position: 'absolute', left: '0', width: '80px', height: '30px' }, line);
    put('button', 'Upper', { position: 'absolute', left: '20px', width: '80px', height: '30px' }, line);
    const narrow = put('div', '', { overflow: 'hidden', width: '50px' }, main);
    put('button', 'Wide', { width: '90px' }, narrow);
    const scroller = put('div', '', { overflow: 'auto', width: '50px' }, main);
    put('button', 'Aside', { width: '90px' }, scroller);
  });
  const found = await page.evaluate(findCut);
  expect(found).toEqual([
    'button Lower lies under button Upper',
    'button Wide is cut',
    'button Aside goes past what scrolls',
  ]);
});

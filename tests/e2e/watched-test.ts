import { test as base, expect, type Page } from '@playwright/test';

/** What a page complained of: console errors, uncaught errors, and what the content security policy kept out. */
interface Complaints {
  /** Complaints that this test brings about on purpose. */
  allow: (pattern: RegExp) => void;
  /** Watches another page than the test's own. */
  watch: (page: Page) => Promise<void>;
}

/** Playwright's test, with the product's address, and failing when a page complains of anything. */
export const test = base.extend<{ complaints: Complaints }>({
  baseURL: async ({}, use) => {
    const url = process.env['PRODUCT_URL'];
    if (url === undefined) throw new Error('no server: tests/setup/serve-product.ts sets PRODUCT_URL');
    await use(url);
  },
  complaints: [
    async ({ page }, use) => {
      const found: string[] = [];
      const allowed: RegExp[] = [];
      const watch = async (watched: Page) => {
        watched.on('console', (message) => {
          if (message.type() === 'error') found.push(`console: ${message.text()}`);
        });
        watched.on('pageerror', (error) => found.push(`uncaught: ${error.message}`));
        await watched.addInitScript(() => {
          document.addEventListener('securitypolicyviolation', (event) =>
            console.error(`content security policy: ${event.violatedDirective} kept out ${event.blockedURI}`),
          );
        });
      };
      await watch(page);
      await use({ allow: (pattern) => void allowed.push(pattern), watch });
      expect(found.filter((text) => !allowed.some((pattern) => pattern.test(text)))).toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };

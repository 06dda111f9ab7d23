import { defineConfig } from '@playwright/test';
import { CHROMIUM, CHROMIUM_FLAGS } from './tests/setup/readers.ts';

// One worker: the tests share one server on an embedded database, and two cores are soon busy with a browser.
export default defineConfig({
  testDir: 'tests/e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results/e2e',
  globalSetup: './tests/setup/serve-product.ts',
  workers: 1,
  retries: 0,
  forbidOnly: true,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  reporter: 'list',
  use: {
    viewport: { width: 1280, height: 800 },
    acceptDownloads: true,
    screenshot: 'only-on-failure',
    // WebGL without a graphics card, for the cut part.
    launchOptions: { executablePath: CHROMIUM, args: [...CHROMIUM_FLAGS, '--enable-unsafe-swiftshader'] },
  },
});

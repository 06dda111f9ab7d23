import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import {
  countPlaywright,
  countVitest,
  heedExitCode,
  type Counts,
  type PlaywrightReport,
  type VitestReport,
} from './setup/count-results.ts';

/** `npm test`: runs vitest, then Playwright, and ends with one line that adds up what both counted. */

const root = join(import.meta.dirname, '..');
const reports = join(root, 'test-results/reports');
const require = createRequire(import.meta.url);
const programOf = (name: string, file: string) => join(dirname(require.resolve(`${name}/package.json`)), file);

function run<Report>(program: string, args: string[], reportFile: string, count: (report: Report) => Counts): Counts {
  // NODE_ENV from outside would choose React's production build, which the component tests cannot drive.
  const {
    status,
    signal,
    error: notStarted,
  } = spawnSync(process.execPath, [program, ...args], {
    cwd: root,
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, NODE_ENV: 'test', PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile },
  });
  if (notStarted) console.error(`${program} could not be run: ${notStarted.message}`);
  if (signal) console.error(`${program} was ended from outside with ${signal}`);
  let report: Report;
  try {
    report = JSON.parse(readFileSync(reportFile, 'utf8')) as Report;
  } catch (error) {
    console.error(`No report from ${program}: ${(error as Error).message}`);
    return { passed: 0, failed: 1 };
  }
  return heedExitCode(count(report), status);
}

rmSync(reports, { recursive: true, force: true });
mkdirSync(reports, { recursive: true });

const vitestReport = join(reports, 'vitest.json');
const vitest = run<VitestReport>(
  programOf('vitest', 'vitest.mjs'),
  ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${vitestReport}`],
  vitestReport,
  countVitest,
);
const playwright = run<PlaywrightReport>(
  programOf('@playwright/test', 'cli.js'),
  ['test', '--reporter=list,json'],
  join(reports, 'playwright.json'),
  countPlaywright,
);

const failed = vitest.failed + playwright.failed;
process.exitCode = failed === 0 ? 0 : 1;
console.log(`${vitest.passed + playwright.passed} passed, ${failed} failed`);

import { describe, expect, test } from 'vitest';
import { countPlaywright, countVitest, heedExitCode } from '../setup/count-results.ts';

const file = (status: string, ...results: string[]) => ({
  status,
  assertionResults: results.map((r) => ({ status: r })),
});

describe('When vitest’s report is counted', () => {
  test('then passes and failures of all files are added up', () => {
    const report = { testResults: [file('passed', 'passed', 'passed'), file('failed', 'passed', 'failed')] };
    expect(countVitest(report)).toEqual({ passed: 3, failed: 1 });
  });

  test('then a file that could not be loaded is a failure', () => {
    expect(countVitest({ testResults: [file('failed')] })).toEqual({ passed: 0, failed: 1 });
  });

  test('then a test that did not run is a failure', () => {
    expect(countVitest({ testResults: [file('passed', 'passed', 'pending', 'todo')] })).toEqual({
      passed: 1,
      failed: 2,
    });
  });
});

describe('When Playwright’s report is counted', () => {
  test('then flaky and skipped tests and errors outside tests are failures', () => {
    const report = { stats: { expected: 5, unexpected: 1, flaky: 1, skipped: 1 }, errors: [{}] };
    expect(countPlaywright(report)).toEqual({ passed: 5, failed: 4 });
  });
});

describe('When a runner ends', () => {
  test('badly without a failed test, then that is a failure', () => {
    expect(heedExitCode({ passed: 5, failed: 0 }, 1)).toEqual({ passed: 5, failed: 1 });
    expect(heedExitCode({ passed: 5, failed: 0 }, null)).toEqual({ passed: 5, failed: 1 });
  });

  test('without having run anything, then that is a failure', () => {
    expect(heedExitCode({ passed: 0, failed: 0 }, 0)).toEqual({ passed: 0, failed: 1 });
  });

  test('well, or with failures of its own, then its counts stand', () => {
    expect(heedExitCode({ passed: 5, failed: 0 }, 0)).toEqual({ passed: 5, failed: 0 });
    expect(heedExitCode({ passed: 5, failed: 2 }, 1)).toEqual({ passed: 5, failed: 2 });
  });
});

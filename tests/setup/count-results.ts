/** How many tests a runner ran, by how they ended. */
export interface Counts {
  readonly passed: number;
  readonly failed: number;
}

/** The part of vitest's JSON report that is counted. */
export interface VitestReport {
  readonly testResults: readonly {
    readonly status: string;
    readonly assertionResults: readonly { readonly status: string }[];
  }[];
}

/** The part of Playwright's JSON report that is counted. */
export interface PlaywrightReport {
  readonly stats: {
    readonly expected: number;
    readonly unexpected: number;
    readonly flaky: number;
    readonly skipped: number;
  };
  readonly errors: readonly unknown[];
}

const sum = (numbers: readonly number[]) => numbers.reduce((total, n) => total + n, 0);

/** A file that could not be loaded counts as one failure; so does each test that did not run to a pass (skipped, to do). */
export function countVitest(report: VitestReport): Counts {
  const files = report.testResults;
  const passedIn = (file: VitestReport['testResults'][number]) =>
    file.assertionResults.filter((result) => result.status === 'passed').length;
  const notLoaded = files.filter(
    (file) => file.status === 'failed' && file.assertionResults.every((r) => r.status === 'passed'),
  );
  return {
    passed: sum(files.map(passedIn)),
    failed: sum(files.map((file) => file.assertionResults.length - passedIn(file))) + notLoaded.length,
  };
}

/** A test that passed only on a second try is a failure, as is one that was skipped and an error outside any test. */
export function countPlaywright(report: PlaywrightReport): Counts {
  const { expected, unexpected, flaky, skipped } = report.stats;
  return { passed: expected, failed: unexpected + flaky + skipped + report.errors.length };
}

/** A runner that ended badly failed, whatever its report says; so did one that ran nothing. */
export function heedExitCode(counts: Counts, exitCode: number | null): Counts {
  const silent = counts.failed === 0 && (exitCode !== 0 || counts.passed === 0);
  return silent ? { ...counts, failed: 1 } : counts;
}

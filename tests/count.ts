/** What a step of the test run came to. */
export interface Count {
  readonly passed: number;
  readonly failed: number;
}

export interface TestCount extends Count {
  /** What went wrong beside tests that failed, each counted as one failure. */
  readonly troubles: readonly string[];
}

/**
 * Counts a vitest run from its JSON report. A run without a report, without a single test, with files that could not
 * be run, with tests left out, or that ended badly for no reason shown, has failed too.
 *
 * @param report the text of the report, '' when there is none
 */
export function countOf(report: string, exitCode: number): TestCount {
  const read = reportOf(report);
  if (read === null) return { passed: 0, failed: 1, troubles: ['The tests ended without a report.'] };
  const { passed, failed, leftOut, brokenFiles } = read;
  const troubles = brokenFiles.map((file) => `This file could not be run: ${file}`);
  if (leftOut > 0) troubles.push(`${leftOut} tests were left out; none may be.`);
  if (passed + failed === 0) troubles.push('No test was run.');
  if (exitCode !== 0 && failed === 0 && troubles.length === 0)
    troubles.push(`The tests ended with exit code ${exitCode}, although none failed.`);
  return { passed, failed: failed + troubles.length, troubles };
}

interface RunReport {
  readonly passed: number;
  readonly failed: number;
  readonly leftOut: number;
  readonly brokenFiles: readonly string[];
}

function reportOf(text: string): RunReport | null {
  let report: unknown;
  try {
    report = JSON.parse(text);
  } catch {
    return null;
  }
  const { numPassedTests, numFailedTests, numPendingTests, numTodoTests, testResults } = partsOf(report);
  if (typeof numPassedTests !== 'number' || typeof numFailedTests !== 'number') return null;
  return {
    passed: numPassedTests,
    failed: numFailedTests,
    leftOut: numberOf(numPendingTests) + numberOf(numTodoTests),
    brokenFiles: (Array.isArray(testResults) ? testResults : []).flatMap(brokenFile),
  };
}

/** A file that failed without a test of its own that did: it could not be loaded, or its set-up broke. */
function brokenFile(result: unknown): readonly string[] {
  const { name, status, assertionResults } = partsOf(result);
  const anyFailed =
    Array.isArray(assertionResults) && assertionResults.some((one) => partsOf(one).status === 'failed');
  return status === 'failed' && !anyFailed ? [String(name)] : [];
}

function partsOf(value: unknown): Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null ? { ...value } : {};
}

function numberOf(value: unknown): number {
  return typeof value === 'number' ? value : 0;
}

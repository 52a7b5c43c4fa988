import { describe, expect, it } from 'vitest';
import { countOf } from '../../count.ts';

/** As vitest writes it with its JSON reporter. */
const report = (change: object = {}): string =>
  JSON.stringify({
    numPassedTests: 3,
    numFailedTests: 0,
    numPendingTests: 0,
    numTodoTests: 0,
    testResults: [{ name: 'a.test.ts', status: 'passed', assertionResults: [{ status: 'passed' }] }],
    ...change,
  });

describe('the count of a test run', () => {
  it('is that of its tests when all is well', () => {
    expect(countOf(report(), 0)).toEqual({ passed: 3, failed: 0, troubles: [] });
  });

  it('has the tests that failed', () => {
    const failed = [{ name: 'a.test.ts', status: 'failed', assertionResults: [{ status: 'failed' }] }];
    expect(countOf(report({ numFailedTests: 2, testResults: failed }), 1)).toMatchObject({
      passed: 3,
      failed: 2,
    });
  });

  it.each([
    ['there is no report', '', 0],
    ['the report is broken off', '{"numPassedTests": 3', 0],
    ['no test was run', report({ numPassedTests: 0 }), 0],
    ['a test was left out', report({ numPendingTests: 1 }), 0],
    ['a test is still to be written', report({ numTodoTests: 1 }), 0],
    [
      'a file could not be loaded',
      report({ testResults: [{ name: 'b', status: 'failed', assertionResults: [] }] }),
      1,
    ],
    ['the run ended badly, as for an error outside any test', report(), 1],
  ])('has a failure when %s', (_what, text, code) => {
    const { failed, troubles } = countOf(text, code);
    expect(failed).toBe(1);
    expect(troubles).toHaveLength(1);
  });
});

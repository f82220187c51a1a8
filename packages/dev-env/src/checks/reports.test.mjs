import { describe, expect, it } from 'vitest';
import { countPlaywright, countVitest } from './reports.mjs';

const vitest = (facts) => ({
  numPassedTests: 3,
  numFailedTests: 0,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults: [],
  ...facts,
});

describe('counts of a report', () => {
  it('takes what passed and failed', () => {
    const testResults = [{ status: 'failed', assertionResults: [{ status: 'failed' }] }];
    expect(countVitest(vitest({ numFailedTests: 1, testResults }))).toEqual({
      passed: 3,
      failed: 1,
      skipped: 0,
    });
  });

  it('counts a file that could not run, which has no failed test', () => {
    const testResults = [
      { status: 'failed', assertionResults: [] },
      { status: 'passed', assertionResults: [{ status: 'passed' }] },
    ];
    expect(countVitest(vitest({ testResults }))).toMatchObject({ passed: 3, failed: 1 });
  });

  it('counts a skipped or planned test as failed', () => {
    expect(countVitest(vitest({ numPendingTests: 2, numTodoTests: 1 }))).toMatchObject({
      failed: 3,
      skipped: 3,
    });
  });

  it('counts flaky and skipped journeys and errors outside tests as failed', () => {
    const stats = { expected: 5, unexpected: 1, flaky: 1, skipped: 1 };
    expect(countPlaywright({ stats, errors: [{ message: 'no tests found' }] })).toEqual({
      passed: 5,
      failed: 4,
      skipped: 1,
    });
  });
});

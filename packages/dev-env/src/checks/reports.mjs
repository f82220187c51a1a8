/** Counts of Vitest's JSON report; a file that could not run counts as a failure. */
export function countVitest(report) {
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every((test) => test.status !== 'failed'),
  ).length;
  return { passed: report.numPassedTests, failed: report.numFailedTests + brokenFiles };
}

/** Counts of Playwright's JSON report; a flaky test counts as failed. */
export function countPlaywright(report) {
  const { expected, unexpected, flaky } = report.stats;
  return { passed: expected, failed: unexpected + flaky + report.errors.length };
}

/**
 * Counts of Vitest's JSON report. A file that could not run counts as a failure; so does a skipped test, for it proves nothing.
 * @returns { passed, failed, skipped } where `failed` holds the skipped ones
 */
export function countVitest(report) {
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.every((test) => test.status !== 'failed'),
  ).length;
  const skipped = report.numPendingTests + report.numTodoTests;
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + brokenFiles + skipped,
    skipped,
  };
}

/** The same of Playwright's JSON report; a flaky test counts as failed. */
export function countPlaywright(report) {
  const { expected, unexpected, flaky, skipped } = report.stats;
  return { passed: expected, failed: unexpected + flaky + skipped + report.errors.length, skipped };
}

import { readFileSync, rmSync } from 'node:fs';
import { run } from '../processes/run.mjs';

/**
 * Runs a test program that writes a JSON report and counts that report. A program that ends with a failure although its
 * report has none, or that ran nothing, counts as one failure. @throws where it wrote no report
 */
export async function runReported({ command, args, options, report, count }) {
  rmSync(report, { force: true });
  const { code } = await run(command, args, options);
  const counts = count(JSON.parse(readFileSync(report, 'utf8')));
  if (counts.skipped > 0) console.log(`${counts.skipped} skipped: a skipped test counts as failed.`);
  const hidden = counts.failed === 0 && (code !== 0 || counts.passed === 0);
  if (hidden) console.log(`The program ended with ${code} and reports ${counts.passed} passed, 0 failed.`);
  return { passed: counts.passed, failed: hidden ? 1 : counts.failed };
}

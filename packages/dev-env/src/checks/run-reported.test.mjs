import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { runReported } from './run-reported.mjs';

const folder = mkdtempSync(join(tmpdir(), 'tipward-report-'));
const report = join(folder, 'report.json');
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function reportedBy(counts, code) {
  const script = `require('fs').writeFileSync(${JSON.stringify(report)}, '${JSON.stringify(counts)}'); process.exit(${code})`;
  const count = (read) => read;
  return runReported({ command: process.execPath, args: ['-e', script], options: {}, report, count });
}

describe('a test program with a report', () => {
  it('counts as its report says', async () => {
    expect(await reportedBy({ passed: 4, failed: 0, skipped: 0 }, 0)).toEqual({ passed: 4, failed: 0 });
    expect(await reportedBy({ passed: 4, failed: 2, skipped: 0 }, 1)).toEqual({ passed: 4, failed: 2 });
  });

  it('fails where it ended badly although nothing in the report failed', async () => {
    expect(await reportedBy({ passed: 4, failed: 0, skipped: 0 }, 1)).toEqual({ passed: 4, failed: 1 });
  });

  it('fails where it ran nothing', async () => {
    expect(await reportedBy({ passed: 0, failed: 0, skipped: 0 }, 0)).toEqual({ passed: 0, failed: 1 });
  });

  it('does not take the report of an earlier run for its own', async () => {
    writeFileSync(report, '{"passed":9,"failed":0,"skipped":0}');
    const silent = {
      command: process.execPath,
      args: ['-e', ''],
      options: {},
      report,
      count: (read) => read,
    };
    await expect(runReported(silent)).rejects.toMatchObject({ code: 'ENOENT' });
  });
});

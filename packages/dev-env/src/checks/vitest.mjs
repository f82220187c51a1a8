import { join } from 'node:path';
import { ROOT, bin } from '../setup/paths.mjs';
import { countVitest } from './reports.mjs';
import { runReported } from './run-reported.mjs';

/** Unit, reference and API tests of every package and app; the latter on a throw-away PostgreSQL. */
export function runVitest(cluster, folder) {
  const report = join(folder, 'vitest.json');
  return runReported({
    command: bin('vitest'),
    args: ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
    options: { cwd: ROOT, env: { ...process.env, TIPWARD_TEST_ADMIN_URL: cluster.url('postgres') } },
    report,
    count: countVitest,
  });
}

import { join } from 'node:path';
import { ensureDatabase } from '../postgres/database.mjs';
import { freePorts } from '../processes/ports.mjs';
import { createServices } from '../processes/services.mjs';
import { waitHealthy } from '../processes/wait-healthy.mjs';
import { ensureChromium } from '../setup/debian.mjs';
import { makeDemo } from '../setup/demo.mjs';
import { serverEnvironment } from '../setup/environment.mjs';
import { ROOT } from '../setup/paths.mjs';
import { BUILT } from '../setup/programs.mjs';
import { countPlaywright } from './reports.mjs';
import { runReported } from './run-reported.mjs';

const SECRETS = { ownerPassword: 'owner-of-a-throw-away', appPassword: 'app-of-a-throw-away' };
const SESSION_SECRET = 'secret-of-a-throw-away-server-0001';

/** Journeys in Chromium against the built product on a seeded database of its own. */
export async function runBrowserTests(cluster, folder) {
  await ensureChromium();
  const database = await ensureDatabase(cluster.bin, cluster, 'tipward_e2e', SECRETS);
  const [port, mailPort] = await freePorts(2);
  const environment = serverEnvironment({ port, mailPort, database, secret: SESSION_SECRET, mode: 'demo' });
  await makeDemo(BUILT, environment, database);
  const services = createServices();
  services.start('The server', BUILT.server, environment);
  services.start('The worker', BUILT.worker, environment);
  const url = environment.TIPWARD_PUBLIC_URL;
  try {
    await Promise.race([waitHealthy(url), services.untilOneEnds()]);
    return await Promise.race([runPlaywright(url, folder), services.untilOneEnds()]);
  } finally {
    await services.stopAll();
  }
}

function runPlaywright(url, folder) {
  const report = join(folder, 'playwright.json');
  const env = { ...process.env, TIPWARD_E2E_URL: url, PLAYWRIGHT_JSON_OUTPUT_FILE: report };
  return runReported({
    command: join(ROOT, 'apps/e2e/node_modules/.bin/playwright'),
    args: ['test'],
    // Playwright closes its browser on SIGINT.
    options: { cwd: join(ROOT, 'apps/e2e'), env, stopSignal: 'SIGINT' },
    report,
    count: countPlaywright,
  });
}

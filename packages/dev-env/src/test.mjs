import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runChecks } from './checks/run-checks.mjs';
import { LINTERS, TYPECHECKS } from './checks/steps.mjs';
import { countPlaywright, countVitest } from './checks/reports.mjs';
import { ensureBinaries } from './postgres/binaries.mjs';
import { dataPlace, startCluster } from './postgres/cluster.mjs';
import { ensureDatabase } from './postgres/database.mjs';
import { createChildren } from './processes/children.mjs';
import { freePort } from './processes/ports.mjs';
import { mustRun, run } from './processes/run.mjs';
import { waitHealthy } from './processes/wait-healthy.mjs';
import { buildAll } from './setup/build.mjs';
import { ensureChromium } from './setup/debian.mjs';
import { ownerEnvironment, serverEnvironment } from './setup/environment.mjs';
import { runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { checkNode } from './setup/node-version.mjs';
import { ROOT } from './setup/paths.mjs';

const total = { passed: 0, failed: 0 };

function add(counts) {
  total.passed += counts.passed;
  total.failed += counts.failed;
}

/** A step that must not stop the steps after it: a failure is printed and counted as one. */
async function step(name, work) {
  const start = Date.now();
  console.log(`\n── ${name}`);
  try {
    add(await work());
  } catch (error) {
    console.error(error);
    add({ passed: 0, failed: 1 });
  }
  console.log(`── ${name}: ${((Date.now() - start) / 1000).toFixed(0)} s`);
}

/** Runs a test program that writes a JSON report; a program that failed without a counted failure counts as one. */
async function reported(command, args, options, report, count) {
  rmSync(report, { force: true });
  const { code } = await run(command, args, options);
  const counts = count(JSON.parse(readFileSync(report, 'utf8')));
  if (code !== 0 && counts.failed === 0) counts.failed = 1;
  if (counts.passed + counts.failed === 0) counts.failed = 1;
  return counts;
}

async function browserTests(bin, cluster, folder) {
  const secrets = { ownerPassword: 'owner-of-a-throw-away', appPassword: 'app-of-a-throw-away' };
  const database = await ensureDatabase(bin, cluster, 'tipward_e2e', secrets);
  const [port, mailPort] = [await freePort(), await freePort()];
  const environment = serverEnvironment({
    port,
    mailPort,
    database,
    secret: 'secret-of-a-throw-away-server-0001',
    mode: 'demo',
  });
  const owner = ownerEnvironment(environment, database);
  await mustRun(process.execPath, [join(ROOT, 'apps/api/dist/commands/migrate.js')], { env: owner });
  await mustRun(process.execPath, [join(ROOT, 'seeds/dist/seed-demo.js')], { env: owner });
  const children = createChildren(async () => {});
  try {
    children.start(
      'The server',
      process.execPath,
      [join(ROOT, 'apps/api/dist/server.js')],
      environment,
      ROOT,
    );
    children.start(
      'The worker',
      process.execPath,
      [join(ROOT, 'apps/api/dist/worker.js')],
      environment,
      ROOT,
    );
    await waitHealthy(environment.TIPWARD_PUBLIC_URL);
    const report = join(folder, 'playwright.json');
    const env = {
      ...process.env,
      TIPWARD_E2E_URL: environment.TIPWARD_PUBLIC_URL,
      PLAYWRIGHT_JSON_OUTPUT_NAME: report,
    };
    return await reported(
      join(ROOT, 'apps/e2e/node_modules/.bin/playwright'),
      ['test'],
      { cwd: join(ROOT, 'apps/e2e'), env },
      report,
      countPlaywright,
    );
  } finally {
    await children.endAll();
  }
}

async function main() {
  checkNode();
  await installPackages();
  await ensureChromium();
  const bin = await ensureBinaries();
  const folder = mkdtempSync(join(tmpdir(), 'tipward-test-'));
  const cluster = await startCluster(bin, {
    dataDir: dataPlace(join(folder, 'postgres')),
    secretFile: join(folder, 'postgres.json'),
  });
  const clean = async () => {
    await cluster.stop();
    rmSync(folder, { recursive: true, force: true });
  };
  for (const signal of ['SIGINT', 'SIGTERM'])
    process.once(signal, () => void clean().finally(() => process.exit(1)));
  try {
    await step('source', () => runChecks(LINTERS));
    await step('types', () => runChecks(TYPECHECKS));
    const report = join(folder, 'vitest.json');
    const env = { ...process.env, TIPWARD_TEST_ADMIN_URL: cluster.url('postgres') };
    const args = ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
    await step('unit, reference and API tests', () =>
      reported(join(ROOT, 'node_modules/.bin/vitest'), args, { cwd: ROOT, env }, report, countVitest),
    );
    await step('build', async () => {
      await buildAll();
      return { passed: 1, failed: 0 };
    });
    await step('browser tests', () => browserTests(bin, cluster, folder));
  } finally {
    await clean();
  }
  if (total.failed > 0) process.exitCode = 1;
  console.log(`\n${total.passed} passed, ${total.failed} failed`);
}

await runMain(main);

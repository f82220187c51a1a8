import { runBrowserTests } from './checks/browser-tests.mjs';
import { runChecks } from './checks/run-checks.mjs';
import { LINTERS, TYPECHECKS } from './checks/steps.mjs';
import { createTally } from './checks/tally.mjs';
import { runVitest } from './checks/vitest.mjs';
import { startThrowAwayCluster, throwAwayFolder } from './postgres/throw-away.mjs';
import { runMain } from './processes/run-main.mjs';
import { shutDown } from './processes/shutdown.mjs';
import { buildAll } from './setup/build.mjs';
import { SetupError } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';

const { total, step } = createTally();

async function runSteps() {
  const folder = throwAwayFolder();
  await step('source', () => runChecks(LINTERS));
  await step('types', () => runChecks(TYPECHECKS));
  let cluster;
  await step('unit, reference and API tests', async () => {
    cluster = await startThrowAwayCluster(folder);
    return runVitest(cluster, folder);
  });
  const built = await step('build', async () => {
    await buildAll();
    return { passed: 1, failed: 0 };
  });
  await step('browser tests', () => {
    if (!built || cluster === undefined)
      throw new SetupError('Not run: they need the build and PostgreSQL, see above.');
    return runBrowserTests(cluster, folder);
  });
}

async function main() {
  const installed = await step('packages', async () => {
    await installPackages();
    return { passed: 0, failed: 0 };
  });
  if (installed) await runSteps();
  // Everything has ended before the last line, so that nothing is printed after it.
  await shutDown();
  if (total.failed > 0) process.exitCode = 1;
  console.log(`\n${total.passed} passed, ${total.failed} failed`);
}

await runMain(main);

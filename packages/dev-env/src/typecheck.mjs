import { runChecks } from './checks/run-checks.mjs';
import { TYPECHECKS } from './checks/steps.mjs';
import { runMain } from './processes/run-main.mjs';
import { installPackages } from './setup/install.mjs';

await runMain(async () => {
  await installPackages();
  const { failed } = await runChecks(TYPECHECKS);
  if (failed > 0) process.exitCode = 1;
});

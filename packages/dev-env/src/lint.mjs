import { runChecks } from './checks/run-checks.mjs';
import { LINTERS } from './checks/steps.mjs';
import { runMain } from './setup/fail.mjs';

await runMain(() => runChecks(LINTERS));

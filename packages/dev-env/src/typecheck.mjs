import { runChecks } from './checks/run-checks.mjs';
import { TYPECHECKS } from './checks/steps.mjs';
import { runMain } from './setup/fail.mjs';

await runMain(() => runChecks(TYPECHECKS));

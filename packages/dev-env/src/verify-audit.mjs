import { run } from './processes/run.mjs';
import { runMain } from './processes/run-main.mjs';
import { buildAll } from './setup/build.mjs';
import { claimLocal, claimant } from './setup/claim.mjs';
import { installPackages } from './setup/install.mjs';
import { openExistingDatabase } from './setup/local-database.mjs';
import { BUILT } from './setup/programs.mjs';

/** Walks the audit chain of the local database, beside the running product or with PostgreSQL started for it. */
await runMain(async () => {
  const beside = claimant() !== null;
  if (!beside) await claimLocal();
  await installPackages();
  await buildAll();
  const { appUrl } = await openExistingDatabase({ leaveRunning: beside });
  const { command, args, cwd } = BUILT.verifyAudit;
  const { code } = await run(command, args, { cwd, env: { ...process.env, DATABASE_URL: appUrl } });
  process.exitCode = code;
});

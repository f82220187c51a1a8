import { join } from 'node:path';
import { run } from './processes/run.mjs';
import { runMain } from './setup/fail.mjs';
import { openLocalDatabase } from './setup/local-database.mjs';
import { ROOT } from './setup/paths.mjs';

/** Walks the audit chain of the local database; PostgreSQL is started for it where it is not running. */
await runMain(async () => {
  const { cluster, database } = await openLocalDatabase();
  try {
    const { code } = await run(process.execPath, [join(ROOT, 'apps/api/dist/commands/verify-audit.js')], {
      env: { ...process.env, DATABASE_URL: database.appUrl },
    });
    process.exitCode = code;
  } finally {
    if (!cluster.wasRunning) await cluster.stop();
  }
});

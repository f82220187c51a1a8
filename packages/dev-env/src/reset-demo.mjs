import { join } from 'node:path';
import { dropDatabase } from './postgres/database.mjs';
import { mustRun } from './processes/run.mjs';
import { buildAll } from './setup/build.mjs';
import { ownerEnvironment, serverEnvironment } from './setup/environment.mjs';
import { SetupError, runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { LOCAL_DATABASE, openLocalDatabase } from './setup/local-database.mjs';
import { ROOT } from './setup/paths.mjs';

/** Drops the local database and seeds the demo anew. Refuses while the product runs on it. */
await runMain(async () => {
  await installPackages();
  await buildAll();
  const first = await openLocalDatabase();
  if (first.cluster.wasRunning)
    throw new SetupError(
      'Tipward is running on this database. Stop it (Ctrl-C), then run the command again.',
    );
  try {
    await dropDatabase(first.bin, first.cluster, LOCAL_DATABASE);
    const { database, secrets } = await openLocalDatabase();
    const owner = ownerEnvironment(
      serverEnvironment({ port: 4310, mailPort: 1, database, secret: secrets.session, mode: 'demo' }),
      database,
    );
    await mustRun(process.execPath, [join(ROOT, 'apps/api/dist/commands/migrate.js')], { env: owner });
    console.log(await mustRun(process.execPath, [join(ROOT, 'seeds/dist/seed-demo.js')], { env: owner }));
  } finally {
    await first.cluster.stop();
  }
});

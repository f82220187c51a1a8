import { runMain } from './processes/run-main.mjs';
import { buildAll } from './setup/build.mjs';
import { claimLocal } from './setup/claim.mjs';
import { makeDemo } from './setup/demo.mjs';
import { serverEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { noteDemoIsWhole, openLocalDatabase } from './setup/local-database.mjs';
import { BUILT } from './setup/programs.mjs';

/** Drops the local database and makes the demo anew. Refuses while the product runs on it. */
await runMain(async () => {
  await claimLocal();
  await installPackages();
  await buildAll();
  const { database, secrets } = await openLocalDatabase({ anew: true });
  // Nothing listens here: the seeds serve themselves on a port of their own, and mail waits for the worker.
  const ports = { port: 4310, mailPort: 4125 };
  const environment = serverEnvironment({ ...ports, database, secret: secrets.session, mode: 'demo' });
  const signIns = await makeDemo(BUILT, environment, database);
  noteDemoIsWhole();
  console.log(`\nThe demo is as on the first day; npm start serves it.\n\n${signIns}`);
});

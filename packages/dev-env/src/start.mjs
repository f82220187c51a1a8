import { freePort, readPort, requirePort } from './processes/ports.mjs';
import { runMain } from './processes/run-main.mjs';
import { createServices } from './processes/services.mjs';
import { waitHealthy } from './processes/wait-healthy.mjs';
import { buildAll } from './setup/build.mjs';
import { claimLocal } from './setup/claim.mjs';
import { makeDemo } from './setup/demo.mjs';
import { serverEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { noteDemoIsWhole, openLocalDatabase } from './setup/local-database.mjs';
import { BUILT } from './setup/programs.mjs';

/** Installs, builds, migrates and seeds what is not yet, then serves until it is stopped. */
async function main() {
  const port = readPort('TIPWARD_PORT', process.env.TIPWARD_PORT, 4310);
  const note = await claimLocal();
  await requirePort(port, 'npm start');
  await installPackages();
  await buildAll();
  const { database, secrets } = await openLocalDatabase();
  const mailPort = await freePort();
  const environment = serverEnvironment({ port, mailPort, database, secret: secrets.session, mode: 'demo' });
  const signIns = await makeDemo(BUILT, environment, database);
  noteDemoIsWhole();
  const url = environment.TIPWARD_PUBLIC_URL;
  const services = createServices();
  services.start('The server', BUILT.server, environment);
  services.start('The worker', BUILT.worker, environment);
  note({ url, services: services.pids() });
  await Promise.race([waitHealthy(url), services.untilOneEnds()]);
  console.log(`\nTipward is at ${url}\n\n${signIns}\n\nCtrl-C stops everything.`);
  await services.untilOneEnds();
}

await runMain(main, { interruptedCode: 0 });

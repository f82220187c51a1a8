import { freePort, readPort, requirePort } from './processes/ports.mjs';
import { runMain } from './processes/run-main.mjs';
import { createServices } from './processes/services.mjs';
import { waitHealthy } from './processes/wait-healthy.mjs';
import { claimLocal } from './setup/claim.mjs';
import { makeDemo } from './setup/demo.mjs';
import { serverEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { noteDemoIsWhole, openLocalDatabase } from './setup/local-database.mjs';
import { WATCHED } from './setup/programs.mjs';

const URL_OF_WEB = 'http://127.0.0.1:5173';

/** Hot reload: API and worker from their sources under watch, the web app by Vite with a proxy to the API. */
async function main() {
  const port = readPort('TIPWARD_PORT', process.env.TIPWARD_PORT, 4310);
  const note = await claimLocal();
  await requirePort(port, 'npm run dev');
  await installPackages();
  const { database, secrets } = await openLocalDatabase();
  const mailPort = await freePort();
  const environment = {
    ...serverEnvironment({ port, mailPort, database, secret: secrets.session, mode: 'demo' }),
    NODE_ENV: 'development',
    TIPWARD_PUBLIC_URL: URL_OF_WEB,
    // Vite serves the web application; there may be no build of it.
    WEB_DIST: undefined,
  };
  const signIns = await makeDemo(WATCHED, environment, database);
  noteDemoIsWhole();
  const services = createServices();
  services.start('The server', WATCHED.server, environment);
  services.start('The worker', WATCHED.worker, environment);
  services.start('The web application', WATCHED.web, environment);
  note({ url: URL_OF_WEB, services: services.pids() });
  await Promise.race([waitHealthy(`http://127.0.0.1:${port}`), services.untilOneEnds()]);
  console.log(`\nTipward with hot reload is at ${URL_OF_WEB}\n\n${signIns}\n\nCtrl-C stops everything.`);
  await services.untilOneEnds();
}

await runMain(main, { interruptedCode: 0 });

import { join } from 'node:path';
import { createChildren } from './processes/children.mjs';
import { freePort, isFree } from './processes/ports.mjs';
import { mustRun } from './processes/run.mjs';
import { waitHealthy } from './processes/wait-healthy.mjs';
import { buildAll } from './setup/build.mjs';
import { ownerEnvironment, serverEnvironment } from './setup/environment.mjs';
import { SetupError, runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { openLocalDatabase } from './setup/local-database.mjs';
import { checkNode } from './setup/node-version.mjs';
import { ROOT } from './setup/paths.mjs';

const DEFAULT_PORT = 4310;

async function main() {
  checkNode();
  const port = Number(process.env.TIPWARD_PORT ?? DEFAULT_PORT);
  if (!Number.isInteger(port) || port < 1 || port > 65535)
    throw new SetupError(
      `TIPWARD_PORT is ${process.env.TIPWARD_PORT}; allowed: a whole number from 1 to 65535.`,
    );
  if (!(await isFree(port)))
    throw new SetupError(
      `Port ${port} is taken. Stop what listens there, or choose another: TIPWARD_PORT=4400 npm start`,
    );
  await installPackages();
  await buildAll();
  const { cluster, database, secrets } = await openLocalDatabase();
  const children = createChildren(() => cluster.stop());
  try {
    const environment = serverEnvironment({
      port,
      mailPort: await freePort(),
      database,
      secret: secrets.session,
      mode: 'demo',
    });
    const owner = ownerEnvironment(environment, database);
    const node = (file) => [join(ROOT, file)];
    await mustRun(process.execPath, node('apps/api/dist/commands/migrate.js'), { env: owner });
    const seeded = await mustRun(process.execPath, node('seeds/dist/seed-demo.js'), { env: owner });
    children.start('The server', process.execPath, node('apps/api/dist/server.js'), environment, ROOT);
    children.start('The worker', process.execPath, node('apps/api/dist/worker.js'), environment, ROOT);
    await waitHealthy(environment.TIPWARD_PUBLIC_URL);
    console.log(
      `\nTipward is at ${environment.TIPWARD_PUBLIC_URL}\n${seeded.trim()}\n\nCtrl-C stops everything.`,
    );
  } catch (error) {
    console.error(error instanceof SetupError ? `\n${error.message}` : error);
    await children.stop(1);
  }
}

await runMain(main);

import { join } from 'node:path';
import { createChildren } from './processes/children.mjs';
import { freePort } from './processes/ports.mjs';
import { mustRun } from './processes/run.mjs';
import { ownerEnvironment, serverEnvironment } from './setup/environment.mjs';
import { runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { openLocalDatabase } from './setup/local-database.mjs';
import { checkNode } from './setup/node-version.mjs';
import { ROOT } from './setup/paths.mjs';

const API_PORT = 4310;
const SOURCE = ['--conditions=@tipward/source', '--import', 'tsx'];

/** Hot reload: API and worker from their sources under watch, the web app by Vite with a proxy to the API. */
async function main() {
  checkNode();
  await installPackages();
  const { cluster, database, secrets } = await openLocalDatabase();
  const children = createChildren(() => cluster.stop());
  const environment = {
    ...serverEnvironment({
      port: API_PORT,
      mailPort: await freePort(),
      database,
      secret: secrets.session,
      mode: 'demo',
    }),
    TIPWARD_PUBLIC_URL: 'http://127.0.0.1:5173',
  };
  const owner = ownerEnvironment(environment, database);
  await mustRun(process.execPath, [...SOURCE, join(ROOT, 'apps/api/src/commands/migrate.ts')], {
    env: owner,
    cwd: join(ROOT, 'apps/api'),
  });
  console.log(
    await mustRun(process.execPath, [...SOURCE, join(ROOT, 'seeds/src/seed-demo.ts')], {
      env: owner,
      cwd: join(ROOT, 'seeds'),
    }),
  );
  const watch = (name, file) =>
    children.start(name, process.execPath, ['--watch', ...SOURCE, file], environment, join(ROOT, 'apps/api'));
  watch('The server', 'src/server.ts');
  watch('The worker', 'src/worker.ts');
  children.start(
    'The web app',
    join(ROOT, 'apps/web/node_modules/.bin/vite'),
    ['--host', '127.0.0.1', '--port', '5173', '--strictPort'],
    environment,
    join(ROOT, 'apps/web'),
  );
}

await runMain(main);

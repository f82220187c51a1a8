import { runMain } from './processes/run-main.mjs';
import { buildAll } from './setup/build.mjs';
import { installPackages } from './setup/install.mjs';

await runMain(async () => {
  await installPackages();
  await buildAll();
});

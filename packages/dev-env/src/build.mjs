import { buildAll } from './setup/build.mjs';
import { runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { checkNode } from './setup/node-version.mjs';

await runMain(async () => {
  checkNode();
  await installPackages();
  await buildAll();
});

import { join } from 'node:path';
import { run } from './processes/run.mjs';
import { runMain } from './setup/fail.mjs';
import { installPackages } from './setup/install.mjs';
import { ROOT } from './setup/paths.mjs';

await runMain(async () => {
  await installPackages();
  const { code } = await run(
    join(ROOT, 'node_modules/.bin/tsx'),
    [join(ROOT, 'packages/bem-solver/bench/run.ts'), ...process.argv.slice(2)],
    { cwd: ROOT },
  );
  process.exitCode = code;
});

import { run } from './processes/run.mjs';
import { runMain } from './processes/run-main.mjs';
import { installPackages } from './setup/install.mjs';
import { ROOT, bin } from './setup/paths.mjs';

/** Speed and robustness tables of the solver, from its sources; arguments name the tables wanted. */
await runMain(async () => {
  await installPackages();
  const args = ['--conditions=@tipward/source', 'packages/bem-solver/bench/run.ts', ...process.argv.slice(2)];
  const { code } = await run(bin('tsx'), args, { cwd: ROOT });
  process.exitCode = code;
});

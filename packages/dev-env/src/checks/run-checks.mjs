import { run } from '../processes/run.mjs';
import { ROOT } from '../setup/paths.mjs';

/** Runs every step even after one failed; prints what each took. Sets the exit code and returns the counts. */
export async function runChecks(steps, env = process.env) {
  const counts = { passed: 0, failed: 0 };
  for (const { name, command, args } of steps) {
    const start = Date.now();
    const { code, output } = await run(command, args, { cwd: ROOT, env, quiet: true });
    const took = `${((Date.now() - start) / 1000).toFixed(1)} s`;
    if (code === 0) {
      counts.passed += 1;
      console.log(`ok    ${name} (${took})`);
    } else {
      counts.failed += 1;
      process.exitCode = 1;
      console.log(`FAIL  ${name} (${took})\n${output.trim()}\n`);
    }
  }
  return counts;
}

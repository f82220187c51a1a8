import { run } from '../processes/run.mjs';
import { ROOT } from '../setup/paths.mjs';

const secondsSince = (start) => `${((Date.now() - start) / 1000).toFixed(1)} s`;

/** Runs every check even after one failed, prints what each took and returns { passed, failed }. */
export async function runChecks(checks) {
  const counts = { passed: 0, failed: 0 };
  for (const { name, command, args } of checks) {
    const start = Date.now();
    const { code, output } = await run(command, args, { cwd: ROOT, quiet: true });
    counts[code === 0 ? 'passed' : 'failed'] += 1;
    if (code === 0) console.log(`ok    ${name} (${secondsSince(start)})`);
    else console.log(`FAIL  ${name} (${secondsSince(start)})\n${output.trim()}\n`);
  }
  return counts;
}

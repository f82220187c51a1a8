import { join } from 'node:path';
import { mustRun } from '../processes/run.mjs';

/** Runs SQL through psql and resolves with its bare output. The password stays off the command line, where others see it. */
export function sql(bin, url, text) {
  const { username, password, hostname, port, pathname } = new URL(url);
  const where = ['-h', hostname, '-p', port, '-U', username, '-d', pathname.slice(1)];
  const args = ['-X', '-q', '-A', '-t', '-v', 'ON_ERROR_STOP=1', ...where, '-f', '-'];
  return mustRun(join(bin, 'psql'), args, { input: text, env: { ...process.env, PGPASSWORD: password } });
}

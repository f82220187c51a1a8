import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { mustRun } from '../processes/run.mjs';
import { SetupError } from './fail.mjs';

const CHROMIUM = '/usr/bin/chromium';

/** Without this Debian would start a cluster of its own on the default port. An administrator's own choice stays. */
function keepFromStartingPostgres() {
  const file = '/etc/postgresql-common/createcluster.conf';
  if (existsSync(file)) return;
  mkdirSync('/etc/postgresql-common', { recursive: true });
  writeFileSync(file, 'create_main_cluster = false\n');
}

/** Installs a Debian package as root; as anyone else says which command an administrator has to run. */
export async function installDebian(name, why) {
  const command = `apt-get install -y --no-install-recommends ${name}`;
  if (!existsSync('/usr/bin/apt-get'))
    throw new SetupError(
      `${why} ${name} is missing, and this is no Debian: install it by the means of this system, then run the command again.`,
    );
  if (process.getuid() !== 0)
    throw new SetupError(
      `${why} Debian's package ${name} is missing, and this user may not install it. Ask an administrator to run:\n  ${command}\nThen run the command again.`,
    );
  console.log(`Installing Debian's ${name} …`);
  if (name === 'postgresql') keepFromStartingPostgres();
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const [program, ...args] = command.split(' ');
  await mustRun(program, ['update'], { env }, 'Are the package servers of Debian reachable?');
  await mustRun(program, args, { env }, 'Are the package servers of Debian reachable?');
}

/** Debian's Chromium, for the browser tests. */
export async function ensureChromium() {
  if (!existsSync(CHROMIUM)) await installDebian('chromium', 'The browser tests run in Chromium.');
}

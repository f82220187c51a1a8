import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { mustRun } from '../processes/run.mjs';
import { SetupError } from './fail.mjs';

const isRoot = () => process.getuid?.() === 0;

/** Installs a Debian package as root; as anyone else says which command an administrator has to run. */
export async function installDebian(name, why) {
  const command = `apt-get install -y --no-install-recommends ${name}`;
  if (!existsSync('/usr/bin/apt-get'))
    throw new SetupError(
      `${why} ${name} is missing and this is no Debian: install it by the means of this system and run the command again.`,
    );
  if (!isRoot())
    throw new SetupError(
      `${why} Debian's package ${name} is missing and this user may not install it. Ask an administrator to run:\n  ${command}`,
    );
  console.log(`Installing Debian's ${name} …`);
  if (name === 'postgresql') {
    // Without this Debian would start a cluster of its own on the default port.
    mkdirSync('/etc/postgresql-common', { recursive: true });
    writeFileSync('/etc/postgresql-common/createcluster.conf', 'create_main_cluster = false\n', {
      flag: 'w',
    });
  }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await mustRun('apt-get', ['update'], { env }, 'Are Debian’s package servers reachable?');
  await mustRun('apt-get', ['install', '-y', '--no-install-recommends', name], { env });
}

/** Debian's Chromium, for the browser tests. */
export async function ensureChromium() {
  if (!existsSync('/usr/bin/chromium')) await installDebian('chromium', 'The browser tests run in Chromium.');
}

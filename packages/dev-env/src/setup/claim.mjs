import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { onShutdown } from '../processes/shutdown.mjs';
import { SetupError } from './fail.mjs';
import { LOCAL } from './paths.mjs';

const FILE = join(LOCAL, 'running.json');

/** Whether a process runs whose command line holds `part`; its number alone may long belong to another. */
function runs(pid, part) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(part);
  } catch {
    return false;
  }
}

/** Until a killed process is gone, or waits to be collected, its ports are taken. */
function holdsResources(pid) {
  try {
    return !/^State:\s+[ZX]/mu.test(readFileSync(`/proc/${pid}/status`, 'utf8'));
  } catch {
    return false;
  }
}

/** Who uses the local database now: { pid, url }, or null. */
export function claimant(file = FILE) {
  if (!existsSync(file)) return null;
  const claim = JSON.parse(readFileSync(file, 'utf8'));
  return claim.pid !== process.pid && runs(claim.pid, 'dev-env/src') ? claim : null;
}

/**
 * Takes the local database for this process until it ends, so that no second command stops PostgreSQL under the first.
 * Services that a killed command left behind are stopped.
 * @returns a promise of (facts) => void, to note { url, services } beside the claim
 */
export async function claimLocal(file = FILE) {
  const other = claimant(file);
  if (other !== null)
    throw new SetupError(
      `Tipward already runs from this folder as process ${other.pid}` +
        `${other.url === undefined ? '' : ` at ${other.url}`}. Stop it there with Ctrl-C first.`,
    );
  if (existsSync(file)) await stopLeftOvers(JSON.parse(readFileSync(file, 'utf8')));
  const note = (facts) => writeFileSync(file, JSON.stringify({ pid: process.pid, ...facts }));
  mkdirSync(dirname(file), { recursive: true });
  note({});
  onShutdown(() => rmSync(file, { force: true }));
  return note;
}

async function stopLeftOvers({ services = [] }) {
  for (const pid of services) {
    if (!runs(pid, 'apps/')) continue;
    process.kill(-pid, 'SIGKILL');
    while (holdsResources(pid)) await sleep(20);
  }
}

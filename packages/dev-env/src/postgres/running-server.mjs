import { existsSync, readFileSync, readlinkSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';

const PORT_LINE = 3;

/** Whether process `pid` is a PostgreSQL server on `dataDir`: after a crash its number may belong to anything. */
function serves(pid, dataDir) {
  try {
    return (
      readFileSync(`/proc/${pid}/comm`, 'utf8').trim() === 'postgres' &&
      readlinkSync(`/proc/${pid}/cwd`) === realpathSync(dataDir)
    );
  } catch {
    return false;
  }
}

/**
 * Port of the server that runs on `dataDir`, or null. A postmaster.pid that a crash left behind is removed: PostgreSQL would
 * not start while its number belongs to another process.
 */
export function runningPort(dataDir) {
  const file = join(dataDir, 'postmaster.pid');
  if (!existsSync(file)) return null;
  const lines = readFileSync(file, 'utf8').split('\n');
  if (serves(Number(lines[0]), dataDir)) return Number(lines[PORT_LINE]);
  rmSync(file);
  return null;
}

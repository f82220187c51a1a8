import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installDebian } from '../setup/debian.mjs';

const HOME = '/usr/lib/postgresql';

/** Folder of the newest PostgreSQL server programs on this machine, or null. They are not on PATH in Debian. */
export function findBinaries(home = HOME) {
  if (!existsSync(home)) return null;
  const versions = readdirSync(home)
    .filter((name) => /^\d+$/u.test(name) && existsSync(join(home, name, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a));
  return versions.length === 0 ? null : join(home, versions[0], 'bin');
}

export async function ensureBinaries() {
  const found = findBinaries();
  if (found !== null) return found;
  await installDebian('postgresql', 'Tipward keeps its records in PostgreSQL.');
  const installed = findBinaries();
  if (installed === null) throw new Error(`${HOME} holds no server programs after the installation`);
  return installed;
}

import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installDebian } from '../setup/debian.mjs';
import { SetupError } from '../setup/fail.mjs';

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

/** Data can only be served by the major version that made them: `bin` of that version, beside the newest one. */
export function binariesFor(dataDir, newest) {
  const file = join(dataDir, 'PG_VERSION');
  if (!existsSync(file)) return newest;
  const version = readFileSync(file, 'utf8').trim();
  const bin = join(newest, '../..', version, 'bin');
  if (existsSync(join(bin, 'postgres'))) return bin;
  throw new SetupError(
    `The data in ${dataDir} were made by PostgreSQL ${version}, which is no longer installed. ` +
      `Install postgresql-${version}, or remove that folder to start with an empty demo.`,
  );
}

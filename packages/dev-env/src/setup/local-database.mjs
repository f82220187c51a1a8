import { existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBinaries } from '../postgres/binaries.mjs';
import { startCluster } from '../postgres/cluster.mjs';
import { dataPlace } from '../postgres/data-place.mjs';
import { dropDatabase, ensureDatabase } from '../postgres/database.mjs';
import { LOCAL, OUTSIDE } from './paths.mjs';
import { loadSecrets } from './secrets.mjs';

const NAME = 'tipward';

/** Stands while the demo is being made: whoever finds it at the start finds a demo by half. */
const UNFINISHED = join(LOCAL, 'demo-unfinished');

/** PostgreSQL of this checkout and its secrets; made where they are missing. */
async function openLocalCluster({ leaveRunning = false } = {}) {
  mkdirSync(LOCAL, { recursive: true });
  const newest = await ensureBinaries();
  const dataDir = dataPlace(join(LOCAL, 'postgres'), OUTSIDE);
  const secretFile = join(LOCAL, 'postgres.json');
  const secrets = loadSecrets(join(LOCAL, 'secrets.json'));
  const cluster = await startCluster(newest, { dataDir, secretFile, leaveRunning });
  return { cluster, secrets };
}

/** The local database; empty and new when there was none, when `anew` asks for it, or when making the demo was interrupted. */
export async function openLocalDatabase({ anew = false } = {}) {
  const { cluster, secrets } = await openLocalCluster();
  if (existsSync(UNFINISHED)) console.log('Making the demo was interrupted last time; starting over …');
  if (anew || existsSync(UNFINISHED)) await dropDatabase(cluster.bin, cluster, NAME);
  const database = await ensureDatabase(cluster.bin, cluster, NAME, secrets);
  if (database.created) writeFileSync(UNFINISHED, '');
  return { cluster, database, secrets };
}

/** The database as it is, for a command that only reads it. */
export async function openExistingDatabase(options) {
  const { cluster, secrets } = await openLocalCluster(options);
  return ensureDatabase(cluster.bin, cluster, NAME, secrets);
}

export const noteDemoIsWhole = () => rmSync(UNFINISHED, { force: true });

import { join } from 'node:path';
import { ensureBinaries } from '../postgres/binaries.mjs';
import { dataPlace, startCluster } from '../postgres/cluster.mjs';
import { ensureDatabase } from '../postgres/database.mjs';
import { LOCAL } from './paths.mjs';
import { loadSecrets } from './secrets.mjs';

export const LOCAL_DATABASE = 'tipward';

/** PostgreSQL of this checkout, running, with roles and database. */
export async function openLocalDatabase() {
  const bin = await ensureBinaries();
  const secrets = loadSecrets(join(LOCAL, 'secrets.json'));
  const dataDir = dataPlace(join(LOCAL, 'postgres'));
  const cluster = await startCluster(bin, { dataDir, secretFile: join(LOCAL, 'postgres.json') });
  const database = await ensureDatabase(bin, cluster, LOCAL_DATABASE, secrets);
  return { bin, cluster, database, secrets };
}

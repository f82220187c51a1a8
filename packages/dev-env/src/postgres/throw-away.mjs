import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { onShutdown } from '../processes/shutdown.mjs';
import { TEMPORARY } from '../setup/paths.mjs';
import { ensureBinaries } from './binaries.mjs';
import { startCluster } from './cluster.mjs';

/** Nothing in it has to survive a crash. */
const FAST = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'max_connections=200'];

/** A folder that vanishes when this process ends. */
export function throwAwayFolder() {
  const folder = mkdtempSync(join(TEMPORARY, 'tipward-test-'));
  // As root PostgreSQL runs as another user, who has to get through.
  chmodSync(folder, 0o711);
  onShutdown(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** A new cluster in such a folder. */
export async function startThrowAwayCluster(folder) {
  const place = { dataDir: join(folder, 'postgres'), secretFile: join(folder, 'postgres.json') };
  return startCluster(await ensureBinaries(), { ...place, settings: FAST });
}

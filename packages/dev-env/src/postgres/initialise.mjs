import { chmodSync, mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { mustRun } from '../processes/run.mjs';
import { TEMPORARY } from '../setup/paths.mjs';

/** Makes an empty cluster in `dataDir`. Until it is whole it stands beside it, so that an interrupted attempt leaves none. */
export async function initialise(bin, dataDir, password, { asServer, giveToServer }) {
  console.log('Setting up PostgreSQL …');
  const parent = mkdirSync(dirname(dataDir), { recursive: true });
  if (parent !== undefined) chmodSync(dirname(dataDir), 0o755);
  const unfinished = `${dataDir}.unfinished`;
  rmSync(unfinished, { recursive: true, force: true });
  mkdirSync(unfinished, { mode: 0o700 });
  giveToServer(unfinished);
  const passwordDir = mkdtempSync(join(TEMPORARY, 'tipward-'));
  const passwordFile = join(passwordDir, 'password');
  try {
    writeFileSync(passwordFile, password, { mode: 0o600 });
    giveToServer(passwordFile);
    giveToServer(passwordDir);
    const access = ['-U', 'postgres', '--pwfile', passwordFile, '--auth=scram-sha-256'];
    const args = ['-D', unfinished, ...access, '-E', 'UTF8', '--locale=C.UTF-8'];
    await mustRun(...asServer(join(bin, 'initdb'), args), { cwd: '/' });
    renameSync(unfinished, dataDir);
  } finally {
    rmSync(passwordDir, { recursive: true, force: true });
    rmSync(unfinished, { recursive: true, force: true });
  }
}

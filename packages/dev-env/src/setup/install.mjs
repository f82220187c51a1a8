import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { mustRun } from '../processes/run.mjs';
import { LOCAL, ROOT } from './paths.mjs';
import { explain } from './fail.mjs';

export const PNPM = ['--yes', 'pnpm@10.34.9'];

const hashOf = (...files) =>
  files.reduce((hash, file) => hash.update(readFileSync(file)), createHash('sha256')).digest('hex');

/** Installs the packages when they are missing or the lock file changed since. */
export async function installPackages() {
  const stamp = join(LOCAL, 'installed');
  const wanted = hashOf(join(ROOT, 'pnpm-lock.yaml'), join(ROOT, 'pnpm-workspace.yaml'));
  const have =
    existsSync(join(ROOT, 'node_modules', '.modules.yaml')) &&
    existsSync(stamp) &&
    readFileSync(stamp, 'utf8') === wanted;
  if (have) return;
  console.log('Installing packages …');
  await mustRun(
    'npx',
    [...PNPM, 'install', '--frozen-lockfile'],
    { cwd: ROOT },
    'Is the package registry reachable? Run the command again when it is.',
  );
  try {
    mkdirSync(LOCAL, { recursive: true });
    writeFileSync(stamp, wanted);
  } catch (error) {
    throw explain(error, 'noting what is installed');
  }
}

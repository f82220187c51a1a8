import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { mustRun } from '../processes/run.mjs';
import { LOCAL, ROOT } from './paths.mjs';

export const PNPM = ['--yes', 'pnpm@10.34.9'];

/** Installs the packages when they are missing or the lock file changed since. */
export async function installPackages() {
  const stamp = join(LOCAL, 'installed');
  const hash = createHash('sha256');
  for (const file of ['pnpm-lock.yaml', 'pnpm-workspace.yaml']) hash.update(readFileSync(join(ROOT, file)));
  const wanted = hash.digest('hex');
  const have = existsSync(join(ROOT, 'node_modules/.modules.yaml')) && existsSync(stamp);
  if (have && readFileSync(stamp, 'utf8') === wanted) return;
  console.log('Installing packages …');
  await mustRun(
    'npx',
    [...PNPM, 'install', '--frozen-lockfile'],
    // Without a terminal pnpm asks nothing and never removes node_modules unless it is told that it runs unattended.
    { cwd: ROOT, env: { ...process.env, CI: 'true' } },
    'Is the package registry reachable? Run the command again when it is.',
  );
  mkdirSync(LOCAL, { recursive: true });
  writeFileSync(stamp, wanted);
}

import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { mustRun } from '../processes/run.mjs';
import { PNPM } from './install.mjs';
import { LOCAL, ROOT } from './paths.mjs';

const SKIPPED = new Set(['node_modules', 'dist', '.local', '.git', 'test-results', 'playwright-report']);

/** Name, size and time of every source file: equal text means nothing was touched since. */
export function sourceStamp(folders, root = ROOT) {
  const hash = createHash('sha256');
  const walk = (folder) => {
    for (const entry of readdirSync(folder, { withFileTypes: true }).sort((a, b) =>
      a.name < b.name ? -1 : 1,
    )) {
      if (SKIPPED.has(entry.name)) continue;
      const path = join(folder, entry.name);
      if (entry.isDirectory()) walk(path);
      else if (entry.isFile()) {
        const { size, mtimeMs } = statSync(path);
        hash.update(`${path.slice(root.length)}\0${size}\0${mtimeMs}\n`);
      }
    }
  };
  for (const folder of folders) walk(join(root, folder));
  return hash.digest('hex');
}

/** Builds packages, API, web and seeds in the order of their dependencies, unless nothing changed since the last build. */
export async function buildAll() {
  const stampFile = join(LOCAL, 'built');
  const wanted =
    sourceStamp(['packages', 'apps', 'seeds']) + readFileSync(join(ROOT, 'pnpm-lock.yaml')).length;
  const have =
    existsSync(join(ROOT, 'apps/web/dist/index.html')) && existsSync(join(ROOT, 'apps/api/dist/server.js'));
  if (have && existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return;
  console.log('Building …');
  await mustRun(
    'npx',
    [...PNPM, '-r', '--reporter=append-only', '--workspace-concurrency=2', 'run', 'build'],
    { cwd: ROOT },
  );
  mkdirSync(LOCAL, { recursive: true });
  writeFileSync(stampFile, wanted);
}

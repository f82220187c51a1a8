import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { mustRun } from '../processes/run.mjs';
import { PNPM } from './install.mjs';
import { LOCAL, ROOT } from './paths.mjs';

/** What no build reads. */
const SKIPPED = new Set(['node_modules', 'dist', 'dev-env', 'e2e']);
const SOURCES = ['packages', 'apps', 'seeds', 'pnpm-lock.yaml', 'tsconfig.base.json'];
const RESULTS = ['apps/web/dist/index.html', 'apps/api/dist/server.js', 'seeds/dist/seed-demo.js'];

/** Name, size and time of every file below `places`: equal text means nothing was touched since. */
export function sourceStamp(places, root = ROOT) {
  const hash = createHash('sha256');
  const walk = (path) => {
    const facts = statSync(path);
    if (!facts.isDirectory()) {
      hash.update(`${path.slice(root.length)}\0${facts.size}\0${facts.mtimeMs}\n`);
      return;
    }
    for (const entry of readdirSync(path, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1)))
      if (!SKIPPED.has(entry.name) && (entry.isDirectory() || entry.isFile())) walk(join(path, entry.name));
  };
  for (const place of places) walk(join(root, place));
  return hash.digest('hex');
}

/** Builds packages, API, web and seeds in the order of their dependencies, unless nothing changed since the last build. */
export async function buildAll() {
  const stampFile = join(LOCAL, 'built');
  const wanted = sourceStamp(SOURCES);
  const have = RESULTS.every((file) => existsSync(join(ROOT, file)));
  if (have && existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return;
  console.log('Building …');
  const args = ['-r', '--reporter=append-only', '--workspace-concurrency=2', 'run', 'build'];
  await mustRun('npx', [...PNPM, ...args], { cwd: ROOT });
  mkdirSync(LOCAL, { recursive: true });
  writeFileSync(stampFile, wanted);
}

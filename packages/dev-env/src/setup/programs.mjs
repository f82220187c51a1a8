import { join } from 'node:path';
import { ROOT } from './paths.mjs';

const node = (...args) => ({ command: process.execPath, args, cwd: ROOT });
const built = (file) => node(join(ROOT, file));
const source = (...args) => node('--conditions=@tipward/source', '--import', 'tsx', ...args);

/** The product's programs as `npm run build` leaves them. */
export const BUILT = {
  migrate: built('apps/api/dist/commands/migrate.js'),
  seed: built('seeds/dist/seed-demo.js'),
  server: built('apps/api/dist/server.js'),
  worker: built('apps/api/dist/worker.js'),
  verifyAudit: built('apps/api/dist/commands/verify-audit.js'),
};

/** The same from their sources; server and worker start anew when a file they read changes. */
export const WATCHED = {
  migrate: source('apps/api/src/commands/migrate.ts'),
  seed: source('seeds/src/seed-demo.ts'),
  server: source('--watch', '--watch-preserve-output', 'apps/api/src/server.ts'),
  worker: source('--watch', '--watch-preserve-output', 'apps/api/src/worker.ts'),
  web: {
    command: join(ROOT, 'apps/web/node_modules/.bin/vite'),
    args: ['--host', '127.0.0.1', '--port', '5173', '--strictPort', '--clearScreen', 'false'],
    cwd: join(ROOT, 'apps/web'),
  },
};

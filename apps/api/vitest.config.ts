import { defineConfig } from 'vitest/config';

/** API tests run on a real PostgreSQL: TIPWARD_TEST_ADMIN_URL names a superuser on a throw-away cluster. */
export default defineConfig({
  resolve: { conditions: ['@tipward/source'] },
  ssr: { resolve: { conditions: ['@tipward/source', 'node'] } },
  test: {
    name: 'api',
    root: import.meta.dirname,
    include: ['src/**/*.test.ts', 'test/**/*.test.ts'],
    globalSetup: ['test/global-setup.ts'],
    testTimeout: 30_000,
    hookTimeout: 60_000,
    pool: 'forks',
    maxWorkers: 2,
  },
});

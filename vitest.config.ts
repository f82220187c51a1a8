import { defineConfig } from 'vitest/config';

const conditions = ['@tipward/source'];

/** Workspace packages are read from their sources: tests need no build. */
function project(name: string, root: string, include: string[], environment: 'node' | 'jsdom' = 'node') {
  return {
    resolve: { conditions: [...conditions, 'module', 'import', 'browser', 'development', 'default'] },
    ssr: { resolve: { conditions: [...conditions, 'module', 'import', 'node', 'development', 'default'] } },
    test: { name, root, include, environment, testTimeout: 30_000, hookTimeout: 60_000 },
  };
}

export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      project('bem-solver', 'packages/bem-solver', ['src/**/*.test.ts', 'reference/**/*.test.ts']),
      project('contract', 'packages/contract', ['src/**/*.test.ts']),
      project('design-model', 'packages/design-model', ['src/**/*.test.ts']),
      project('dev-env', 'packages/dev-env', ['src/**/*.test.mjs']),
      // Its own file: it makes the database that its tests copy.
      './apps/api/vitest.config.ts',
      project('seeds', 'seeds', ['src/**/*.test.ts']),
      project('web', 'apps/web', ['src/**/*.test.ts']),
      project('web-dom', 'apps/web', ['src/**/*.test.tsx'], 'jsdom'),
    ],
  },
});

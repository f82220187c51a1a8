import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROOT, bin } from '../setup/paths.mjs';

const CONFIG = join(ROOT, '.dependency-cruiser.cjs');
const RULES = createRequire(import.meta.url)(CONFIG).forbidden.map(({ name }) => name);

const EXPORTS = { '.': { '@tipward/source': './src/index.ts', default: './dist/index.js' } };

/** What every import of the fixture finds; `dist` is absent, so that only the condition of the sources resolves. */
const GROUND = {
  'packages/bem-solver/package.json': JSON.stringify({ name: '@tipward/bem-solver', exports: EXPORTS }),
  'packages/bem-solver/src/index.ts': 'export const solve = 1;',
  'node_modules/zod/package.json': '{ "name": "zod", "main": "index.js" }',
  'node_modules/zod/index.js': 'export {};',
  'node_modules/express/package.json': '{ "name": "express", "main": "index.js" }',
  'node_modules/express/index.js': 'export {};',
  'packages/contract/src/sound.ts': "import 'zod'; export const sound = 1;",
  'packages/design-model/src/sound.ts': "import '@tipward/bem-solver'; import '../../contract/src/sound.ts';",
  'packages/dev-env/src/sound.mjs': "import 'node:fs';",
  'apps/api/src/models/design.ts': "import 'express'; export const design = 1;",
  'apps/api/src/db/connect.ts': "import '../models/design.ts';",
  'apps/api/src/policies/design.ts': "import '../../../../packages/contract/src/sound.ts';",
  'apps/api/src/services/save.ts': "import '../models/design.ts'; import '../policies/design.ts';",
  'apps/api/src/routes/save.ts': "import '../services/save.ts';",
  'apps/api/src/seeding.ts': "import './services/save.ts';",
  'apps/web/src/lib/client.ts': 'export const client = 1;',
  'apps/web/src/components/button.tsx': "import '../lib/client.ts';",
  'apps/web/src/features/drafts/page.tsx': "import '../../components/button.tsx';",
  'apps/web/src/features/people/page.tsx': "import '../../lib/client.ts'; export type Row = 1;",
  'apps/web/src/routes/drafts.tsx':
    "import '../features/drafts/page.tsx'; import '../features/people/page.tsx';",
  'apps/web/src/lib/one.ts': "import type { two } from './two.ts'; export type one = typeof two;",
  'apps/web/src/lib/two.ts': "import type { one } from './one.ts'; export declare const two: one;",
  'apps/e2e/journey.spec.ts': "import '../../packages/contract/src/sound.ts';",
  'seeds/src/seed.ts': "import '../../apps/api/src/seeding.ts';",
};

/** For each rule one file that breaks it. */
const BREAKS = {
  'no-circles': ['apps/api/src/services/a.ts', './b.ts'],
  'solver-stands-alone': ['packages/bem-solver/src/bad.ts', 'node:fs'],
  'contract-knows-zod-only': ['packages/contract/src/bad.ts', 'express'],
  'model-bridges-two': ['packages/design-model/src/bad.ts', 'zod'],
  'scripts-bring-nothing': ['packages/dev-env/src/bad.mjs', 'express'],
  'package-never-app': ['packages/design-model/src/worse.ts', '../../../apps/api/src/models/design.ts'],
  'api-never-app': ['apps/api/src/services/bad.ts', '../../../web/src/lib/client.ts'],
  'web-never-app': ['apps/web/src/routes/bad.tsx', '../../../api/src/seeding.ts'],
  'e2e-never-app': ['apps/e2e/bad.spec.ts', '../api/src/seeding.ts'],
  'seeds-by-one-door': ['seeds/src/bad.ts', '../../apps/api/src/services/save.ts'],
  'routes-not-models': ['apps/api/src/routes/bad.ts', '../models/design.ts'],
  'services-not-routes': ['apps/api/src/services/worse.ts', '../routes/save.ts'],
  'policies-are-pure': ['apps/api/src/policies/bad.ts', '../models/design.ts'],
  'presenters-are-pure': ['apps/api/src/presenters/bad.ts', '../services/save.ts'],
  'models-import-no-model': ['apps/api/src/models/bad.ts', './design.ts'],
  'models-know-nothing-above': ['apps/api/src/models/worse.ts', '../services/save.ts'],
  'feature-never-feature': ['apps/web/src/features/drafts/bad.tsx', '../people/page.tsx'],
  'features-not-routes': ['apps/web/src/features/drafts/worse.tsx', '../../routes/drafts.tsx'],
  'components-not-features': ['apps/web/src/components/bad.tsx', '../features/people/page.tsx'],
  'lib-not-components': ['apps/web/src/lib/bad.ts', '../components/button.tsx'],
  resolvable: ['apps/web/src/lib/worse.ts', './nowhere.ts'],
};

let folder;
let violations;

function write(path, text) {
  mkdirSync(dirname(join(folder, path)), { recursive: true });
  writeFileSync(join(folder, path), text);
}

function cruise() {
  const args = ['--config', CONFIG, '--output-type', 'json', 'packages', 'apps', 'seeds'];
  const { stdout } = spawnSync(bin('depcruise'), args, { cwd: folder, encoding: 'utf8' });
  return JSON.parse(stdout).summary.violations;
}

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'tipward-arrows-'));
  for (const [path, text] of Object.entries(GROUND)) write(path, text);
  mkdirSync(join(folder, 'node_modules/@tipward'));
  symlinkSync(join(folder, 'packages/bem-solver'), join(folder, 'node_modules/@tipward/bem-solver'));
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the arrows', () => {
  it('let through what the architecture allows, also circles of types only', () => {
    expect(cruise()).toEqual([]);
  });

  it('are broken by one example each', () => {
    for (const [file, target] of Object.values(BREAKS)) write(file, `import '${target}';`);
    write('apps/api/src/services/b.ts', "import './a.ts';");
    violations = cruise();
    expect(Object.keys(BREAKS).sort()).toEqual([...RULES].sort());
  });

  it.each(Object.entries(BREAKS))('%s bites', (name, [file]) => {
    expect(violations.filter(({ rule }) => rule.name === name).map(({ from }) => from)).toContain(file);
  });
});

import { join } from 'node:path';
import { bin } from '../setup/paths.mjs';

/** Checks of the source; each counts as one in the closing line of `npm test`. */
export const LINTERS = [
  { name: 'formatting', command: bin('prettier'), args: ['--check', '--log-level', 'warn', '.'] },
  { name: 'lint', command: bin('eslint'), args: ['--max-warnings', '0', '.'] },
  {
    name: 'arrows',
    command: bin('depcruise'),
    args: ['--config', '.dependency-cruiser.cjs', '--output-type', 'err', 'packages', 'apps', 'seeds'],
  },
  { name: 'unused code', command: bin('knip'), args: ['--no-progress'] },
];

const PROJECTS = [
  'packages/bem-solver',
  'packages/contract',
  'packages/design-model',
  'apps/api',
  'apps/web',
  'apps/e2e',
  'seeds',
];

export const TYPECHECKS = PROJECTS.map((project) => ({
  name: `types of ${project}`,
  command: bin('tsc'),
  args: ['-p', join(project, 'tsconfig.json')],
}));

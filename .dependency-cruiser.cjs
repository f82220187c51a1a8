/** The arrows of DEVELOPERS.md as rules. Tests may reach further than what they test. */
const TEST = '\\.test\\.(ts|tsx)$|/test/';
const rule = (name, from, to, comment) => ({ name, severity: 'error', comment, from, to });
const outside = (path, allowed) => ({ path: '^(packages|apps|seeds)/', pathNot: [path, ...allowed] });

module.exports = {
  forbidden: [
    rule('no-circles', {}, { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } }, 'No circles.'),
    rule(
      'solver-stands-alone',
      { path: '^packages/bem-solver/src', pathNot: TEST },
      { pathNot: '^packages/bem-solver/src' },
      'The solver imports nothing.',
    ),
    rule(
      'contract-knows-zod-only',
      { path: '^packages/contract/src', pathNot: TEST },
      { pathNot: ['^packages/contract/src', 'node_modules/.*zod'] },
      'The contract imports zod only.',
    ),
    rule(
      'model-bridges-two',
      { path: '^packages/design-model/src', pathNot: TEST },
      { pathNot: ['^packages/(design-model|contract|bem-solver)/'] },
      'design-model imports contract and solver only.',
    ),
    rule(
      'scripts-bring-nothing',
      { path: '^packages/dev-env/src', pathNot: '\\.test\\.mjs$' },
      { dependencyTypesNot: ['core', 'local'] },
      'The commands run before anything is installed.',
    ),
    rule(
      'package-never-app',
      { path: '^packages/' },
      { path: '^(apps|seeds)/' },
      'A package never imports an app.',
    ),
    rule(
      'api-never-app',
      { path: '^apps/api/' },
      outside('^apps/api/', ['^packages/']),
      'An app never imports an app.',
    ),
    rule(
      'web-never-app',
      { path: '^apps/web/' },
      outside('^apps/web/', ['^packages/']),
      'An app never imports an app.',
    ),
    rule(
      'e2e-never-app',
      { path: '^apps/e2e/' },
      outside('^apps/e2e/', ['^packages/']),
      'An app never imports an app.',
    ),
    rule(
      'seeds-by-one-door',
      { path: '^seeds/' },
      { path: '^apps/', pathNot: '^apps/api/src/seeding\\.ts$' },
      'The demo is made through what the API opens for seeding.',
    ),
    rule(
      'routes-not-models',
      { path: '^apps/api/src/routes/', pathNot: TEST },
      { path: '^apps/api/src/(models|db)/' },
      'Routes go through services.',
    ),
    rule(
      'services-not-routes',
      { path: '^apps/api/src/services/', pathNot: TEST },
      { path: '^apps/api/src/routes/' },
      'Services do not know routes.',
    ),
    rule(
      'policies-are-pure',
      { path: '^apps/api/src/policies/', pathNot: TEST },
      { pathNot: ['^apps/api/src/policies/', '^packages/'] },
      'Policies are pure.',
    ),
    rule(
      'presenters-are-pure',
      { path: '^apps/api/src/presenters/', pathNot: TEST },
      { path: '^apps/api/src/(services|routes|db|http|jobs)/' },
      'Presenters are pure.',
    ),
    rule(
      'models-import-no-model',
      { path: '^apps/api/src/models/', pathNot: [TEST, 'init-models'] },
      { path: '^apps/api/src/models/' },
      'Models import no model.',
    ),
    rule(
      'models-know-nothing-above',
      { path: '^apps/api/src/models/', pathNot: TEST },
      { path: '^apps/api/src/(routes|services|policies|presenters|http|jobs)/' },
      'Models know nothing above them.',
    ),
    rule(
      'feature-never-feature',
      { path: '^apps/web/src/features/([^/]+)/' },
      { path: '^apps/web/src/features/', pathNot: '^apps/web/src/features/$1/' },
      'Features meet in routes only.',
    ),
    rule(
      'features-not-routes',
      { path: '^apps/web/src/(features|components|lib)/' },
      { path: '^apps/web/src/(routes|app)/' },
      'Nothing below imports a route.',
    ),
    rule(
      'components-not-features',
      { path: '^apps/web/src/(components|lib)/' },
      { path: '^apps/web/src/features/' },
      'Components know no feature.',
    ),
    rule(
      'lib-not-components',
      { path: '^apps/web/src/lib/' },
      { path: '^apps/web/src/components/' },
      'lib knows no component.',
    ),
    rule('resolvable', {}, { couldNotResolve: true }, 'Every import resolves.'),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)(dist|node_modules/\\.cache|test-results)/' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['@tipward/source', 'import', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.js', '.mjs', '.json', '.css'],
    },
  },
};

/**
 * The rooms of src/ and who may import whom; see DEVELOPERS.md. Kit's own guard between page and server is
 * off under Vitest, and knows no other rooms. tests/unit/house/import-rules.test.ts plants a breach of each.
 */

/** A folder of src/lib, or one file of it (`server/env`). */
const room = (name) => `^src/lib/${name}(/|\\.ts$)`;

/** `name` may import only itself, the listed rooms, and packages. */
const only = (name, ...allowed) => ({
  name: `${name.replace(/\W+/g, '-')}-imports`,
  severity: 'error',
  from: { path: room(name) },
  to: { path: '^src/', pathNot: [room(name), ...allowed.map(room)] }
});

module.exports = {
  forbidden: [
    {
      name: 'no-circular',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } }
    },
    {
      name: 'not-resolvable',
      severity: 'error',
      from: {},
      to: {
        couldNotResolve: true,
        pathNot: '^(\\$app|\\$env|\\./\\$types|\\$service-worker|virtual:first-reading$)'
      }
    },
    {
      name: 'no-undeclared-package',
      severity: 'error',
      from: { path: '^src/' },
      to: { dependencyTypes: ['npm-no-pkg', 'npm-unknown'] }
    },
    only('stats'),
    {
      name: 'stats-is-pure',
      severity: 'error',
      from: { path: room('stats') },
      // One package: sha256 for the digest of a histogram, since Web Crypto is missing on plain http.
      to: {
        pathNot: 'node_modules/@noble/hashes/',
        dependencyTypes: ['npm', 'npm-dev', 'npm-no-pkg', 'npm-unknown', 'core']
      }
    },
    only('model', 'stats'),
    only('formats', 'stats', 'model'),
    only('charts', 'stats', 'model'),
    only('pdf', 'stats', 'model', 'charts'),
    {
      name: 'pdf-runs-anywhere',
      severity: 'error',
      from: { path: room('pdf') },
      // The same code writes a report in a browser.
      to: { dependencyTypes: ['core'] }
    },
    only('ui'),
    only('page', 'stats', 'formats', 'model', 'charts', 'ui', 'pdf'),
    only('server/env'),
    only('server/project-folder'),
    only('server/running'),
    only('server/log', 'server/env', 'server/running'),
    only('server/db', 'server/env', 'server/project-folder'),
    only(
      'server/auth',
      'server/db',
      'server/env',
      'server/log',
      'server/running',
      'server/services/events',
      'model'
    ),
    only('server/mail', 'server/db', 'server/env', 'server/log', 'server/running'),
    only(
      'server/jobs',
      'server/db',
      'server/env',
      'server/log',
      'server/running',
      'server/project-folder',
      'stats',
      'model'
    ),
    only('server/access', 'model'),
    only('server/pdf', 'pdf'),
    only(
      'server/services',
      'server/db',
      'server/env',
      'server/auth',
      'server/access',
      'server/mail',
      'server/pdf',
      'pdf',
      'server/jobs',
      'server/project-folder',
      'server/log',
      'server/running',
      'stats',
      'formats',
      'model'
    ),
    {
      name: 'routes-imports',
      severity: 'error',
      from: { path: '^src/(routes|params)/' },
      to: {
        path: '^src/',
        pathNot: [
          '^src/(routes|params)/',
          '^src/app\\.css$',
          ...['page', 'model', 'charts', 'ui', 'server/services', 'server/auth', 'server/access'].map(room)
        ]
      }
    },
    {
      name: 'page-never-server',
      severity: 'error',
      from: { path: '\\.svelte(\\.ts)?$|^src/lib/(?!server/)|^src/routes/.*\\+(page|layout)\\.ts$' },
      to: { path: '^src/lib/server/' }
    },
    {
      name: 'nobody-imports-cli-or-routes',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/(cli|routes)/' },
      to: { path: '^src/(cli|routes)/' }
    }
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    webpackConfig: { fileName: '.dependency-aliases.cjs' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'svelte', 'types', 'default']
    }
  }
};

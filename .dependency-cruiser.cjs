/** The rooms of src/lib and who may import whom; see DEVELOPERS.md. */
const room = (name) => `^src/lib/${name}/`;
/** `name` may import only itself, the listed rooms, and packages. */
const only = (name, ...allowed) => ({
  name: `${name.replace(/\W+/g, '-')}-imports`,
  severity: 'error',
  from: { path: room(name) },
  to: { path: '^src/', pathNot: [room(name), ...allowed.map(room)] }
});

module.exports = {
  forbidden: [
    { name: 'no-circular', severity: 'error', from: {}, to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } } },
    { name: 'not-resolvable', severity: 'error', from: {}, to: { couldNotResolve: true, pathNot: '^(\\$app|\\$env|\\./\\$types|\\$service-worker)' } },
    only('stats'),
    { name: 'stats-is-pure', severity: 'error', from: { path: room('stats') }, to: { dependencyTypes: ['npm', 'npm-dev', 'core'] } },
    only('formats', 'stats', 'model'),
    only('model', 'stats'),
    only('charts', 'stats', 'model'),
    only('ui'),
    only('server/db', 'server/env'),
    only('server/services', 'server/db', 'server/access', 'server/mail', 'server/pdf', 'server/jobs', 'stats', 'formats', 'model'),
    { name: 'routes-never-db', severity: 'error', from: { path: '^src/routes/' }, to: { path: room('server/db') } },
    {
      name: 'page-never-server',
      severity: 'error',
      from: { path: '^src/(lib/(stats|formats|model|charts|ui|page)/|routes/.*\\+(page|layout)(\\.svelte|\\.ts)$)' },
      to: { path: '^src/lib/server/' }
    }
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'svelte', 'default'] }
  }
};

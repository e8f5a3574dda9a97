/** Import rules that need the whole graph; who may import whom is in eslint.config.mjs. */
module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      comment: 'Two modules that need each other are one module, or lack a third.',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'engine-stands-alone',
      comment: 'The engine is arithmetic; only path.ts takes packages, for geodesy and the sun.',
      severity: 'error',
      from: { path: '^shared/radio/', pathNot: ['/path\\.ts$', '\\.spec\\.ts$'] },
      to: { dependencyTypes: ['npm', 'npm-dev', 'npm-no-pkg', 'core'] },
    },
    {
      name: 'path-takes-two-packages',
      severity: 'error',
      from: { path: '^shared/radio/propagation/path\\.ts$' },
      to: { pathNot: ['^shared/radio/', 'node_modules/(geographiclib-geodesic|suncalc)/'] },
    },
    {
      name: 'engine-physics-first',
      comment: 'What a wave and a circuit do is computed without asking what is judged by it.',
      severity: 'error',
      from: {
        path: '^shared/radio/(mathematics|propagation|channels|circuits|mixing|tracking|hearing)/',
        pathNot: '\\.spec\\.ts$',
      },
      to: {
        path: '^shared/radio/(assessment|candidates|cures|whistles)/',
        dependencyTypesNot: ['type-only'],
      },
    },
    {
      name: 'contracts-take-zod-only',
      severity: 'error',
      from: { path: '^shared/contracts/', pathNot: '\\.spec\\.ts$' },
      to: { pathNot: ['^shared/', 'node_modules/zod/'] },
    },
    {
      name: 'no-node-in-the-browser',
      severity: 'error',
      from: { path: '^(src|shared)/', pathNot: '\\.spec\\.ts$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'no-server-in-the-browser',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: '^(server|test)/' },
    },
    {
      name: 'no-tests-in-the-product',
      severity: 'error',
      from: { path: '^(src|shared|server)/', pathNot: '\\.spec\\.ts$' },
      to: { path: '^test/|\\.spec\\.ts$' },
    },
    {
      name: 'no-unresolvable',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'no-development-packages-in-the-product',
      severity: 'error',
      from: { path: '^(src|shared|server)/', pathNot: ['\\.spec\\.ts$', '^server/dev/'] },
      to: { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'server/tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.js', '.mjs', '.json', '.d.ts'],
    },
  },
};

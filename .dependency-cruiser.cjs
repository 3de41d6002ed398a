/** Imports go one way: src and server may import shared; shared imports zod and nothing else. */
module.exports = {
  forbidden: [
    {
      name: 'shared-stands-alone',
      severity: 'error',
      from: { path: '^shared' },
      to: { pathNot: '^(shared|node_modules/zod)' },
    },
    {
      name: 'pages-not-server',
      severity: 'error',
      from: { path: '^src' },
      to: { path: '^server' },
    },
    {
      name: 'server-not-pages',
      severity: 'error',
      from: { path: '^server' },
      to: { path: '^src' },
    },
    { name: 'no-circles', severity: 'error', from: {}, to: { circular: true } },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'default'] },
  },
};

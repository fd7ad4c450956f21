/** Who may import whom. Work flows contract → analysis, figures, db → server → client, and nothing imports upward. */
const room = (name) => `^${name}/`;
const not = (...names) => ({ path: `^(${names.join('|')})/` });

module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      comment: 'Two files that need each other are one subject, or hide a third.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'contract-knows-only-zod',
      comment: 'The contract is read by every room; what it imported, all would import.',
      severity: 'error',
      from: { path: room('contract') },
      to: { pathNot: '^(contract/|node_modules/zod/)' },
    },
    {
      name: 'analysis-stands-alone',
      comment: 'The engine runs in a worker, a page and a test alike: no React, Express, database, and of the contract the types alone.',
      severity: 'error',
      from: { path: room('analysis') },
      to: not('app', 'components', 'hooks', 'figures', 'server', 'db'),
    },
    {
      name: 'analysis-takes-types-of-the-contract',
      comment: 'Parsing happens at the door; the engine trusts what it is given.',
      severity: 'error',
      from: { path: room('analysis') },
      to: { path: room('contract'), dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'analysis-numeric-libraries-only',
      comment: 'Deterministic and portable: whatever else it needs, it owns.',
      severity: 'error',
      from: { path: room('analysis') },
      to: { path: '^node_modules/', pathNot: '^node_modules/(mathjs|fft\\.js)/' },
    },
    {
      name: 'figures-are-pure-geometry',
      comment: 'The same shapes are drawn on screens and in PDFs, so they know neither.',
      severity: 'error',
      from: { path: room('figures') },
      to: not('app', 'components', 'hooks', 'server', 'db'),
    },
    {
      name: 'figures-use-d3-alone',
      comment: 'Pure geometry needs scales and shapes, nothing that renders.',
      severity: 'error',
      from: { path: room('figures') },
      to: { path: '^node_modules/', pathNot: '^node_modules/(@types/)?d3-' },
    },
    {
      name: 'db-knows-tables-not-rules',
      comment: 'Stores hold SQL; rules live in services above them.',
      severity: 'error',
      from: { path: '^db/(?!seed/)' },
      to: not('app', 'components', 'hooks', 'figures', 'analysis', 'server'),
    },
    {
      name: 'only-db-imports-drizzle',
      comment: 'Another engine under Drizzle can take over by changing one room.',
      severity: 'error',
      from: { pathNot: '^db/' },
      to: { path: '^node_modules/(drizzle-orm|better-sqlite3)/', pathNot: '^node_modules/better-auth/' },
    },
    {
      name: 'server-knows-no-client',
      comment: 'The server must start where no React is installed.',
      severity: 'error',
      from: { path: room('server') },
      to: not('app', 'components', 'hooks'),
    },
    {
      name: 'client-knows-no-server',
      comment: 'What crosses HTTP is the contract; anything else would end up in the page.',
      severity: 'error',
      from: { path: '^(app|components|hooks)/' },
      to: not('server', 'db'),
    },
    {
      name: 'client-parses-no-formulas',
      comment: 'mathjs costs 250 kB gzip; the server reads formulas.',
      severity: 'error',
      from: { path: '^(app|components|hooks|figures)/' },
      to: { path: '^(analysis/formula/|node_modules/mathjs/)' },
    },
    {
      name: 'routes-stay-thin',
      comment: 'A route names a screen; logic lives with the feature.',
      severity: 'error',
      from: { path: room('app') },
      to: not('analysis', 'figures', 'contract'),
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'require', 'node', 'default', 'types'] },
  },
};

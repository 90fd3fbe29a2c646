/** Imports point one way: core, functions, taskpane, workbook. No cycles. */
const only = (name, from, notTo, comment) => ({
  name,
  comment,
  severity: 'error',
  from: { path: from },
  to: { path: notTo },
});

module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    only('core-is-first', '^core/', '^(functions|taskpane|workbook|manifest|test)/', 'core imports itself only'),
    {
      name: 'core-libraries',
      comment: 'core may use the statistics-distribution library and nothing else',
      severity: 'error',
      from: { path: '^core/', pathNot: '^core/.+/generate/' },
      to: { dependencyTypes: ['npm', 'npm-dev', 'core'], pathNot: '@stdlib/stats-base-dists' },
    },
    only('functions-second', '^functions/', '^(taskpane|workbook|manifest|test)/', 'functions import core'),
    only('taskpane-third', '^taskpane/', '^(workbook|manifest|test)/', 'taskpane imports core and functions'),
    only(
      'pane-through-the-store',
      '^taskpane/',
      '^functions/(?!settings/|house/|edge/(blanks|editionText|fitUnits)\\.ts)',
      'the pane sees the stores of functions (settings, house substances), and the seams made for hosts',
    ),
    only(
      'no-tests-in-the-product',
      '^(core|functions|taskpane|workbook|manifest)/',
      '^test/',
      'nothing imports a test',
    ),
    {
      name: 'grid-behind-two-rooms',
      comment: 'the grid library stays behind the page host and the headless engine, which share one adapter',
      severity: 'error',
      from: { pathNot: '^(workbook/(page|engine|grid)/|test/)' },
      to: { path: '@univerjs/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '\\.generated\\.' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types'],
    },
  },
};

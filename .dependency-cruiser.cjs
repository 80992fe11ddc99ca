/**
 * The walls of the house: dependencies point down, app → components, app → lib → db.
 * A type may look over a wall, a value may not pass through.
 *
 * @type {import('dependency-cruiser').IConfiguration}
 */
module.exports = {
  forbidden: [
    {
      name: 'rules-are-pure',
      comment: 'lib/trade: values in, verdict out. No database, clock, network, environment, React.',
      severity: 'error',
      from: { path: '^lib/trade/' },
      to: { pathNot: '^lib/trade/' },
    },
    {
      name: 'evidence-is-pure',
      comment: 'lib/evidence: files in, facts out. No database, clock, network, environment, React.',
      severity: 'error',
      from: { path: '^lib/evidence/', pathNot: '^lib/evidence/open/' },
      to: { pathNot: ['^lib/(trade|evidence)/', 'node_modules/(zod|papaparse)/'] },
    },
    {
      name: 'only-opening-knows-file-formats',
      comment: 'lib/evidence/open turns bytes into pages of words; what follows reads words only.',
      severity: 'error',
      from: { path: '^lib/evidence/open/' },
      to: {
        pathNot: [
          '^lib/evidence/',
          'node_modules/(pdfjs-dist|tesseract[.]js|@tesseract[.]js-data|sharp|@napi-rs/canvas|mailparser|file-type)/',
          '^(node:)?(crypto|path|url|module|worker_threads|zlib)$',
        ],
      },
    },
    {
      name: 'lib-is-framework-free',
      comment:
        'The only code that knows Next is in app/. React is for documents, mails and the browser hooks.',
      severity: 'error',
      from: { path: '^(lib|db)/', pathNot: '^lib/(pdf/|mail/|[^/]+/render-[^/]+[.]tsx$)' },
      to: {
        // Not the jsx runtime: the cruiser takes a generic arrow function in a .ts file for markup.
        path: ['node_modules/(next|react-dom)/', 'node_modules/react/(?!jsx)', '^(app|components)/'],
      },
    },
    {
      name: 'lib-knows-no-screen',
      severity: 'error',
      from: { path: '^(lib|db|emails|fakes)/' },
      to: { path: '^(app|components)/' },
    },
    {
      name: 'pages-go-through-lib',
      comment:
        'Only the glue in app/_kit may open a transaction; the bare pages measure the database itself.',
      severity: 'error',
      from: { path: '^app/', pathNot: '^app/(_kit|dev/bare|api/dev/bare)/' },
      to: { path: '^db/' },
    },
    {
      name: 'components-hold-no-data-access',
      severity: 'error',
      from: { path: '^components/' },
      to: {
        path: [
          '^(db|app|fakes|emails)/',
          '^lib/env',
          '^lib/[^/]+/(queries|endpoints)',
          'node_modules/(pg|drizzle-orm)/',
        ],
      },
    },
    {
      name: 'components-never-reach-the-server',
      comment: 'Not even through a file between: it would put the database client into the browser.',
      severity: 'error',
      from: { path: '^components/' },
      to: { path: ['^db/', '^lib/env\\.ts$'], reachable: true },
    },
    {
      name: 'screens-read-the-tables-in-force',
      comment:
        'A shop may have its own edition of a table: screens of the shop ask useTables for it. The calculators of the bench, which need no shop, show the published ones.',
      severity: 'error',
      from: {
        path: '^components/',
        pathNot: '^components/reference/(use-tables|[a-z-]+-calculator)\\.tsx?$',
      },
      to: { path: '^lib/reference/(published|batch)-tables' },
    },
    {
      name: 'schema-imports-only-vocabulary',
      severity: 'error',
      from: { path: '^db/schema/' },
      to: { path: ['^db/client', '^lib/env\\.ts$', '^(app|components|emails|fakes)/'], reachable: true },
    },
    {
      name: 'mails-are-props-in-html-out',
      severity: 'error',
      from: { path: '^emails/' },
      to: { path: ['^db/', '^lib/[^/]+/(queries|endpoints)'] },
    },
    {
      name: 'fakes-have-one-door',
      comment: 'We speak to them by their protocol, never by import; and they know nothing of us.',
      severity: 'error',
      from: { path: '^(app|components|emails|lib|db)/' },
      to: { path: '^fakes/' },
    },
    {
      name: 'fakes-know-nothing-of-us',
      severity: 'error',
      from: { path: '^fakes/' },
      to: { path: '^(app|components|emails|lib|db)/' },
    },
    {
      name: 'nothing-imports-tests',
      severity: 'error',
      from: { path: '^(app|components|emails|lib|db|fakes)/' },
      to: { path: '^tests/' },
    },
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'everything-imported-exists',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'the-product-needs-no-test-tools',
      severity: 'error',
      from: { path: '^(app|components|emails|lib|db)/', pathNot: '^lib/stack/' },
      to: { dependencyTypes: ['npm-dev'], pathNot: 'node_modules/@types/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
    // Off: what only speaks of types is gone before anything runs, so it is no dependency.
    tsPreCompilationDeps: false,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types'],
    },
    cache: { folder: 'node_modules/.cache/dependency-cruiser', strategy: 'content' },
  },
};

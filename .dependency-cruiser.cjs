/**
 * Who may import whom. Every rule is made from the one list of `shared/features.json`; its name is the sentence a breach is
 * reported with, its comment the reason. `test/architecture/layers.spec.ts` plants a breach of each.
 */
const features = require('./shared/features.json');

const kernelSize = 7;
const beyondKernel = features.slice(kernelSize);

const anyOf = (names) => `(${names.join('|')})`;
const onAnySide = (names) => `^(shared|backend/src|frontend/src/app)/${anyOf(names)}/`;
const installed = (names) => `(^|/)node_modules/(@types/)?${anyOf(names)}/`;

const typesOnly = '(^|/)node_modules/@types/';
const spec = '\\.spec\\.ts$';
const testSupport = '^(test|frontend/src/test)/';
const schemaOrEndpoints = '^(shared/(endpoints|.+(-schema|-endpoints|/endpoint))|frontend/src/app/.+-schema)\\.ts$';
const calculator = '^shared/(?!endpoints\\.ts|.+(-schema|-endpoints|/endpoint)\\.ts).+\\.ts$';
const worker = '-worker\\.ts$';
const fileWorker = '^backend/src/(documents|invoices|rate-cards)/.*(paper|workbook)-worker\\.ts$';
const serverEntry = '^backend/src/[^/]+\\.ts$';
const pageEntry = '^frontend/src/(app/)?[^/]+\\.ts$';

/** What clients ask before their application is here must not bring it along, as the door would. */
const askedAhead = '^frontend/src/app/client-page/asked-ahead\\.ts$';

const never = (name, rule) => ({ name, severity: 'error', ...rule });

const order = features.slice(0, -1).map((feature, index) =>
  never(`${feature} imports only what stands before it in the list of features`, {
    comment: 'A reader who follows the list never meets a folder that needs one they have not seen.',
    from: { path: onAnySide([feature]) },
    to: { path: onAnySide(features.slice(index + 1)) },
  }),
);

const sides = [
  never('The shared side imports neither the server nor the page', {
    comment: 'What both sides import must run on both.',
    from: { path: '^shared/' },
    to: { path: '^(backend|frontend|seeders)/' },
  }),
  never('The page never imports the server', {
    comment: 'They meet in shared alone: server code would travel to the browser.',
    from: { path: '^frontend/' },
    to: { path: '^(backend|seeders)/' },
  }),
  never('The server never imports the page', {
    comment: 'They meet in shared alone.',
    from: { path: '^(backend|seeders)/' },
    to: { path: '^frontend/' },
  }),
  never('The page uses nothing of Node', {
    comment: 'The browser has no such modules.',
    from: { path: '^frontend/src/', pathNot: [spec, testSupport] },
    to: { dependencyTypes: ['core'] },
  }),
  never('The platform, the core and the common widgets know the kernel only', {
    comment: 'They carry every feature, so they may depend on none.',
    from: { path: '^(backend/src/platform|frontend/src/app/(core|ui))/' },
    to: { path: onAnySide(beyondKernel) },
  }),
];

const doors = [
  never('Server features meet at their door, index.ts', {
    comment: 'What stands behind the door may change without asking anybody.',
    from: { path: `^backend/src/${anyOf(features)}/` },
    to: {
      path: `^backend/src/${anyOf(features)}/`,
      pathNot: ['^backend/src/$1/', `^backend/src/${anyOf(features)}/index\\.ts$`],
    },
  }),
  never('Page features meet at their door, index.ts', {
    comment: 'What stands behind the door may change without asking anybody.',
    from: { path: `^frontend/src/app/${anyOf(features)}/` },
    to: {
      path: `^frontend/src/app/${anyOf(features)}/`,
      pathNot: ['^frontend/src/app/$1/', `^frontend/src/app/${anyOf(features)}/index\\.ts$`],
    },
  }),
  never('What joins the features goes through their doors', {
    comment: 'The entries stand outside the list, not outside the walls.',
    from: { path: [serverEntry, pageEntry], pathNot: spec },
    to: {
      path: `^(backend/src|frontend/src/app)/${anyOf(features)}/`,
      pathNot: ['/index\\.ts$', `^frontend/src/app/(${features.join('|')})/\\1-routes\\.ts$`, askedAhead],
    },
  }),
  never('The demonstration goes through the doors of the features', {
    comment: 'So that demonstration data obeys every rule of the services.',
    from: { path: '^seeders/' },
    to: { path: `^backend/src/${anyOf(features)}/`, pathNot: '/index\\.ts$' },
  }),
  never('A door of the page leads to widgets, never to pages', {
    comment: 'Pages are reached by their route, loaded when it is opened.',
    from: { path: `^frontend/src/app/${anyOf(features)}/index\\.ts$` },
    to: { path: '-page\\.ts$' },
  }),
  never('Nobody imports what joins the features', {
    comment: 'The entries import the features; a way back would be a cycle in all but name.',
    from: { path: `^(shared|backend/src|frontend/src/app)/[^/]+/`, pathNot: spec },
    to: {
      path: [
        '^backend/src/(app|main)\\.ts$',
        '^frontend/src/(main|client|start-client|app/(app|client-app|app-routes|app-config|client-config|client-bootstrap))\\.ts$',
        '^seeders/',
      ],
    },
  }),
  never('Only the server and the tests read the list of all endpoints', {
    comment: 'It pulls in every feature: the page imports the endpoints it calls.',
    from: { pathNot: [serverEntry, '^(backend/bin|test)/', spec] },
    to: { path: '^shared/endpoints\\.ts$' },
  }),
  never('Nothing that runs imports from the tests', {
    comment: 'Support for tests is not part of the product.',
    from: { pathNot: [spec, testSupport] },
    to: { path: [testSupport, spec] },
  }),
];

const techniques = [
  never('Express stays in routes and platform/http', {
    comment: 'Services are called by requests, tasks and seeders alike, so they know nothing of the web.',
    from: {
      pathNot: ['-routes\\.ts$', '^backend/src/platform/http/', '^backend/src/(app|main)\\.ts$', spec, testSupport],
    },
    to: { path: installed(['express', 'express-serve-static-core']) },
  }),
  never('Sequelize stays in repositories, models, migrations and platform/database', {
    comment: 'One place decides how rows are read, always with the workshop first.',
    from: {
      pathNot: [
        '-(repository|model)\\.ts$',
        '(^|/)migrations/',
        '^backend/src/platform/database/',
        '^backend/bin/own-database\\.mjs$',
        spec,
        testSupport,
      ],
    },
    to: { path: installed(['sequelize', 'mariadb', 'umzug']) },
  }),
  never('Zod stays in schemas, endpoints, forms, problems, platform/config, platform/http and the core of the page', {
    comment:
      'A calculation is given what a schema has let through; it does not ask again. Its types may be named anywhere.',
    from: {
      pathNot: [
        schemaOrEndpoints,
        '^shared/problems/',
        '^backend/src/platform/(config|http)/',
        '^frontend/src/((main|start-client)\\.ts$|app/core/|app/.*-form\\.ts$)',
        spec,
        testSupport,
      ],
    },
    to: { path: installed(['zod']), dependencyTypesNot: ['type-only'] },
  }),
  never('A route asks its service, never the rows', {
    comment: 'Route, service, repository: one request is read in that order.',
    from: { path: '^backend/src/.+-routes\\.ts$' },
    to: { path: '-(repository|model)\\.ts$' },
  }),
];

const calculators = [
  never('A calculator imports other calculators and decimal.js, nothing else', {
    comment: 'The same figures on both sides, today and in ten years, from the same input.',
    from: {
      path: calculator,
      pathNot: [spec, '^shared/problems/complaints-of\\.ts$', '^shared/words/say\\.ts$', '^shared/units/'],
    },
    to: { pathNot: ['^shared/', installed(['decimal\\.js'])] },
  }),
  never('A calculator needs no schema', {
    comment: 'Schemas say what may be entered; calculators own the plain types they work on.',
    from: { path: calculator, pathNot: [spec, '^shared/problems/'] },
    to: { path: schemaOrEndpoints },
  }),
  never('A complaint is read from zod alone', {
    comment: 'complaints-of.ts words what a schema found, and needs no other package.',
    from: { path: '^shared/problems/complaints-of\\.ts$' },
    to: { pathNot: ['^shared/', installed(['zod'])] },
  }),
  never('Words are formatted by intl-messageformat alone', {
    comment: 'say.ts is the one place that turns a code into a sentence.',
    from: { path: '^shared/words/say\\.ts$' },
    to: { pathNot: ['^shared/', installed(['intl-messageformat', '@formatjs'])] },
  }),
  never('Units are named and converted by convert-units alone', {
    comment: 'It serves the metric conversions; everything across systems goes through exact factors.',
    from: { path: '^shared/units/', pathNot: [spec, schemaOrEndpoints] },
    to: { pathNot: ['^shared/', installed(['convert-units', 'decimal\\.js'])] },
  }),
  never('A worker imports calculators only', {
    comment:
      'It carries no schema, no page and no database into its thread; what makes papers or reads workbooks brings its own feature.',
    from: { path: worker, pathNot: fileWorker },
    to: { pathNot: [calculator, '^(node:)?worker_threads$'] },
  }),
];

const fileThread = [
  never('A thread of papers or workbooks sees its own feature only', {
    comment: 'It is given everything a paper says, and asks nobody.',
    from: { path: fileWorker },
    to: { pathNot: ['^backend/src/$1/', '^(node:)?worker_threads$'] },
  }),
];

const everywhere = [
  never('No import runs in a circle', {
    comment: 'Neither half of a circle can be read first.',
    from: {},
    to: { circular: true },
  }),
  never('Every import leads somewhere', {
    comment: 'A path that does not resolve fails at the worst moment.',
    from: {},
    to: { couldNotResolve: true },
  }),
  never('Every package is named in package.json', {
    comment: 'A package that came along with another may leave with it.',
    from: {},
    to: { dependencyTypes: ['npm-no-pkg', 'npm-unknown'], pathNot: typesOnly },
  }),
  never('Nothing that runs needs a development package', {
    comment: 'The product is served without them.',
    from: { path: '^(shared|backend/src|frontend/src|seeders)/', pathNot: [spec, testSupport] },
    to: { dependencyTypes: ['npm-dev'], pathNot: typesOnly },
  }),
];

module.exports = {
  forbidden: [...order, ...sides, ...doors, ...techniques, ...calculators, ...fileThread, ...everywhere],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.all.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
};

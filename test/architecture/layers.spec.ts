import features from '../../shared/features.json';
import { plantedTree, type PlantedFiles } from './planted-tree';
import { runTool } from './run-tool';

interface Named {
  readonly name: string;
}

interface CruiseReport {
  readonly summary: {
    readonly violations: readonly { readonly from: string; readonly rule: Named }[];
    readonly ruleSetUsed: { readonly forbidden: readonly Named[] };
  };
}

const packages = ['express', 'sequelize', 'zod', 'decimal.js', 'intl-messageformat', 'convert-units', 'fast-check'];

const installedPackages: PlantedFiles = Object.fromEntries(
  [...packages, 'stray'].flatMap((name) => [
    [`node_modules/${name}/package.json`, JSON.stringify({ name, version: '1.0.0', main: 'index.js' })],
    [`node_modules/${name}/index.js`, 'module.exports = {};'],
  ]),
);

const ground = 'export const ground = 1;\n';
const imports = (...targets: readonly string[]) => targets.map((target) => `import '${target}';\n`).join('');

/** What every planted file may import, and what keeps every rule. */
const lawful: PlantedFiles = {
  ...Object.fromEntries(features.map((feature) => [`shared/${feature}/ground.ts`, ground])),
  ...Object.fromEntries(features.map((feature) => [`backend/src/${feature}/index.ts`, ground])),
  ...Object.fromEntries(features.map((feature) => [`frontend/src/app/${feature}/index.ts`, ground])),
  'shared/endpoints.ts': imports('#shared/jobs/jobs-endpoints', '#shared/invoices/ground'),
  'shared/jobs/job-schema.ts': imports('zod', '#shared/accounts/ground'),
  'shared/jobs/jobs-endpoints.ts': imports('zod', './job-schema', '#shared/actor/endpoint'),
  'shared/actor/endpoint.ts': imports('zod'),
  'shared/problems/complaints-of.ts': imports('zod', '#shared/words/ground'),
  'shared/problems/problem-schema.ts': imports('zod'),
  'shared/words/say.ts': imports('intl-messageformat', '#shared/words/ground'),
  'shared/units/length.ts': imports('convert-units', 'decimal.js', '#shared/money/ground'),
  'shared/leaf/leaf-order.ts': imports('decimal.js', '#shared/measure/ground', './ground'),
  'shared/leaf/leaf-order.spec.ts': imports('fast-check', './leaf-order', 'node:fs'),
  'backend/src/main.ts': imports('express', './app', '../../seeders/demonstration'),
  'backend/src/app.ts': imports('express', '#shared/endpoints', './jobs/index', './platform/http/problems'),
  'backend/src/platform/http/problems.ts': imports('express', 'zod', '#shared/problems/ground'),
  'backend/src/platform/database/connection.ts': imports('sequelize', 'node:fs'),
  'backend/src/jobs/job-routes.ts': imports('express', '#shared/jobs/jobs-endpoints', './job-service'),
  'backend/src/jobs/job-service.ts': imports('./job-repository', '../accounts/index', '#shared/jobs/ground'),
  'backend/src/jobs/job-repository.ts': imports('sequelize', './job-model'),
  'backend/src/jobs/job-model.ts': imports('sequelize'),
  'backend/migrations/0001-jobs.ts': imports('sequelize'),
  'backend/src/jobs/job-service.spec.ts': imports(
    'fast-check',
    './job-service',
    '../../../test/database/clean-database',
  ),
  'test/database/clean-database.ts': ground,
  'seeders/demonstration.ts': imports('../backend/src/jobs/index', '../backend/src/platform/database/connection'),
  'frontend/src/main.ts': imports('zod', './app/app-config'),
  'frontend/src/app/app-config.ts': imports('./app-routes'),
  'frontend/src/app/app-routes.ts': imports('./jobs/jobs-routes'),
  'frontend/src/app/core/form.ts': imports('zod', '#shared/problems/ground'),
  'frontend/src/app/ui/figure-table.ts': imports('#shared/units/length'),
  'frontend/src/app/jobs/jobs-routes.ts': imports('./job-page'),
  'frontend/src/app/jobs/job-page.ts': imports(
    '../accounts/index',
    '../ui/figure-table',
    '#shared/jobs/jobs-endpoints',
  ),
  'frontend/src/app/programme/risk-worker.ts': imports('#shared/programme/ground'),
  'backend/src/programme/risk-worker.ts': imports('node:worker_threads', '#shared/programme/ground'),
};

interface Breach {
  readonly rule: string;
  readonly at: string;
  readonly text: string;
}

const breach = (rule: string, at: string, ...targets: readonly string[]): Breach => ({
  rule,
  at,
  text: imports(...targets),
});

const looksAhead = (feature: string) => `${feature} imports only what stands before it in the list of features`;

const orderBreaches: readonly Breach[] = features
  .slice(0, -1)
  .map((feature, index) =>
    breach(looksAhead(feature), `shared/${feature}/planted-ahead.ts`, `#shared/${features[index + 1]}/ground`),
  );

const breaches: readonly Breach[] = [
  ...orderBreaches,
  breach(looksAhead('leaf'), 'backend/src/leaf/leaf-service.ts', '../estimates/index'),
  breach(looksAhead('leaf'), 'backend/src/leaf/leaf-policy.ts', '#shared/estimates/ground'),
  breach(looksAhead('leaf'), 'frontend/src/app/leaf/leaf-store.ts', '../client-page/index'),
  breach(
    'The shared side imports neither the server nor the page',
    'shared/jobs/planted-server.ts',
    '../../backend/src/actor/index',
  ),
  breach(
    'The shared side imports neither the server nor the page',
    'shared/jobs/planted-page.ts',
    '../../frontend/src/app/ui/figure-table',
  ),
  breach(
    'The page never imports the server',
    'frontend/src/app/jobs/job-store.ts',
    '../../../../backend/src/jobs/index',
  ),
  breach(
    'The server never imports the page',
    'backend/src/jobs/job-presenter.ts',
    '../../../frontend/src/app/jobs/index',
  ),
  breach('The page uses nothing of Node', 'frontend/src/app/jobs/job-files.ts', 'node:fs'),
  breach(
    'The platform, the core and the common widgets know the kernel only',
    'backend/src/platform/mail/planted.ts',
    '#shared/jobs/ground',
  ),
  breach(
    'The platform, the core and the common widgets know the kernel only',
    'backend/src/platform/tasks/planted.ts',
    '../../audit/index',
  ),
  breach(
    'The platform, the core and the common widgets know the kernel only',
    'frontend/src/app/core/planted.ts',
    '#shared/leaf/ground',
  ),
  breach(
    'The platform, the core and the common widgets know the kernel only',
    'frontend/src/app/ui/planted.ts',
    '../leaf/index',
  ),
  breach(
    'Server features meet at their door, index.ts',
    'backend/src/estimates/estimate-service.ts',
    '../jobs/job-service',
  ),
  breach(
    'Page features meet at their door, index.ts',
    'frontend/src/app/estimates/estimate-page.ts',
    '../jobs/job-page',
  ),
  breach('What joins the features goes through their doors', 'backend/src/app-planted.ts', './jobs/job-service'),
  breach('What joins the features goes through their doors', 'frontend/src/app/app.ts', './jobs/job-page'),
  breach(
    'The demonstration goes through the doors of the features',
    'seeders/planted.ts',
    '../backend/src/jobs/job-repository',
  ),
  breach('A door of the page leads to widgets, never to pages', 'frontend/src/app/survey/index.ts', './survey-page'),
  breach('Nobody imports what joins the features', 'backend/src/jobs/job-policy.ts', '../app'),
  breach('Nobody imports what joins the features', 'frontend/src/app/jobs/job-clock.ts', '../app-config'),
  breach(
    'Only the server and the tests read the list of all endpoints',
    'frontend/src/app/jobs/job-client.ts',
    '#shared/endpoints',
  ),
  breach(
    'Nothing that runs imports from the tests',
    'backend/src/jobs/planted-presenter.ts',
    '../../../test/database/clean-database',
  ),
  breach('Nothing that runs imports from the tests', 'shared/jobs/planted-test.ts', '#shared/leaf/leaf-order.spec'),
  breach('Express stays in routes and platform/http', 'backend/src/jobs/web-service.ts', 'express'),
  breach('Express stays in routes and platform/http', 'backend/src/platform/session/planted.ts', 'express'),
  breach(
    'Sequelize stays in repositories, models, migrations and platform/database',
    'backend/src/jobs/rows-service.ts',
    'sequelize',
  ),
  breach(
    'Zod stays in schemas, endpoints, forms, problems, platform/config, platform/http and the core of the page',
    'backend/src/jobs/checks-service.ts',
    'zod',
  ),
  breach('A route asks its service, never the rows', 'backend/src/jobs/rows-routes.ts', './job-repository'),
  breach(
    'A calculator imports other calculators and decimal.js, nothing else',
    'shared/leaf/planted-schema-use.ts',
    'zod',
  ),
  {
    rule: 'A calculator imports other calculators and decimal.js, nothing else',
    at: 'shared/leaf/planted-type.ts',
    text: "import type { ZodType } from 'zod';\nexport type Planted = ZodType;\n",
  },
  breach(
    'A calculator imports other calculators and decimal.js, nothing else',
    'shared/leaf/planted-node.ts',
    'node:fs',
  ),
  breach(
    'A calculator imports other calculators and decimal.js, nothing else',
    'shared/leaf/planted-units.ts',
    'convert-units',
  ),
  breach('A calculator needs no schema', 'shared/jobs/planted-calculator.ts', './job-schema'),
  breach('A calculator needs no schema', 'shared/jobs/planted-caller.ts', './jobs-endpoints'),
  { rule: 'A complaint is read from zod alone', at: 'shared/problems/complaints-of.ts', text: imports('decimal.js') },
  { rule: 'Words are formatted by intl-messageformat alone', at: 'shared/words/say.ts', text: imports('decimal.js') },
  breach('Units are named and converted by convert-units alone', 'shared/units/planted.ts', 'intl-messageformat'),
  breach('A worker imports calculators only', 'frontend/src/app/estimates/tally-worker.ts', '#shared/jobs/job-schema'),
  breach('A worker imports calculators only', 'backend/src/estimates/tally-worker.ts', 'sequelize'),
  {
    rule: 'A thread of papers or workbooks sees its own feature only',
    at: 'backend/src/documents/paper-worker.ts',
    text: imports('sequelize'),
  },
  breach(
    'A thread of papers or workbooks sees its own feature only',
    'backend/src/invoices/invoice-paper-worker.ts',
    '../jobs',
  ),
  breach('No import runs in a circle', 'shared/jobs/planted-circle.ts', './planted-half'),
  breach('Every import leads somewhere', 'shared/jobs/planted-astray.ts', '#shared/measure/nowhere'),
  breach('Every package is named in package.json', 'backend/src/jobs/stray-service.ts', 'stray'),
  breach('Nothing that runs needs a development package', 'backend/src/jobs/chance-service.ts', 'fast-check'),
];

/** Files that a breach needs to exist, lawful in themselves. */
const accomplices: PlantedFiles = {
  'frontend/src/app/survey/survey-page.ts': ground,
  'shared/jobs/planted-half.ts': imports('./planted-circle'),
};

const copied = [
  '.dependency-cruiser.cjs',
  'package.json',
  'tsconfig.json',
  'tsconfig.all.json',
  'shared/features.json',
];
const folders = ['frontend/src', 'backend', 'shared', 'seeders', 'test'];

/** What the rules say about these files, and which rules there are. */
function cruised(files: PlantedFiles) {
  const tree = plantedTree(copied, { ...installedPackages, ...files });
  try {
    const args = ['--config', '.dependency-cruiser.cjs', '--output-type', 'json', ...folders];
    const { summary } = runTool('dependency-cruiser/bin/dependency-cruise.mjs', args, tree.folder) as CruiseReport;
    return {
      complaints: summary.violations.map(({ from, rule }) => `${from}: ${rule.name}`),
      ruleNames: summary.ruleSetUsed.forbidden.map(({ name }) => name),
    };
  } finally {
    tree.remove();
  }
}

describe('The rules of who may import whom', () => {
  const broken = Object.fromEntries(breaches.map(({ at, text }) => [at, text]));
  let complaints: readonly string[] = [];
  let ruleNames: readonly string[] = [];

  beforeAll(() => {
    ({ complaints, ruleNames } = cruised({ ...lawful, ...accomplices, ...broken }));
  }, 60_000);

  it('leave a tree that keeps them in peace', () => {
    expect(cruised(lawful).complaints).toEqual([]);
  }, 60_000);

  it.each(breaches.map(({ rule, at }) => [rule, at]))('%s (%s)', (rule, at) => {
    expect(complaints).toContain(`${at}: ${rule}`);
  });

  it('are each broken by at least one planted file', () => {
    const planted = new Set(breaches.map(({ rule }) => rule));
    expect(ruleNames.length).toBeGreaterThan(40);
    expect(ruleNames.filter((name) => !planted.has(name))).toEqual([]);
  });

  it('have names that are sentences, each its own', () => {
    expect(new Set(ruleNames).size).toBe(ruleNames.length);
    expect(ruleNames.filter((name) => name.split(' ').length < 4)).toEqual([]);
  });
});

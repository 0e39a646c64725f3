import { request as ask } from 'node:http';
import type { AddressInfo } from 'node:net';
import request from 'supertest';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

/** What strangers try on every server: settings, sources, backups, consoles, figures, documents of the API (ASVS 13.4.1 to 13.4.5). */
const folders = ['', '/api', '/assets', '/static', '/admin', '/public'];
const names = [
  ...['.env', '.env.local', '.env.production', '.env.bak', '.git', '.git/HEAD', '.git/config', '.gitignore'],
  ...['.svn/entries', '.hg/store', '.DS_Store', '.htaccess', '.htpasswd', '.npmrc', '.ssh/id_rsa', '.aws/credentials'],
  ...['.dockerenv', '.ci/run', '.idea/workspace.xml', '.vscode/settings.json', '.well-known/security.txt.bak'],
  ...['package.json', 'package-lock.json', 'node_modules/express/package.json', 'tsconfig.json', 'angular.json'],
  ...['Dockerfile', 'docker-compose.yml', 'Makefile', 'README.md', 'DEVELOPERS.md', 'LICENSE', 'CHANGELOG.md'],
  ...['config.json', 'config.yml', 'settings.json', 'secrets.json', 'credentials.json', 'database.sql', 'dump.sql'],
  ...[
    'backup.zip',
    'backup.tar.gz',
    'db.sqlite',
    'site.zip',
    'index.html~',
    'index.html.bak',
    'main.js.map',
    'main.ts',
  ],
  ...['metrics', 'prometheus', 'actuator', 'actuator/env', 'actuator/heapdump', 'server-status', 'server-info'],
  ...['status', 'stats', 'debug', 'debug/pprof', 'trace', 'console', 'phpinfo.php', 'info.php', 'test.php', 'env'],
  ...['api-docs', 'swagger', 'swagger.json', 'swagger-ui', 'swagger-ui.html', 'v2/api-docs', 'v3/api-docs', 'redoc'],
  ...['graphql', 'graphiql', 'playground', 'explorer', 'rpc', 'jsonrpc', 'xmlrpc.php', 'soap', 'wsdl'],
  ...['admin.php', 'administrator', 'phpmyadmin', 'adminer.php', 'wp-admin', 'wp-login.php', 'cgi-bin/test.cgi'],
  ...['login.action', 'manager/html', 'jenkins', 'solr', 'elmah.axd', 'trace.axd', 'web.config', 'WEB-INF/web.xml'],
  ...['server.js', 'main.js', 'dist/server/main.js', 'backend/src/app.ts', 'server/main.js', 'seed', 'reset', 'test'],
  ...['dump', 'logs', 'log', 'error.log', 'access.log', 'npm-debug.log', 'tmp', 'upload', 'uploads', 'files', 'data'],
];
const paths = folders.flatMap((folder) => names.map((name) => `${folder}/${name}`));

let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

/** Texts that only a file of ours, a listing or a fault could hold. */
const leaks =
  /SESSION_SECRET|DATABASE_URL|"dependencies"|\[core\]|Index of \/|at Object\.|node_modules|BEGIN [A-Z ]*PRIVATE/;

const together = 40;

async function found(visitor: Visitor, asked: readonly string[]): Promise<string[]> {
  const answers: string[] = [];
  for (let from = 0; from < asked.length; from += together) {
    const some = asked.slice(from, from + together);
    const all = await Promise.all(some.map(async (path) => ({ path, ...(await answerTo(visitor, path)) })));
    const wrong = all.filter(({ status, text }) => ![401, 404].includes(status) || leaks.test(text));
    answers.push(...wrong.map(({ status, path }) => `${status} ${path}`));
  }
  return answers;
}

async function answerTo(visitor: Visitor, path: string): Promise<{ status: number; text: string }> {
  const { status, text } = await visitor.request('get', path);
  return { status, text };
}

test('a list of what strangers try finds nothing, for them or for an owner', async () => {
  expect(paths.length).toBeGreaterThan(600);
  expect(await found(await api.stranger(), paths)).toEqual([]);
  expect(await found(api.as('owner'), paths.slice(0, 2 * names.length))).toEqual([]);
}, 120_000);

test('the same question finds what is there', async () => {
  expect((await request(api.app.web.express).get('/')).status).toBe(200);
  expect((await request(api.app.web.express).get('/healthz')).status).toBe(200);
});

test('the documents of the API are where they are meant to be, and name no secret', async () => {
  const { status, text } = await request(api.app.web.express).get('/api/openapi.json');
  expect(status).toBe(200);
  expect(text).not.toMatch(leaks);
});

test.each(['TRACE', 'TRACK', 'PROPFIND', 'SEARCH', 'DEBUG'])('%s echoes nothing, sent as it is', async (method) => {
  const server = api.app.web.express.listen(0, '127.0.0.1');
  try {
    await new Promise((ready) => server.once('listening', ready));
    const { port } = server.address() as AddressInfo;
    const { status, body } = await new Promise<{ status: number; body: string }>((done, fail) => {
      const sent = ask(
        { port, method, path: '/api/people', headers: { 'x-canary': 'heron-in-a-header' } },
        (answer) => {
          let text = '';
          answer.on('data', (part: Buffer) => (text += part.toString()));
          answer.on('end', () => done({ status: answer.statusCode ?? 0, body: text }));
        },
      );
      sent.on('error', (error: NodeJS.ErrnoException) =>
        // The parser of Node knows no TRACK or DEBUG, and hangs up: that is no echo either.
        error.code === 'ECONNRESET' || error.code === 'HPE_INVALID_METHOD'
          ? done({ status: 400, body: '' })
          : fail(error),
      );
      sent.end();
    });
    expect(status).toBeGreaterThanOrEqual(400);
    expect(status).toBeLessThan(500);
    expect(body).not.toContain('heron-in-a-header');
  } finally {
    server.close();
  }
});

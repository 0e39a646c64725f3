/** Starts everything: builds what changed, starts the database and the server, and stops again what it started. */
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { buildWhatChanged, watchPages } from './build.mjs';
import { watchServer } from './build-server.mjs';
import { lockFolder, secretsOf } from './data-folder.mjs';
import { isFree } from './free-port.mjs';
import { startOwnDatabase } from './own-database.mjs';
import { startServer } from './server-process.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const [watches, seedsOnly] = ['--watch', '--seed'].map((flag) => process.argv.includes(flag));
const port = Number(process.env.PORT ?? 8080);
const dataFolder = process.env.DATA_DIR ?? join(root, 'data');
const longestEnding_milliseconds = 10_000;
const say = (text) => console.log(text);

/** What was started, in the order to be stopped in. */
const toStop = [];
let stopping;

function stopAll(code) {
  stopping ??= (async () => {
    for (const stop of toStop.reverse()) await stop();
    process.exit(code);
  })();
  return stopping;
}

/** The server of a start that was killed still has the port, and ends by itself. */
function isFreeSoon() {
  say('Waiting until the server of the start before has ended …');
  return isFree(port, longestEnding_milliseconds);
}

async function prepare() {
  if (!Number.isInteger(port) || port < 1 || port > 65_535)
    throw new Error(`PORT must be a number from 1 to 65535, not ${process.env.PORT}.`);
  if (seedsOnly && process.env.DATABASE_URL)
    throw new Error('The demonstration is only put into a database of our own, never into a DATABASE_URL.');
  const { leave, wasKilled } = lockFolder(dataFolder, port);
  toStop.push(leave);
  if (!seedsOnly && !(await isFree(port)) && !(wasKilled && (await isFreeSoon())))
    throw new Error(`Port ${port} is taken by another program. Choose another one: PORT=${port + 1} npm start`);
  await buildWhatChanged(say, { withPages: !seedsOnly });
}

/** The settings the server is started with: of the database named in the environment, else of our own. */
async function environmentOf() {
  const base = {
    ...process.env,
    PORT: String(port),
    DATA_DIR: dataFolder,
    WEB_DIR: join(root, 'dist/web'),
    NODE_ENV: watches ? 'development' : 'production',
  };
  if (process.env.DATABASE_URL) return base;
  const secrets = secretsOf(dataFolder);
  const { server, databaseUrl, migrationUrl } = await startOwnDatabase(dataFolder, secrets);
  toStop.push(() => server.stop());
  server.child.once('exit', () => {
    if (!stopping) say('The database has ended unexpectedly.');
    void stopAll(1);
  });
  return {
    ...base,
    DATABASE_URL: databaseUrl,
    MIGRATION_DATABASE_URL: migrationUrl,
    SESSION_SECRET: process.env.SESSION_SECRET ?? secrets.session,
    LOG_FILE: process.env.LOG_FILE ?? join(dataFolder, 'server.log'),
    DEMONSTRATION_PASSWORD: secrets.demonstration,
    ...(seedsOnly ? { SEED_ONLY: 'yes' } : {}),
  };
}

function tell({ demonstration, mail }) {
  say(`\nBolewright is ready: http://127.0.0.1:${port}/`);
  if (demonstration) {
    say(`\nDemonstration sign-ins, all with the password “${demonstration.password}”:`);
    for (const { email, role } of demonstration.people) say(`  ${email.padEnd(36)} ${role}`);
  }
  if (mail) say(`\nMail is caught here and goes nowhere: http://127.0.0.1:${port}${mail}`);
  say('\nCtrl+C ends it.');
}

async function seed(environment) {
  const code = await startServer(environment).ended;
  if (code === 0) say('The demonstration is in place; npm start shows its sign-ins.');
  await stopAll(code);
}

async function serve(environment) {
  let current = startServer(environment);
  let restarting = false;
  toStop.push(() => current.stop());
  const watchEnd = () => void current.ended.then((code) => restarting || stopAll(code));
  watchEnd();
  tell(await current.ready);
  if (!watches) return;
  const restart = async () => {
    restarting = true;
    await current.stop();
    current = startServer(environment);
    restarting = false;
    watchEnd();
    await current.ready.then(
      () => say('The server is back.'),
      () => undefined,
    );
  };
  toStop.push(watchPages());
  let isFirst = true;
  toStop.push(await watchServer(() => (isFirst ? (isFirst = false) : void restart())));
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stopAll(0));

try {
  await prepare();
  const environment = await environmentOf();
  if (stopping) await stopping;
  else if (seedsOnly) await seed(environment);
  else await serve(environment);
} catch (error) {
  if (!stopping) console.error(error.message);
  await stopAll(1);
}

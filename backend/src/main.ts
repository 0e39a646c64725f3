import { migrations } from '../migrations';
import { openApp } from './app';
import { systemClock } from './platform/clock/clock';
import { readConfig } from './platform/config/config';
import { unsafeSettings } from './platform/database/durability';
import { migrate } from './platform/database/migrate';
import { listen, stopListening } from './platform/listening-server';
import { openLog } from './platform/log/log';
import { openPlatform } from './platform/open-platform';

const sweepEvery_milliseconds = 15 * 60_000;

/** Starts the server as the environment says, and answers how to stop it again. */
async function start(): Promise<() => Promise<void>> {
  const config = readConfig(process.env);
  const log = openLog(config.logLevel);
  await migrate(config.migrationDatabaseUrl, migrations);
  const platform = openPlatform(config, systemClock, log);
  const unsafe = await unsafeSettings(platform.database);
  if (unsafe.length > 0 && !config.mayBeUnsafe)
    throw new Error(`The database could lose what it has confirmed: ${unsafe.join(', ')}.`);
  const app = openApp(platform);
  const server = await listen(app.web, config.port);
  platform.tasks.start();
  const sweeping = setInterval(
    () => void app.web.sweep().catch((error: unknown) => log.error({ error }, 'sweeping failed')),
    sweepEvery_milliseconds,
  );
  log.info({ port: config.port }, 'ready');
  process.send?.({ ready: true });
  return async () => {
    clearInterval(sweeping);
    await stopListening(server, app.web);
    await platform.tasks.stop();
    await platform.database.close();
  };
}

start().then(
  (stop) => {
    let stopping = false;
    const end = (): void => {
      if (stopping) return;
      stopping = true;
      void stop().then(() => process.exit(0));
    };
    process.on('SIGTERM', end).on('SIGINT', end).on('disconnect', end);
  },
  (error: unknown) => {
    process.stderr.write(`${(error as Error).message}\n`);
    process.exit(1);
  },
);

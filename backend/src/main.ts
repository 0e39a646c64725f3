import { join } from 'node:path';
import { demonstrationPeople } from '../../seeders/demonstration-people';
import { seedDemonstration } from '../../seeders/seed-demonstration';
import { takePaymentEvent } from '#shared/invoices/payments-endpoints';
import { migrations } from '../migrations';
import { openApp, type App } from './app';
import { StandInPayments } from './platform/card-payments/stand-in-payments';
import { StripePayments } from './platform/card-payments/stripe-payments';
import { systemClock } from './platform/clock/clock';
import { readConfig, type Config } from './platform/config/config';
import { refuseUnsafeSettings } from './platform/database/unsafe-settings';
import { migrate } from './platform/database/migrate';
import { startFailure } from './platform/database/start-failure';
import { listen, stopListening } from './platform/listen';
import { logDestination, openLog } from './platform/log/log';
import { MailCatcher } from './platform/mail/mail-catcher';
import { openPlatform } from './platform/open-platform';
import type { Platform } from './platform/platform';

const sweepEvery_milliseconds = 15 * 60_000;

/** Mail goes to the server that is configured; without one it is caught and shown on the machine itself. */
async function connectMail({ config, mailbox }: Platform): Promise<MailCatcher | undefined> {
  if (config.smtpUrl) return void mailbox.connect(config.smtpUrl);
  if (config.seedsOnly) return undefined;
  const catcher = new MailCatcher(join(config.dataFolder, 'mail'));
  mailbox.connect(await catcher.start(), false);
  return catcher;
}

/** Cards are charged by the service whose keys are set; without any, on a machine nobody else reaches, one stands in for it. */
async function connectCards({ config, cards, clock }: Platform): Promise<StandInPayments | undefined> {
  if (config.stripe || config.publicUrl || config.seedsOnly) return undefined;
  const events = `http://127.0.0.1:${config.port}${takePaymentEvent.path}`;
  const standIn = new StandInPayments({
    now: () => clock.now(),
    deliver: async ({ bytes, signature }) => {
      const headers = { 'content-type': 'application/json', [takePaymentEvent.signature]: signature };
      await fetch(events, { method: 'POST', headers, body: new Uint8Array(bytes) });
    },
  });
  const { secretKey, webhookSecret } = standIn;
  cards.connect(new StripePayments({ secretKey, webhookSecret, at: await standIn.start() }));
  return standIn;
}

/** What whoever started the server may tell its user. */
const readyMessage = ({ demonstrationPassword, publicUrl }: Config, catcher: MailCatcher | undefined) => ({
  demonstration: demonstrationPassword && {
    password: demonstrationPassword,
    people: demonstrationPeople.map(({ email, roles }) => ({ email, role: roles.join(', ') })),
  },
  mail: catcher && !publicUrl ? '/development/mail' : undefined,
});

function sweepNowAndThen(app: App, { log }: Platform): NodeJS.Timeout {
  const sweep = () => void app.sweep().catch((error: unknown) => log.error({ error }, 'sweeping failed'));
  return setInterval(sweep, sweepEvery_milliseconds);
}

/** Starts the server as the environment says, and answers how to stop it again. */
async function start(): Promise<() => Promise<void>> {
  const config = readConfig(process.env);
  await migrate(config.migrationDatabaseUrl, migrations).catch((error: unknown) => {
    throw startFailure(error, config.migrationDatabaseUrl);
  });
  const platform = openPlatform(config, systemClock, openLog(config.logLevel, logDestination(config.logFile)));
  await refuseUnsafeSettings(platform.database, config.mayBeUnsafe);
  const catcher = await connectMail(platform);
  const standIn = await connectCards(platform);
  const app = openApp(platform, catcher);
  if (config.demonstrationPassword) await seedDemonstration(app, platform, config.demonstrationPassword);
  if (config.seedsOnly) return () => platform.database.close();
  const server = await listen(app.web, config.port);
  platform.tasks.start();
  const sweeping = sweepNowAndThen(app, platform);
  process.send?.(readyMessage(config, catcher));
  return async () => {
    clearInterval(sweeping);
    await stopListening(server, app.web);
    await platform.tasks.stop();
    await standIn?.stop();
    await catcher?.stop();
    await platform.database.close();
  };
}

function stopWhenAsked(stop: () => Promise<void>): void {
  let stopping = false;
  const end = (): void => {
    if (stopping) return;
    stopping = true;
    void stop().then(() => process.exit(0));
  };
  process.on('SIGTERM', end).on('SIGINT', end).on('disconnect', end);
  if (process.env['SEED_ONLY']) end();
}

start().then(stopWhenAsked, (error: unknown) => {
  process.stderr.write(`${(error as Error).message}\n`);
  process.exit(1);
});

import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import request from 'supertest';
import { takePaymentEvent } from '#shared/invoices/payments-endpoints';
import type { Role } from '#shared/actor/role';
import { openApp, type App } from '../../backend/src/app';
import { readConfig } from '../../backend/src/platform/config/config';
import { openLog } from '../../backend/src/platform/log/log';
import { StandInPayments } from '../../backend/src/platform/card-payments/stand-in-payments';
import { StripePayments } from '../../backend/src/platform/card-payments/stripe-payments';
import { MailCatcher, type CaughtMail } from '../../backend/src/platform/mail/mail-catcher';
import { openPlatform } from '../../backend/src/platform/open-platform';
import type { Platform } from '../../backend/src/platform/platform';
import { freshDatabase } from '../database/fresh-database';
import { canary } from './canary';
import { faultsOfLog } from './faults-of-log';
import { contractFaults, ledgerFaults } from './ledger';
import { MovingClock } from './moving-clock';
import { addPerson, openWorkshop, type Door, type TestPerson, type TestWorkshop } from './test-workshop';
import { Visitor } from './visitor';

export { canary } from './canary';
export { password, type TestPerson, type TestWorkshop } from './test-workshop';

/** A whole server but for the socket, on a database of its own, with two workshops. */
export interface Api {
  readonly app: App;
  readonly platform: Platform;
  readonly clock: MovingClock;
  /** What stands in for the payment service. */
  readonly standIn: StandInPayments;
  ours: TestWorkshop;
  /** Another workshop, whose every text carries the canary. */
  readonly theirs: TestWorkshop;
  /** What was logged, a line each. */
  readonly logLines: string[];
  /** Ours is from now on a workshop in which nothing was done yet: sooner there than another server on another database. */
  another(): Promise<void>;
  /** Somebody of our workshop, signed in. */
  as(role: Role): Visitor;
  /** Somebody new in a workshop, signed in, for tests that change who they are. */
  newcomer(workshop: TestWorkshop, role: Role): Promise<TestPerson>;
  /** Somebody who is not signed in; headers such as another address behind the proxy go with all they ask. */
  stranger(headers?: Readonly<Record<string, string>>): Promise<Visitor>;
  /** Does the work behind the scenes and answers the mails, newest first. */
  mails(): Promise<CaughtMail[]>;
  /**
   * Ends it, and fails where the books of a workshop do not agree, or its log holds a secret or an event that is not one line
   * (ASVS 16.2.5, 16.4.1). Every spec and every journey ends by it.
   */
  stop(): Promise<void>;
}

type Environment = Readonly<Record<string, string>>;

const settings = {
  SESSION_SECRET: 'a secret that only the tests know, of no use elsewhere',
  REQUESTS_PER_MINUTE: '1000000',
};

/** The payment service that stands in, telling its events to the server as if from outside. */
async function standInFor({ cards, clock }: Platform, app: App): Promise<StandInPayments> {
  const standIn = new StandInPayments({
    now: () => clock.now(),
    deliver: async ({ bytes, signature }) => {
      const post = request(app.web.express).post(takePaymentEvent.path).set('content-type', 'application/json');
      await post.set(takePaymentEvent.signature, signature).send(bytes.toString('utf8'));
    },
  });
  const { secretKey, webhookSecret } = standIn;
  cards.connect(new StripePayments({ secretKey, webhookSecret, at: await standIn.start() }));
  return standIn;
}

async function openParts(environment: Environment) {
  const folder = await mkdtemp(join(tmpdir(), 'bolewright-api-'));
  const places = { DATABASE_URL: await freshDatabase(), DATA_DIR: folder, WEB_DIR: join(folder, 'web') };
  await mkdir(places.WEB_DIR);
  await writeFile(join(places.WEB_DIR, 'index.html'), '<!doctype html><app-root ngCspNonce="CSP_NONCE"></app-root>');
  const config = readConfig({ ...settings, ...places, ...environment });
  const logLines: string[] = [];
  const clock = new MovingClock();
  const platform = openPlatform(config, clock, openLog('info', { write: (line: string) => void logLines.push(line) }));
  const catcher = new MailCatcher(join(folder, 'mail'));
  platform.mailbox.connect(await catcher.start(), false);
  const app = openApp(platform, catcher);
  const standIn = await standInFor(platform, app);
  const stop = async () => {
    await standIn.stop();
    await catcher.stop();
    const { database } = platform;
    try {
      const books = await Promise.all([ledgerFaults(database), contractFaults(app, database)]);
      const faults = [...books.flat(), ...faultsOfLog(logLines)];
      if (faults.length > 0) throw new Error(`The books or the log of this run: ${faults.slice(0, 5).join('; ')}`);
    } finally {
      await database.close();
      await rm(folder, { recursive: true, force: true });
    }
  };
  return { platform, clock, logLines, catcher, standIn, app, stop };
}

const openWorkshops = async (door: Door) => ({
  ours: await openWorkshop(door, 'Herons'),
  theirs: await openWorkshop(door, canary),
});

/** Starts it; `environment` overrides settings, `headers` go with all that the signed-in people ask. */
export async function startApi(environment: Environment = {}, headers: Environment = {}): Promise<Api> {
  const { catcher, ...parts } = await openParts(environment);
  const { app, platform } = parts;
  const door = { app, platform, headers };
  const workshops = await openWorkshops(door).catch(async (error: unknown) => {
    await parts.stop();
    throw error;
  });
  let opened = 1;
  const api: Api = {
    ...parts,
    ...workshops,
    another: async () => {
      opened += 1;
      api.ours = await openWorkshop(door, `Herons-${opened}`);
    },
    as: (role) => api.ours.people[role].visitor,
    newcomer: (workshop, role) => addPerson(door, { workshop, role }),
    stranger: (own) => new Visitor(app.web.express, own ?? headers).arrive(),
    mails: async () => {
      await platform.tasks.runDue();
      return catcher.mails();
    },
  };
  return api;
}

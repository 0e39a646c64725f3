import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { roles, type Role } from '#shared/actor/role';
import { openApp, type App } from '../../backend/src/app';
import { readConfig } from '../../backend/src/platform/config/config';
import { openLog } from '../../backend/src/platform/log/log';
import { MailCatcher, type CaughtMail } from '../../backend/src/platform/mail/mail-catcher';
import { openPlatform } from '../../backend/src/platform/open-platform';
import type { Platform } from '../../backend/src/platform/platform';
import { freshDatabase } from '../database/fresh-database';
import { MovingClock } from './moving-clock';
import { Visitor } from './visitor';

/** Every text of the other workshop carries this word: it must never appear in an answer to ours. */
export const canary = 'Kanarienvogel';
export const password = 'seven grey herons wade';

export interface TestPerson {
  readonly role: Role;
  readonly accountId: string;
  readonly membershipId: string;
  readonly email: string;
  readonly visitor: Visitor;
}

/** A workshop with one person of each role, all signed in. */
export interface TestWorkshop {
  readonly id: string;
  readonly name: string;
  readonly people: Readonly<Record<Role, TestPerson>>;
}

/** A whole server on a database of its own, with two workshops. */
export interface Api {
  readonly app: App;
  readonly platform: Platform;
  readonly clock: MovingClock;
  readonly ours: TestWorkshop;
  readonly theirs: TestWorkshop;
  /** Somebody of our workshop. */
  as(role: Role): Visitor;
  /** Somebody who is not signed in; with headers, such as another address behind the proxy. */
  stranger(headers?: Readonly<Record<string, string>>): Promise<Visitor>;
  /** Does the work behind the scenes and answers the mails, newest first. */
  mails(): Promise<CaughtMail[]>;
  readonly logLines: string[];
  stop(): Promise<void>;
}

const founding = {
  currency: 'EUR',
  locale: 'en-GB',
  lengthUnit: 'mm',
  timeZone: 'Europe/Vienna',
  paperSize: 'A4',
  country: 'AT',
} as const;

async function openWorkshop(app: App, platform: Platform, mark: string): Promise<TestWorkshop> {
  const name = `${mark} Carvers`;
  const welcome = async (role: Role) => {
    const email = `${role}@${mark.toLowerCase()}.example`;
    const account = await app.accounts.newcomers.welcome(
      { name: `${mark} ${role}`, email, password, address: 'test' },
      name,
    );
    return { role, accountId: account.id, name: account.name, email, roles: [role] };
  };
  return platform.database.transaction(async () => {
    const [owner, ...others] = await Promise.all(roles.map(welcome));
    const id = await app.accounts.workshops.found(owner!, { name, ...founding });
    for (const person of others) await app.accounts.workshops.join(id, person);
    const rows = await app.accounts.people.list(id);
    const people = await Promise.all(
      [owner!, ...others].map(async ({ role, accountId, email }) => {
        const membershipId = rows.find((row) => row.accountId === accountId)!.id;
        return [role, { role, accountId, membershipId, email, visitor: new Visitor(app.web.express) }] as const;
      }),
    );
    return { id, name, people: Object.fromEntries(people) as Record<Role, TestPerson> };
  });
}

async function signInAll(workshop: TestWorkshop): Promise<void> {
  for (const { visitor, email } of Object.values(workshop.people)) {
    const response = await visitor.signIn(email, password);
    if (response.status !== 200) throw new Error(`${email} could not sign in: ${response.status} ${response.text}`);
  }
}

/** Starts everything but the socket; `environment` overrides settings. */
export async function startApi(environment: Readonly<Record<string, string>> = {}): Promise<Api> {
  const folder = await mkdtemp(join(tmpdir(), 'bolewright-api-'));
  const config = readConfig({
    DATABASE_URL: await freshDatabase(),
    DATA_DIR: folder,
    WEB_DIR: join(folder, 'web'),
    SESSION_SECRET: 'a secret that only the tests know, of no use elsewhere',
    REQUESTS_PER_MINUTE: '1000000',
    ...environment,
  });
  const logLines: string[] = [];
  const log = openLog('info', { write: (line: string) => void logLines.push(line) });
  const clock = new MovingClock();
  const platform = openPlatform(config, clock, log);
  const catcher = new MailCatcher(join(folder, 'mail'));
  platform.mailbox.connect(await catcher.start(), false);
  const app = openApp(platform, catcher);
  const ours = await openWorkshop(app, platform, 'Herons');
  const theirs = await openWorkshop(app, platform, canary);
  await signInAll(ours);
  await signInAll(theirs);
  return {
    app,
    platform,
    clock,
    ours,
    theirs,
    logLines,
    as: (role) => ours.people[role].visitor,
    stranger: (headers) => new Visitor(app.web.express, headers).arrive(),
    mails: async () => {
      await platform.tasks.runDue();
      return catcher.mails();
    },
    stop: async () => {
      await catcher.stop();
      await platform.database.close();
      await rm(folder, { recursive: true, force: true });
    },
  };
}

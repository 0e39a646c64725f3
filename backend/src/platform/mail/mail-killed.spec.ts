import { fork } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { SMTPServer } from 'smtp-server';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { builtProgram } from '../../../../test/programs/built-program';
import { systemClock } from '../clock/clock';
import { readConfig } from '../config/config';
import { Database } from '../database/database';
import { FileStore } from '../files/file-store';
import { openLog } from '../log/log';
import { Tasks } from '../tasks/tasks';
import { Mailbox } from './mailbox';

const [letters, kills, workers] = [300, 20, 8];
const received: { id: string; subject: string }[] = [];

/** A mail server that takes its time, so that workers are killed in the middle of a mail. */
const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS', 'AUTH'],
  logger: false,
  onData: (stream, _session, done) => {
    const parts: Buffer[] = [];
    stream.on('data', (part: Buffer) => parts.push(part));
    stream.on('end', () => {
      const text = Buffer.concat(parts).toString('utf8');
      const header = (name: string) => new RegExp(`^${name}: (.*)$`, 'm').exec(text)?.[1]?.trim() ?? '';
      received.push({ id: header('Message-ID'), subject: header('Subject') });
      setTimeout(() => done(), 15);
    });
  },
});

let database: Database;
let folder: string;
let settings: Record<string, string>;
let tasks: Tasks;
let mailbox: Mailbox;
let smtpUrl: string;

beforeAll(async () => {
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  smtpUrl = `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`;
  folder = await mkdtemp(join(tmpdir(), 'bolewright-killed-'));
  settings = {
    DATABASE_URL: await freshDatabase(),
    DATA_DIR: folder,
    SESSION_SECRET: 'a secret that only the tests know, of no use elsewhere',
  };
  database = new Database(settings['DATABASE_URL']);
  tasks = new Tasks(database, systemClock, openLog('silent', { write: () => undefined }));
  const files = new FileStore(database, join(folder, 'files'), systemClock);
  mailbox = new Mailbox(readConfig(settings), tasks, files);
}, 60_000);
afterAll(async () => {
  await new Promise<void>((resolve) => server.close(() => resolve()));
  await database.close();
  await rm(folder, { recursive: true, force: true });
});

const waiting = async (): Promise<number> =>
  (await database.select<{ n: number }>('SELECT COUNT(*) AS n FROM tasks'))[0]?.n ?? 0;

async function workUntilKilled(): Promise<void> {
  const before = received.length;
  const given = Object.entries(settings).map(([name, value]) => `${name}=${value}`);
  const worker = fork(builtProgram('mail-until-killed'), [smtpUrl, ...given], { stdio: 'ignore' });
  const ended = new Promise((resolve) => worker.once('exit', resolve));
  while (received.length < before + 3) await pause(5);
  worker.kill('SIGKILL');
  await ended;
}

test('of 300 mails whose workers are killed 20 times none is lost, and what came twice bears the same Message-ID', async () => {
  await database.transaction(async () => {
    for (let n = 0; n < letters; n++)
      await mailbox.post(null, { to: { name: 'Ada', email: 'ada@guests.example' }, subject: `Letter ${n}`, text: 'x' });
  });
  for (let kill = 0; kill < kills; kill++) await workUntilKilled();
  expect(await waiting()).toBeGreaterThan(0);
  mailbox.connect(smtpUrl, false);
  for (let round = 0; round < 60 && (await waiting()) > 0; round++) {
    await Promise.all(Array.from({ length: workers }, () => tasks.runDue()));
    await pause(50);
  }
  expect(new Set(received.map(({ subject }) => subject)).size).toBe(letters);
  expect(new Set(received.map(({ id, subject }) => `${id} ${subject}`)).size).toBe(letters);
  expect(received.every(({ id }) => id.length > 30)).toBe(true);
  expect(received.length - letters).toBeLessThanOrEqual(kills);
}, 240_000);

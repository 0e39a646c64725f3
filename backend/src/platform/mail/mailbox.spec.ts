import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { MovingClock } from '../../../../test/api/moving-clock';
import { readConfig } from '../config/config';
import { Database } from '../database/database';
import { openLog } from '../log/log';
import { Tasks } from '../tasks/tasks';
import { MailCatcher } from './mail-catcher';
import { Mailbox, type Letter } from './mailbox';

let database: Database;
let tasks: Tasks;
let mailbox: Mailbox;
let catcher: MailCatcher;
let folder: string;

beforeAll(async () => {
  const url = await freshDatabase();
  folder = await mkdtemp(join(tmpdir(), 'bolewright-mail-'));
  database = new Database(url);
  const clock = new MovingClock();
  tasks = new Tasks(database, clock, openLog('silent', { write: () => undefined }));
  mailbox = new Mailbox(
    readConfig({ DATABASE_URL: url, DATA_DIR: folder, SESSION_SECRET: 'a secret that only the tests know' }),
    tasks,
  );
  catcher = new MailCatcher(folder);
  mailbox.connect(await catcher.start(), false);
}, 60_000);
afterAll(async () => {
  await catcher.stop();
  await database.close();
  await rm(folder, { recursive: true });
});

const letter: Letter = {
  to: { name: 'Ada', email: 'ada@guests.example' },
  subject: 'Ein Gruß 🦦',
  text: 'Größe: 3½ in = 88,9 mm\n\nZeile\n',
};
const post = async (changed: Partial<Letter>) => {
  await database.transaction(() => mailbox.post(null, { ...letter, ...changed }));
  await tasks.runDue();
  return (await catcher.mails())[0];
};

test('a mail arrives with its letters intact', async () => {
  const mail = await post({});
  expect(mail.text).toContain('Größe: 3½ in = 88,9 mm');
  expect(mail.headers).toMatch(/^To: Ada <ada@guests\.example>$/m);
});

test('a step that is undone sends nothing', async () => {
  const before = (await catcher.mails()).length;
  await database
    .transaction(async () => {
      await mailbox.post(null, letter);
      throw new Error('undone');
    })
    .catch(() => undefined);
  await tasks.runDue();
  expect((await catcher.mails()).length).toBe(before);
});

test.each([
  ['subject', { subject: 'Hello\r\nBcc: all@evil.example\r\n\r\nbody' }],
  ['name', { to: { name: 'Ada\r\nBcc: all@evil.example', email: 'ada@guests.example' } }],
  ['name of many', { to: { name: 'a@evil.example, "b" <b@evil.example>', email: 'ada@guests.example' } }],
  ['reply address', { replyTo: 'x@y.example\r\nBcc: all@evil.example' }],
])('line breaks in the %s make neither a header nor another recipient', async (_, changed) => {
  const mail = await post(changed);
  const names = mail.headers.split(/\r?\n(?!\s)/).map((line) => line.split(':')[0]?.toLowerCase());
  expect(names).not.toContain('bcc');
  expect(new Set(names).size).toBe(names.length);
  const recipients = /^To: ([\s\S]*?)\r?\n(?!\s)/m.exec(mail.headers)?.[1] ?? '';
  expect(recipients.match(/<[^<>]+>/g)?.at(-1)).toBe('<ada@guests.example>');
  expect(mail.text.trim().startsWith('Größe')).toBe(true);
});

test('sent again after doubt, it carries the same Message-ID', async () => {
  const mail = await post({});
  const id = /^Message-ID: <([^@>]+)@/m.exec(mail.headers)?.[1];
  expect(id).toMatch(/^[0-9a-f-]{36}$/);
});

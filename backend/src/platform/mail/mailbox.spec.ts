import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { MovingClock } from '../../../../test/api/moving-clock';
import { readConfig } from '../config/config';
import { Database } from '../database/database';
import { FileStore } from '../files/file-store';
import { openLog } from '../log/log';
import { Tasks } from '../tasks/tasks';
import { MailCatcher } from './mail-catcher';
import { Mailbox, type Letter } from './mailbox';

let database: Database;
let tasks: Tasks;
let mailbox: Mailbox;
let catcher: MailCatcher;
let folder: string;
let url: string;
let files: FileStore;
let clock: MovingClock;

beforeAll(async () => {
  const databaseUrl = await freshDatabase();
  folder = await mkdtemp(join(tmpdir(), 'bolewright-mail-'));
  database = new Database(databaseUrl);
  await database.execute('ALTER TABLE files DROP FOREIGN KEY files_of_workshop');
  clock = new MovingClock();
  files = new FileStore(database, join(folder, 'files'), clock);
  tasks = new Tasks(database, clock, openLog('silent', { write: () => undefined }));
  mailbox = new Mailbox(
    readConfig({ DATABASE_URL: databaseUrl, DATA_DIR: folder, SESSION_SECRET: 'a secret that only the tests know' }),
    tasks,
    files,
  );
  catcher = new MailCatcher(folder);
  url = await catcher.start();
  mailbox.connect(url, false);
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

const workshopId = '019a0000-0000-7000-8000-000000000001';

test('a letter of text and HTML brings both, and the files that go with it byte for byte', async () => {
  const bytes = Buffer.from('%PDF-1.7\r\n--=_boundary\r\n\u0000\u00ff', 'latin1');
  const file = await files.save(workshopId, { name: 'Angebot “Ä” 1.pdf', media: 'application/pdf', bytes });
  const html = '<p>Größe: 3½ in &lt;b&gt;</p>';
  await database.transaction(() =>
    mailbox.post(workshopId, { ...letter, html, from: 'Herons Carvers', enclosures: [{ fileId: file.id }] }),
  );
  await tasks.runDue();
  const [mail] = await catcher.mails();
  expect(mail.text.trim()).toBe(letter.text.trim());
  expect(mail.html.trim()).toBe(html);
  expect(mail.enclosures).toEqual([
    { name: 'Angebot “Ä” 1.pdf', media: 'application/pdf', size_bytes: bytes.length, sha256: file.sha256 },
  ]);
  expect(mail.headers).toMatch(/^From: Herons Carvers <workshop@bolewright\.invalid>$/m);
});

test('a file of another workshop goes with no letter', async () => {
  const file = await files.save(workshopId, { name: 'x.pdf', media: 'application/pdf', bytes: Buffer.from('theirs') });
  const other = '019a0000-0000-7000-8000-000000000002';
  const before = (await catcher.mails()).length;
  await database.transaction(() => mailbox.post(other, { ...letter, enclosures: [{ fileId: file.id }] }));
  await tasks.runDue();
  expect((await catcher.mails()).length).toBe(before);
  await database.execute('DELETE FROM tasks');
});

test('line breaks in the name of the sender or of a file make no header', async () => {
  const name = 'x.pdf"\r\nBcc: all@evil.example\r\n\r\nbody';
  const file = await files.save(workshopId, { name, media: 'application/pdf', bytes: Buffer.from('x') });
  const from = 'Herons\r\nBcc: all@evil.example';
  await database.transaction(() => mailbox.post(workshopId, { ...letter, from, enclosures: [{ fileId: file.id }] }));
  await tasks.runDue();
  const [mail] = await catcher.mails();
  expect(mail.headers).not.toMatch(/^bcc:/im);
  expect(mail.enclosures).toHaveLength(1);
});

test('what a letter says lies in no table while it waits', async () => {
  await database.transaction(() => mailbox.post(null, { ...letter, text: 'https://here.example/client#a-secret' }));
  const rows = JSON.stringify(await database.select('SELECT * FROM tasks'));
  expect(rows).toContain('sealed');
  expect(rows).not.toMatch(/a-secret|guests\.example/);
  await tasks.runDue();
  expect((await catcher.mails())[0]?.text).toContain('#a-secret');
});

test('a letter nobody takes is given up where its workshop can see it, and leaves when it is sent again', async () => {
  mailbox.connect('smtp://127.0.0.1:1', false);
  await database.transaction(() => mailbox.post(workshopId, letter));
  for (let attempt = 0; attempt < 12; attempt++) {
    expect(await mailbox.givenUp(workshopId)).toEqual([]);
    await tasks.runDue();
    clock.move({ minutes: 400 });
  }
  const [given] = await mailbox.givenUp(workshopId);
  expect(given).toMatchObject({ to: 'ada@guests.example', subject: letter.subject, attempts: 12 });
  expect(await mailbox.givenUp('019a0000-0000-7000-8000-000000000002')).toEqual([]);
  await expect(mailbox.sendAgain('019a0000-0000-7000-8000-000000000002', given.id)).rejects.toThrow('not-found');
  mailbox.connect(url, false);
  await mailbox.sendAgain(workshopId, given.id);
  await tasks.runDue();
  const [mail] = await catcher.mails();
  expect(mail.headers).toContain(`<${given.id}@`);
  expect(await mailbox.givenUp(workshopId)).toEqual([]);
});

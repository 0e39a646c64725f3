import { mkdtemp, readdir, readFile, rm, utimes, writeFile } from 'node:fs/promises';
import { randomUUID } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { MovingClock } from '../../../../test/api/moving-clock';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { Database } from '../database/database';
import { FileStore } from './file-store';

let database: Database;
let folder: string;
let clock: MovingClock;
let files: FileStore;
const [ours, theirs] = [randomUUID(), randomUUID()];
const file = (text: string, name = 'note.txt') => ({ name, media: 'text/plain', bytes: Buffer.from(text) });

beforeAll(async () => {
  database = new Database(await freshDatabase());
  folder = await mkdtemp(join(tmpdir(), 'bolewright-files-'));
  clock = new MovingClock();
  files = new FileStore(database, folder, clock);
  await database.execute('SET FOREIGN_KEY_CHECKS = 0');
  await database.execute('ALTER TABLE files DROP FOREIGN KEY files_of_workshop');
}, 60_000);
afterAll(async () => {
  await database.close();
  await rm(folder, { recursive: true });
});

const onDisk = async (): Promise<string[]> =>
  (await readdir(folder, { recursive: true })).filter((path) => path.split('/').length === 3);

test('a file comes back as it went in', async () => {
  const { id } = await files.save(ours, file('gesso'));
  expect(await files.read(ours, id)).toMatchObject({
    name: 'note.txt',
    media: 'text/plain',
    size_bytes: 5,
    bytes: Buffer.from('gesso'),
  });
});

test('the same content lies once, under its SHA-256', async () => {
  await files.save(ours, file('bole', 'one.txt'));
  await files.save(ours, file('bole', 'two.txt'));
  // printf bole | sha256sum
  const hash = '2ca52058a45d336f13ef191b7ad6caa2afde1828b729768cab67b60495cf7042';
  expect((await onDisk()).filter((path) => path.includes(hash))).toEqual([join(ours, '2c', hash)]);
});

test('bytes left over that are saved again are young again', async () => {
  await database
    .transaction(async () => {
      await files.save(ours, file('twice'));
      throw new Error('rolled back');
    })
    .catch(() => undefined);
  clock.move({ minutes: 61 });
  const { id } = await files.save(ours, file('twice'));
  await database.execute('DELETE FROM files WHERE id = :id', { id });
  expect(await files.sweep()).toBe(0);
  clock.move({ minutes: 61 });
  expect(await files.sweep()).toBe(1);
});

test('it is read through a row of its own workshop only', async () => {
  const { id } = await files.save(ours, file('ours alone'));
  await expect(files.read(theirs, id)).rejects.toMatchObject({ kind: 'not-found' });
  await expect(files.read(ours, '../../etc/passwd')).rejects.toMatchObject({ kind: 'not-found' });
});

test('a row that was rolled back leaves bytes, which are swept away after an hour; the others stay', async () => {
  const { id } = await files.save(ours, file('kept'));
  await expect(
    database.transaction(async () => {
      await files.save(ours, file('orphaned'));
      throw new Error('rolled back');
    }),
  ).rejects.toThrow('rolled back');
  const before = (await onDisk()).length;
  expect(await files.sweep()).toBe(0);
  clock.move({ minutes: 61 });
  expect(await files.sweep()).toBe(1);
  expect(await onDisk()).toHaveLength(before - 1);
  expect((await files.read(ours, id)).bytes.toString()).toBe('kept');
});

test('a file that was begun and never finished is swept away too', async () => {
  const [path] = await onDisk();
  const begun = join(folder, path ?? '', '..', `${randomUUID()}.making`);
  await writeFile(begun, 'half');
  await utimes(begun, new Date(0), new Date(0));
  expect(await files.sweep()).toBe(1);
});

test('bytes that changed on the disk are not handed out', async () => {
  const { id, sha256 } = await files.save(ours, file('sound'));
  const path = join(folder, ours, sha256.slice(0, 2), sha256);
  expect(await readFile(path, 'utf8')).toBe('sound');
  await writeFile(path, 'tampered');
  await expect(files.read(ours, id)).rejects.toThrow('damaged');
});

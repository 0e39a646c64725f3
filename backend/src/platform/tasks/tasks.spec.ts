import { setTimeout as pause } from 'node:timers/promises';
import { fork } from 'node:child_process';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { MovingClock } from '../../../../test/api/moving-clock';
import { builtProgram } from '../../../../test/programs/built-program';
import { Database } from '../database/database';
import { openLog } from '../log/log';
import { Tasks } from './tasks';

let url: string;
let database: Database;
let clock: MovingClock;
let tasks: Tasks;
const silent = openLog('silent', { write: () => undefined });

beforeAll(async () => {
  url = await freshDatabase();
  database = new Database(url);
  await database.execute('CREATE TABLE done (task VARCHAR(60), at DATETIME(3) DEFAULT CURRENT_TIMESTAMP(3))');
}, 60_000);
beforeEach(async () => {
  clock = new MovingClock();
  tasks = new Tasks(database, clock, silent);
  await database.execute('DELETE FROM tasks');
  await database.execute('DELETE FROM done');
});
afterAll(() => database.close());

const add = (kind: string, content: object) =>
  database.transaction(() => tasks.add({ workshopId: null, kind, content }));
const waiting = async (): Promise<number> =>
  (await database.select<{ n: number }>('SELECT COUNT(*) AS n FROM tasks'))[0]?.n ?? 0;

test('a task runs once, with what it was given, and is struck off', async () => {
  const seen: unknown[] = [];
  tasks.register('note', (content) => Promise.resolve(void seen.push(content)));
  await add('note', { text: 'ä "quoted"', list: [1, 2] });
  await tasks.runDue();
  await tasks.runDue();
  expect(seen).toEqual([{ text: 'ä "quoted"', list: [1, 2] }]);
  expect(await waiting()).toBe(0);
});

test('a task is written in the transaction of the step that wants it, or not at all', async () => {
  await expect(tasks.add({ workshopId: null, kind: 'note', content: {} })).rejects.toThrow('in the transaction');
  await expect(
    database.transaction(async () => {
      await tasks.add({ workshopId: null, kind: 'note', content: {} });
      throw new Error('step failed');
    }),
  ).rejects.toThrow('step failed');
  expect(await waiting()).toBe(0);
});

test('a task that fails is tried again, later each time, and given up after twelve attempts', async () => {
  let attempts = 0;
  tasks.register('fails', () => {
    attempts += 1;
    return Promise.reject(new Error('no answer'));
  });
  await add('fails', {});
  const gaps_minutes: number[] = [];
  for (let round = 0; round < 12; round++) {
    await tasks.runDue();
    const [row] = await database.select<{ runAfter: Date }>('SELECT run_after AS runAfter FROM tasks');
    const gap_minutes = ((row?.runAfter.getTime() ?? 0) - clock.now().getTime()) / 60_000;
    gaps_minutes.push(gap_minutes);
    clock.move({ minutes: gap_minutes + 0.01 });
  }
  expect(attempts).toBe(12);
  for (const [at, gap] of gaps_minutes.slice(1, 11).entries())
    expect(gap).toBeGreaterThan((gaps_minutes[at] ?? 0) * 0.8);
  expect(gaps_minutes[0]).toBeLessThan(0.2);
  expect(gaps_minutes[10]).toBeGreaterThan(100);
  clock.move({ minutes: 10_000 });
  await tasks.runDue();
  expect(attempts).toBe(12);
  expect(await tasks.failed()).toMatchObject([{ kind: 'fails', lastError: 'no answer' }]);
});

test('what a failed task wrote is undone, and the others go on', async () => {
  tasks.register('half', async () => {
    await database.execute("INSERT INTO done (task) VALUES ('half')");
    throw new Error('then it broke');
  });
  tasks.register('whole', () => database.execute("INSERT INTO done (task) VALUES ('whole')").then(() => undefined));
  await add('half', {});
  await add('whole', {});
  await tasks.runDue();
  expect(await database.select('SELECT task FROM done')).toEqual([{ task: 'whole' }]);
});

test('a task waits until its time', async () => {
  const seen: unknown[] = [];
  tasks.register('later', () => Promise.resolve(void seen.push('ran')));
  const runAfter = new Date(clock.now().getTime() + 60_000);
  await database.transaction(() => tasks.add({ workshopId: null, kind: 'later', content: {}, runAfter }));
  await tasks.runDue();
  expect(seen).toEqual([]);
  clock.move({ minutes: 2 });
  await tasks.runDue();
  expect(seen).toEqual(['ran']);
});

test('several workers share the work without waiting for one another', async () => {
  const seen: string[] = [];
  const workers = ['a', 'b', 'c'].map((name) => {
    const worker = new Tasks(database, clock, silent);
    worker.register<{ n: number }>('shared', async ({ n }) => {
      await pause(5);
      seen.push(`${n} by ${name}`);
    });
    return worker;
  });
  for (let n = 0; n < 30; n++) await add('shared', { n });
  await Promise.all(workers.map((worker) => worker.runDue()));
  expect(new Set(seen.map((line) => line.split(' ')[0])).size).toBe(30);
  expect(seen).toHaveLength(30);
  expect(new Set(seen.map((line) => line.at(-1))).size).toBeGreaterThan(1);
});

describe('a worker that was started', () => {
  /** A task that goes on until it is let go. */
  const held = () => {
    let letGo = (): void => undefined;
    const gone = new Promise<void>((resolve) => (letGo = resolve));
    return { gone, letGo };
  };
  const until = async (holds: () => boolean): Promise<void> => {
    for (let look = 0; look < 400 && !holds(); look++) await pause(25);
    expect(holds()).toBe(true);
  };
  afterEach(() => tasks.stop());

  test('does what is short beside what takes long, and each long kind beside the others', async () => {
    const { gone, letGo } = held();
    const seen: string[] = [];
    const long = (name: string) => async () => {
      seen.push(`${name} begins`);
      await gone;
      seen.push(`${name} ends`);
    };
    tasks.register('plan', long('plan'), { isLong: true });
    tasks.register('reckon', long('reckon'), { isLong: true });
    tasks.register<{ n: number }>('letter', ({ n }) => Promise.resolve(void seen.push(`letter ${n}`)));
    for (const kind of ['plan', 'plan', 'reckon']) await add(kind, {});
    tasks.start();
    await until(() => seen.length === 2);
    expect([...seen].sort()).toEqual(['plan begins', 'reckon begins']);
    for (const n of [1, 2]) await add('letter', { n });
    await until(() => seen.length === 4);
    expect(seen.slice(2)).toEqual(['letter 1', 'letter 2']);
    letGo();
    await until(() => seen.length === 8);
    expect(seen.filter((line) => line.startsWith('plan'))).toEqual([
      ...['plan begins', 'plan ends'],
      ...['plan begins', 'plan ends'],
    ]);
    expect(await waiting()).toBe(0);
  });

  test('keeps its attempts apart: a long task that fails is put off, and the short ones go on', async () => {
    const seen: string[] = [];
    const fail = (): Promise<void> => {
      seen.push('plan');
      return Promise.reject(new Error('no plan'));
    };
    tasks.register('plan', fail, { isLong: true });
    tasks.register('letter', () => Promise.resolve(void seen.push('letter')));
    await add('plan', {});
    await add('letter', {});
    tasks.start();
    await until(() => seen.length === 2);
    await tasks.stop();
    expect(await database.select('SELECT kind, attempts, last_error AS lastError FROM tasks')).toEqual([
      { kind: 'plan', attempts: 1, lastError: 'no plan' },
    ]);
  });

  test('stops once each has done what it has in hand, and leaves the rest to the next', async () => {
    const { gone, letGo } = held();
    const seen: string[] = [];
    const work = (kind: string) => async () => {
      seen.push(kind);
      await gone;
      await database.execute('INSERT INTO done (task) VALUES (:kind)', { kind });
    };
    tasks.register('plan', work('plan'), { isLong: true });
    tasks.register('letter', work('letter'));
    for (const kind of ['plan', 'plan', 'letter', 'letter']) await add(kind, {});
    tasks.start();
    await until(() => seen.length === 2);
    let isStopped = false;
    const stopped = tasks.stop().then(() => (isStopped = true));
    await pause(100);
    expect(isStopped).toBe(false);
    letGo();
    await stopped;
    expect(seen.sort()).toEqual(['letter', 'plan']);
    expect(await database.select('SELECT task FROM done ORDER BY task')).toEqual([
      { task: 'letter' },
      { task: 'plan' },
    ]);
    expect(await waiting()).toBe(2);
  });
});

test('a worker that is killed loses nothing: what it had in hand is done by the next', async () => {
  for (let n = 0; n < 40; n++) await add('recorded', { n });
  for (let kill = 0; kill < 3; kill++) {
    const worker = fork(builtProgram('work-until-killed'), [url], { stdio: 'ignore' });
    await new Promise((resolve) => worker.once('message', resolve));
    await pause(60);
    const ended = new Promise((resolve) => worker.once('exit', resolve));
    worker.kill('SIGKILL');
    await ended;
  }
  expect(await waiting()).toBeGreaterThan(0);
  tasks.register<{ n: number }>('recorded', async ({ n }) => {
    await database.execute('INSERT INTO done (task) VALUES (:n)', { n: String(n) });
  });
  for (let round = 0; round < 20 && (await waiting()) > 0; round++) {
    await tasks.runDue();
    await pause(100);
  }
  const done = await database.select<{ task: string }>('SELECT task FROM done');
  expect(new Set(done.map(({ task }) => task)).size).toBe(40);
  expect(done).toHaveLength(40);
}, 60_000);

import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ThreadQueue } from './thread-queue';

/** A thread that keeps a count of its questions, and fails, ends or throws when told to. */
const threadText = `
const { parentPort } = require('node:worker_threads');
let asked = 0;
parentPort.on('message', (question) => {
  asked += 1;
  if (question === 'end') process.exit(0);
  if (question === 'throw') throw new Error('thrown inside');
  if (question === 'hang') for (;;);
  if (question === 'fail') return parentPort.postMessage({ error: 'cannot be worked' });
  setTimeout(() => parentPort.postMessage({ answer: { question, asked } }), 20);
});
`;

let folder: string;
let queue: ThreadQueue<string, { question: string; asked: number }>;
let begun = 0;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'bolewright-thread-'));
  writeFileSync(join(folder, 'thread.js'), threadText);
});
beforeEach(() => {
  begun = 0;
  const start = () => {
    begun += 1;
    return { file: join(folder, 'thread.js'), options: {} };
  };
  queue = new ThreadQueue(start, { waiting: 10, time: { milliseconds: 1_000, failure: () => new Error('too long') } });
});
afterAll(() => rmSync(folder, { recursive: true }));

test('questions are answered in their order by one thread', async () => {
  const answers = await Promise.all(['a', 'b', 'c'].map((question) => queue.ask(question)));
  expect(answers).toEqual([
    { question: 'a', asked: 1 },
    { question: 'b', asked: 2 },
    { question: 'c', asked: 3 },
  ]);
  expect(begun).toBe(1);
});

test('one that cannot be worked fails alone', async () => {
  const [before, failed, after] = await Promise.allSettled(['a', 'fail', 'b'].map((question) => queue.ask(question)));
  expect([before.status, failed, after.status]).toMatchObject([
    'fulfilled',
    { status: 'rejected', reason: { message: 'cannot be worked' } },
    'fulfilled',
  ]);
  expect(begun).toBe(1);
});

test.each(['end', 'throw'])(
  'a thread lost to “%s” costs its own question, and another thread answers the rest',
  async (way) => {
    const [lost, after] = await Promise.allSettled([queue.ask(way), queue.ask('b')]);
    expect(lost.status).toBe('rejected');
    expect(after).toEqual({ status: 'fulfilled', value: { question: 'b', asked: 1 } });
    expect(begun).toBe(2);
  },
);

test('one that takes longer than it may is ended, and another thread answers the rest', async () => {
  const [late, after] = await Promise.allSettled([queue.ask('hang'), queue.ask('b')]);
  expect(late).toMatchObject({ status: 'rejected', reason: { message: 'too long' } });
  expect(after).toEqual({ status: 'fulfilled', value: { question: 'b', asked: 1 } });
  expect(begun).toBe(2);
});

test('more than may wait are refused at once, with a time to come again', async () => {
  const asked = Array.from({ length: 13 }, (_, at) => queue.ask(`${at}`));
  const settled = await Promise.allSettled(asked);
  expect(settled.filter(({ status }) => status === 'fulfilled')).toHaveLength(11);
  expect(settled.slice(11)).toMatchObject(
    [1, 2].map(() => ({ reason: { code: 'problem-busy', kind: 'unavailable' } })),
  );
});

import { setTimeout as pause } from 'node:timers/promises';
import { Turns } from './turns';

test('so many run at once as may, the others in the order they came', async () => {
  const turns = new Turns(2);
  const begun: number[] = [];
  let running = 0;
  let most = 0;
  const work = async (number: number) => {
    begun.push(number);
    most = Math.max(most, ++running);
    await pause(5);
    running -= 1;
    return number;
  };
  const answers = await Promise.all([1, 2, 3, 4, 5].map((number) => turns.take(() => work(number))));
  expect([answers, begun, most]).toEqual([[1, 2, 3, 4, 5], [1, 2, 3, 4, 5], 2]);
});

test('one that fails gives its turn to the next', async () => {
  const turns = new Turns(1);
  const failed = turns.take(() => Promise.reject(new Error('no')));
  const next = turns.take(() => Promise.resolve('done'));
  await expect(failed).rejects.toThrow('no');
  expect(await next).toBe('done');
});

test('whoever comes when too many wait is told to come again', async () => {
  const turns = new Turns(1, 1);
  const all = await Promise.allSettled([1, 2, 3].map((number) => turns.take(() => pause(5, number))));
  expect(all.map(({ status }) => status)).toEqual(['fulfilled', 'fulfilled', 'rejected']);
  expect(all[2]).toMatchObject({ reason: { kind: 'unavailable', code: 'problem-busy' } });
});

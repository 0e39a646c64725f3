import { UniqueConstraintError } from 'sequelize';
import { freshDatabase } from '../../../../test/database/fresh-database';
import { Database } from '../database/database';
import { openLog } from './log';

const written = (event: object): Record<string, unknown> => {
  const lines: string[] = [];
  openLog('info', { write: (line: string) => void lines.push(line) }).info(event, 'event');
  expect(lines).toHaveLength(1);
  return JSON.parse(lines[0] ?? '') as Record<string, unknown>;
};

test.each(['password', 'current', 'token', 'csrf', 'cookie', 'authorization', 'secret'])(
  'what is called %s stays out of the log',
  (name) => {
    expect(
      JSON.stringify(written({ [name]: 'canary', inner: { [name]: 'canary', deep: { [name]: 'canary' } } })),
    ).not.toContain('canary');
  },
);

test('the time is in UTC', () => {
  expect(written({})['time']).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/);
});

test('text with line breaks is one line', () => {
  expect(written({ name: 'a\r\n{"level":60}' })).toMatchObject({ name: 'a\r\n{"level":60}' });
});

test('an error of the database is logged without its statement and its values', async () => {
  const database = new Database(await freshDatabase(), 1);
  const sql =
    "INSERT INTO tasks (id, kind, content, attempts, run_after, created_at) VALUES (:id, 'canary-kind', :content, 0, NOW(), NOW())";
  const values = { id: '00000000-0000-4000-8000-000000000000', content: '{"password":"canary"}' };
  await database.execute(sql, values);
  const error: unknown = await database.execute(sql, values).catch((caught: unknown) => caught);
  const fault: unknown = await database
    .execute('INSERT INTO nowhere VALUES (:content)', values)
    .catch((caught: unknown) => caught);
  await database.close();
  expect(error).toBeInstanceOf(UniqueConstraintError);
  for (const one of [error, fault]) {
    const line = JSON.stringify(written({ error: one }));
    expect(line).not.toContain('canary');
    expect(line).toContain('log.spec.ts');
  }
});

test('an error says what it was and where', () => {
  expect(written({ error: new RangeError('out of range') })).toMatchObject({
    error: { kind: 'RangeError', message: 'out of range', stack: expect.stringContaining('log.spec.ts') as string },
  });
});

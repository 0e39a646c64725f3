import type { Request, Response } from 'express';
import type { Database } from '../database/database';
import { Readiness } from './readiness';

async function asked(select: () => Promise<unknown[]>): Promise<number> {
  const readiness = new Readiness({ select } as unknown as Database);
  let status = 0;
  const response = { status: (code: number) => ((status = code), response), json: () => response };
  await readiness.ready({} as Request, response as unknown as Response, () => undefined);
  return status;
}

it.each([
  ['answers', () => Promise.resolve([{ one: 1 }]), 200],
  ['refuses', () => Promise.reject(new Error('gone')), 503],
  ['is frozen and never answers', () => new Promise<never>(() => undefined), 503],
])('Where the database %s it is said whether requests are welcome', async (_how, select, status) => {
  expect(await asked(select)).toBe(status);
});

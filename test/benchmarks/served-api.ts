import type { AddressInfo } from 'node:net';
import { createServer, type RequestListener } from 'node:http';
import autocannon from 'autocannon';
import jestSetUp from '../database/jest-set-up.mjs';
import jestTearDown from '../database/jest-tear-down.mjs';
import { startApi, type Api } from '../api/start-api';

/** A server on loopback, and how to stop it. */
export interface Listening {
  readonly address: string;
  readonly stop: () => Promise<void>;
}

/** Serves on a free port of loopback. */
export async function listen(handler: RequestListener): Promise<Listening> {
  const server = createServer(handler);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  const stop = () => new Promise<void>((resolve) => server.close(() => resolve()));
  return { address: `http://127.0.0.1:${port}`, stop };
}

/** The whole application on a throw-away database, for as long as the work takes; `environment` overrides settings. */
export async function withApi<T>(
  work: (api: Api) => Promise<T>,
  environment: Readonly<Record<string, string>> = {},
): Promise<T> {
  await jestSetUp();
  const api = await startApi(environment);
  try {
    return await work(api);
  } finally {
    await api.stop();
    await jestTearDown();
  }
}

/** Milliseconds within which 95 of 100 answers came, at 20 connections for some seconds; an answer that is no answer is an error. */
export async function slowestOf95(url: string, cookie: string, duration: number): Promise<number> {
  const times: number[] = [];
  const headers = { cookie, 'accept-encoding': 'gzip' };
  const result = await new Promise<autocannon.Result>((resolve, reject) => {
    const run = autocannon({ url, connections: 20, duration, headers }, (error: Error | null, outcome) =>
      error ? reject(error) : resolve(outcome),
    );
    run.on('response', (...heard) => times.push(heard[3]));
  });
  if (result.non2xx > 0 || result.errors > 0)
    throw new Error(`${result.non2xx + result.errors} answers of ${url} failed`);
  return times.sort((a, b) => a - b)[Math.floor(times.length * 0.95)] ?? Number.NaN;
}

import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import express from 'express';
import request from 'supertest';
import { listen } from './listen';
import { Readiness } from './http/readiness';
import type { WebServer } from './http/web-server';

/** What a connection is allowed that dawdles or says too much (ASVS 2.4.1, 4.2.1). */
let server: Server;
beforeAll(async () => {
  const app = express().use((_request, response) => void response.send('heard'));
  const web: WebServer = { express: app, readiness: new Readiness(undefined as never), sweep: () => Promise.resolve() };
  server = await listen(web, 0);
});
afterAll(() => new Promise((resolve) => server.close(resolve)));

test('a request has a minute, its head fifteen seconds, and a quiet connection five', () => {
  expect(server.requestTimeout).toBe(60_000);
  expect(server.headersTimeout).toBe(15_000);
  expect(server.keepAliveTimeout).toBe(5_000);
});

test('it hears this machine alone', () => {
  expect((server.address() as AddressInfo).address).toBe('127.0.0.1');
});

test('a head of 16 kB is heard, a longer one is refused', async () => {
  const door = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const said = (length: number) => request(door).get('/').set('x-long', 'a'.repeat(length));
  expect((await said(15_000)).text).toBe('heard');
  expect((await said(17_000)).status).toBe(431);
});

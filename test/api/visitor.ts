import { Agent, createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Express } from 'express';
import request, { type Response, type Test } from 'supertest';
import { signIn, readSession } from '#shared/accounts/session-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import { noteCookie, noteSecret, noteSecretOfAddress, noteSecretsOf } from './faults-of-log';

/** What one call brings along; everything is optional so that a test may leave it out. */
export interface Parts {
  readonly params?: Record<string, string>;
  readonly query?: Record<string, string | number>;
  readonly body?: unknown;
  readonly version?: number;
  readonly key?: string;
  readonly file?: { readonly name: string; readonly bytes: Buffer };
}

type Method = Endpoint['method'];

/** Connections stay open between requests, as a browser's do: a new server and a new connection for each would take as long as the answer. */
const agent = new Agent({ keepAlive: true });
const doors = new WeakMap<Express, string>();

/** Where an application listens, from its first visitor on; nothing of it keeps the process alive. */
function doorOf(express: Express): string {
  const known = doors.get(express);
  if (known) return known;
  const server = createServer(express).listen(0).unref();
  // It closes none by itself: the next request might be on its way just then.
  server.keepAliveTimeout = 0;
  server.on('connection', (socket) => socket.unref());
  const door = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  doors.set(express, door);
  return door;
}

/** Somebody with a browser: keeps the cookie, and the token that answers about the session bring. */
export class Visitor {
  token = '';
  cookie = '';

  constructor(
    private readonly express: Express,
    private readonly headers: Readonly<Record<string, string>> = {},
  ) {}

  /** A request with the cookie and without the token. A cookie is kept whatever its address, as if https were before the server. */
  request(method: Method, path: string): Test {
    const test = request(doorOf(this.express))[method](path).agent(agent).set(this.headers);
    if (this.cookie) test.set('cookie', this.cookie);
    test.on(
      'response',
      ({ headers, body }: { headers: Record<string, string[] | undefined>; body?: Record<string, unknown> }) => {
        for (const line of headers['set-cookie'] ?? []) this.keep(line.split(';')[0] ?? '');
        if (typeof body?.['token'] === 'string') this.token = body['token'];
        noteSecret(this.token);
        noteSecretOfAddress(body?.['link']);
        noteSecretOfAddress(body?.['address']);
      },
    );
    return test;
  }

  private keep(cookie: string): void {
    this.cookie = cookie;
    noteCookie(cookie.split('=')[1] ?? '');
  }

  /** Asks for the session, as the page does first of all. */
  async arrive(): Promise<this> {
    await this.request('get', readSession.path);
    return this;
  }

  async signIn(email: string, password: string): Promise<Response> {
    if (this.token === '') await this.arrive();
    return this.call(signIn, { body: { email, password } });
  }

  /** Calls an endpoint as the page would. */
  call(endpoint: Endpoint, parts: Parts = {}): Test {
    const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) =>
      encodeURIComponent(parts.params?.[name] ?? 'missing'),
    );
    const test = this.request(endpoint.method, path).query(parts.query ?? {});
    if (endpoint.method !== 'get') test.set('x-csrf-token', this.token);
    if (parts.version !== undefined) test.set('if-match', `"${parts.version}"`);
    if (parts.key !== undefined) test.set('idempotency-key', parts.key);
    if (endpoint.upload && parts.file) return test.attach(endpoint.upload, parts.file.bytes, parts.file.name);
    noteSecretsOf(parts.query);
    noteSecretsOf(parts.body);
    return parts.body === undefined ? test : test.send(parts.body as object);
  }
}

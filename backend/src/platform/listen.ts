import { createServer, type Server } from 'node:http';
import { setTimeout as pause } from 'node:timers/promises';
import type { WebServer } from './http/web-server';

const noticeOfStop_milliseconds = 500;
const longestStop_milliseconds = 8_000;

const limits = {
  requestTimeout: 60_000,
  headersTimeout: 15_000,
  keepAliveTimeout: 5_000,
  maxHeaderSize: 16 * 1024,
} as const;

/** Listens on loopback only; rejects with the system's error when the port is taken. */
export function listen(web: WebServer, port: number): Promise<Server> {
  const server = createServer(limits, web.express);
  return new Promise((resolve, reject) => {
    server.once('error', reject).listen(port, '127.0.0.1', () => resolve(server));
  });
}

/** Says "not ready" first, then takes no more connections, lets the running requests finish, and is done within ten seconds. */
export async function stopListening(server: Server, web: WebServer): Promise<void> {
  web.readiness.stop();
  await pause(noticeOfStop_milliseconds);
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  server.closeIdleConnections();
  const late = setTimeout(() => server.closeAllConnections(), longestStop_milliseconds);
  await closed;
  clearTimeout(late);
}

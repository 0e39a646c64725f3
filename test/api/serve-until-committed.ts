import { createServer, ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { openApp } from '../../backend/src/app';
import { systemClock } from '../../backend/src/platform/clock/clock';
import { readConfig } from '../../backend/src/platform/config/config';
import { openLog } from '../../backend/src/platform/log/log';
import { openPlatform } from '../../backend/src/platform/open-platform';

/** A server of its own process on somebody's database, which kills itself when the answer to a change is about to leave: after the commit. */
const entries = process.argv.slice(2).map((setting): [string, string] => {
  const at = setting.indexOf('=');
  return [setting.slice(0, at), setting.slice(at + 1)];
});
const log = openLog('silent', { write: () => undefined });
const app = openApp(openPlatform(readConfig(Object.fromEntries(entries)), systemClock, log));

// oxlint-disable-next-line typescript/unbound-method -- it is called with its own `this` below
const end = ServerResponse.prototype.end;
ServerResponse.prototype.end = function (this: ServerResponse, ...given: unknown[]) {
  if (this.req.method === 'GET' || this.statusCode >= 300) return end.apply(this, given as Parameters<typeof end>);
  process.kill(process.pid, 'SIGKILL');
  return this;
} as typeof end;

const server = createServer(app.web.express);
server.listen(0, '127.0.0.1', () => process.send?.((server.address() as AddressInfo).port));

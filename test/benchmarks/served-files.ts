import { existsSync, readFileSync, statSync } from 'node:fs';
import { createServer, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import * as path from 'node:path';

/** A built page served on loopback, and which of its files were asked for. */
export interface ServedFiles {
  readonly address: string;
  readonly asked: ReadonlySet<string>;
  readonly stop: () => Promise<void>;
}

const mediaTypes: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.json': 'application/json',
  '.woff2': 'font/woff2',
};

const isFile = (file: string): boolean => existsSync(file) && statSync(file).isFile();

function refuseStranger(response: ServerResponse): void {
  response.writeHead(401, { 'content-type': 'application/problem+json' });
  response.end(JSON.stringify({ type: 'about:blank', title: 'Signed out', status: 401, instance: '', errors: [] }));
}

/** Clients have an application of their own. */
const pageOf = (folder: string, pathname: string): string =>
  path.join(folder, /^\/client(\/|$)/.test(pathname) ? 'client-files/index.html' : 'index.html');

/** Serves a folder as the server would to a stranger: every address that is no file is the page, every call is refused. */
export async function servedFiles(folder: string): Promise<ServedFiles> {
  const asked = new Set<string>();
  const server = createServer((request, response) => {
    const { pathname } = new URL(request.url ?? '/', 'http://localhost');
    if (pathname.startsWith('/api/')) return refuseStranger(response);
    const exact = path.join(folder, path.posix.normalize(pathname));
    const file = isFile(exact) ? exact : pageOf(folder, pathname);
    asked.add(file);
    response.writeHead(200, { 'content-type': mediaTypes[path.extname(file)] ?? 'application/octet-stream' });
    response.end(readFileSync(file));
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const stop = () =>
    new Promise<void>((resolve) => {
      server.close(() => resolve());
      server.closeAllConnections();
    });
  return { address: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, asked, stop };
}

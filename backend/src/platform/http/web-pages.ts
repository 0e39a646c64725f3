import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router, type RequestHandler } from 'express';
import { pagePolicy } from './headers';
import { smallerFiles } from './smaller-files';

const year_seconds = 31_536_000;
/** Eight letters and figures, in capitals or small ones by what made the file; a name of words and weights (sans-400) has none. */
const hashed = /[-.][A-Za-z0-9]{8}\.(?:js|css|woff2|png|svg)$/;

/** Clients have an application of their own, so that nothing of the workshop's travels with theirs. */
function entryOf(folder: string, path: string): string {
  const ofClients = join(folder, 'client-files/index.html');
  return /^\/client(\/|$)/.test(path) && existsSync(ofClients) ? ofClients : join(folder, 'index.html');
}

/** The page itself, with a fresh nonce for its styles; never cached, since it names the files of one build. */
function page(folder: string, isPage: (path: string) => boolean): RequestHandler {
  const read = new Map<string, string>();
  return (request, response, next) => {
    if (request.method !== 'GET' || /\/\.|\.\w+$/.test(request.path)) return next();
    const file = entryOf(folder, request.path);
    const html = read.get(file) ?? readFileSync(file, 'utf8');
    read.set(file, html);
    const nonce = randomBytes(16).toString('base64');
    response.set('Content-Security-Policy', pagePolicy(nonce)).set('Cache-Control', 'no-store');
    response
      .status(isPage(request.path) ? 200 : 404)
      .type('html')
      .send(html.replaceAll('CSP_NONCE', nonce));
  };
}

/** The built application: files under hashed names are kept for ever, the rest is asked for again, every page is index.html. */
export function webPages(folder: string, isPage: (path: string) => boolean): Router {
  const files = express.static(folder, {
    index: false,
    dotfiles: 'ignore',
    redirect: false,
    setHeaders: (response, path) => {
      response.setHeader(
        'Cache-Control',
        hashed.test(path.replace(/\.br$/, '')) ? `public, max-age=${year_seconds}, immutable` : 'no-cache',
      );
    },
  });
  return Router().use(smallerFiles(folder), files).use(page(folder, isPage));
}

import { randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router, type RequestHandler } from 'express';
import { pagePolicy } from './headers';

const year_seconds = 31_536_000;
const hashed = /[-.][A-Za-z0-9_-]{8,}\.(?:js|css|woff2|png|svg)$/;

/** The page itself, with a fresh nonce for its styles; never cached, since it names the files of one build. */
function page(folder: string, isPage: (path: string) => boolean): RequestHandler {
  let html: string | undefined;
  return (request, response, next) => {
    if (request.method !== 'GET' || /\/\.|\.\w+$/.test(request.path)) return next();
    html ??= readFileSync(join(folder, 'index.html'), 'utf8');
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
        hashed.test(path) ? `public, max-age=${year_seconds}, immutable` : 'no-cache',
      );
    },
  });
  return Router().use(files).use(page(folder, isPage));
}

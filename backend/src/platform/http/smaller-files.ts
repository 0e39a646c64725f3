import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { RequestHandler } from 'express';

const isText = /\.(?:js|css|svg)$/;

/**
 * Sends the file that was made smaller when the pages were built (`x.js.br` for `x.js`) to whoever can read it. The name stays the one that was
 * asked for, so that type and caching are its own.
 */
export function smallerFiles(folder: string): RequestHandler {
  return (request, response, next) => {
    if (!isText.test(request.path)) return next();
    response.vary('Accept-Encoding');
    if (
      !request.acceptsEncodings('br') ||
      /\.\.|%|\\/.test(request.path) ||
      !existsSync(join(folder, `${request.path}.br`))
    )
      return next();
    response.type(request.path.slice(request.path.lastIndexOf('.'))).set('Content-Encoding', 'br');
    request.url = request.url.replace(request.path, `${request.path}.br`);
    next();
  };
}

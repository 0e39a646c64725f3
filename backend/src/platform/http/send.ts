import { gunzipSync } from 'node:zlib';
import type { Request, Response } from 'express';
import type { Endpoint } from '#shared/actor/endpoint';
import { FileAnswer, PreparedAnswer } from './answer';

/** A file name for a header, as RFC 6266 and RFC 8187 have it: plain letters for old clients, the whole name percent-encoded. */
export function disposition(name: string, shownInPage = false): string {
  const clean = name.replace(/[\u0000-\u001f\u007f\u200e\u200f\u202a-\u202e\u2066-\u2069]/g, '').replace(/[/\\]/g, '-');
  const plain = clean.replace(/[^\x20-\x7e]|["%]/g, '_');
  const whole = encodeURIComponent(clean).replace(
    /['()*]/g,
    (letter) => `%${letter.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `${shownInPage ? 'inline' : 'attachment'}; filename="${plain}"; filename*=UTF-8''${whole}`;
}

const tag = (version: number): string => `"${version}"`;

function sendFile(response: Response, answer: FileAnswer): void {
  const { name, media, shownInPage } = answer.file;
  response
    .set('Content-Security-Policy', "default-src 'none'; sandbox")
    .set('Content-Disposition', disposition(name, shownInPage));
  response.type(media).send(answer.bytes);
}

function sendPrepared(request: Request, response: Response, answer: PreparedAnswer): void {
  response.type('json').set('ETag', tag(answer.version)).vary('Accept-Encoding');
  if (request.acceptsEncodings('gzip')) response.set('Content-Encoding', 'gzip').end(answer.gzip);
  else response.end(gunzipSync(answer.gzip));
}

const versionOf = (answer: unknown): number | undefined => (answer as { version?: number } | null | undefined)?.version;

/** Sends what a handler gave back, already checked; an answer with a version carries it as its ETag. */
export function send(endpoint: Endpoint, exchange: { request: Request; response: Response }, answer: unknown): void {
  const { request, response } = exchange;
  if (answer instanceof FileAnswer) return sendFile(response, answer);
  if (answer instanceof PreparedAnswer) return sendPrepared(request, response, answer);
  if (answer === undefined) return void response.status(204).end();
  const version = versionOf(answer);
  if (Number.isInteger(version)) response.set('ETag', tag(version as number));
  response.json(answer);
}

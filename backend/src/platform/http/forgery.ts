import { timingSafeEqual } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import { Rejection } from '#shared/problems/rejection';
import type { Config } from '../config/config';

export const forgeryHeader = 'x-csrf-token';

const reading = new Set(['GET', 'HEAD', 'OPTIONS']);

const ownOrigin = (config: Config, request: Request): string =>
  config.publicUrl?.origin ?? `${request.protocol}://${request.get('host') ?? ''}`;

function originOf(request: Request): string | undefined {
  const sender = request.get('origin') ?? request.get('referer');
  if (sender === undefined) return undefined;
  return URL.canParse(sender) ? new URL(sender).origin : 'null';
}

/** Fetch metadata first; browsers that do not send it are judged by Origin or Referer. */
function comesFromUs(config: Config, request: Request): boolean {
  const site = request.get('sec-fetch-site');
  if (site !== undefined && site !== 'same-origin') return false;
  const origin = originOf(request);
  return origin === undefined || origin === ownOrigin(config, request);
}

function carriesToken(request: Request): boolean {
  const expected = Buffer.from(request.session.forgeryToken ?? '');
  const given = Buffer.from(request.get(forgeryHeader) ?? '');
  return expected.length > 0 && given.length === expected.length && timingSafeEqual(given, expected);
}

/** A form of another site can send neither JSON nor, with our header, anything else. */
function isOurKind(request: Request): boolean {
  const hasBody = request.get('transfer-encoding') !== undefined || Number(request.get('content-length') ?? 0) > 0;
  return !hasBody || Boolean(request.is(['application/json', 'multipart/form-data']));
}

const isReading = (request: Request): boolean => reading.has(request.method);
const forged = () => new Rejection('not-allowed', 'problem-forged');

/** Refuses what changes something unless it comes from our own pages and is JSON or an upload. */
export const forgeryCheck =
  (config: Config): RequestHandler =>
  (request, response, next) => {
    response.vary('Sec-Fetch-Site').vary('Origin');
    if (!isReading(request) && (!comesFromUs(config, request) || !isOurKind(request))) throw forged();
    next();
  };

/** Refuses what changes something unless it carries its session's token; asked after who somebody is, so that an ended session is told apart. */
export function refuseWithoutToken(request: Request): void {
  if (!isReading(request) && !carriesToken(request)) throw forged();
}

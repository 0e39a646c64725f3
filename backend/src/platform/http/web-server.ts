import compression from 'compression';
import express, { type Express, type RequestHandler } from 'express';
import { SessionStore } from '../session/session-store';
import type { Identities, Visits } from '../session/session-control';
import type { Platform } from '../platform';
import type { MailCatcher } from '../mail/mail-catcher';
import { apiRouter } from './api-router';
import { caughtMails } from './caught-mails';
import { forgeryCheck } from './forgery';
import { safetyHeaders } from './headers';
import { IdempotencyKeys } from './idempotency';
import type { Route } from './mount';
import { problemHandler } from './problem';
import { Readiness } from './readiness';
import { reference } from './reference';
import { requestLimits } from './request-limits';
import { requestLog } from './request-log';
import { Sessions, cookieName, nameCaller, signedInOf } from './sessions';
import { webPages } from './web-pages';
import { Rejection } from '#shared/problems/rejection';

/** What the features bring to the web: their routes, and who people are. */
export interface WebParts {
  readonly routes: readonly Route[];
  readonly identities: Identities;
  readonly visits: Visits;
  readonly isPage: (path: string) => boolean;
  /** Catches mail where there is no mail server; its page is for the machine's own user. */
  readonly catcher: MailCatcher | undefined;
}

export interface WebServer {
  readonly express: Express;
  readonly readiness: Readiness;
  /** Deletes sessions and keys that have had their time. */
  readonly sweep: () => Promise<void>;
}

const neverKept: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store');
  next();
};

const named: RequestHandler = (request, _response, next) => {
  nameCaller(request, signedInOf(request));
  request.workshopId ??= request.visitingClient?.workshopId;
  next();
};

const notHere: RequestHandler = () => {
  throw new Rejection('not-found', 'problem-not-found');
};

/** The whole of the server behind the socket, in the order a request meets it. */
export function openWebServer(platform: Platform, parts: WebParts): WebServer {
  const { config, clock, database, log } = platform;
  const store = new SessionStore(database, clock);
  const sessions = new Sessions(config, store, parts.identities, parts.visits);
  const keys = new IdempotencyKeys(database, clock);
  const readiness = new Readiness(database);
  const app = express();
  app.disable('x-powered-by').set('query parser', 'simple').set('etag', false);
  app.set('trust proxy', config.publicUrl ? 'loopback' : false);
  app.use(requestLog(log), readiness.letGo, safetyHeaders());
  app.get('/healthz', readiness.alive).get('/readyz', readiness.ready);
  app.use(compression());
  app.use('/api', neverKept, sessions.middleware(), named, requestLimits(config), forgeryCheck(config));
  app.use(
    reference(
      parts.routes.map(({ endpoint }) => endpoint),
      cookieName(config),
    ),
  );
  app.use(apiRouter(parts.routes, { database, sessions, keys }));
  if (parts.catcher && !config.publicUrl) app.get('/development/mail', caughtMails(parts.catcher));
  app.use(webPages(config.webFolder, parts.isPage), notHere, problemHandler(log, parts.identities));
  const sweep = async () => void (await Promise.all([store.sweep(), keys.sweep()]));
  return { express: app, readiness, sweep };
}

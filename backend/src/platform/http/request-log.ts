import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Log } from '../log/log';
import './request-data';

/** Numbers each request and writes one line when it is done: who, what, how long. Neither bodies nor headers nor queries are logged. */
export const requestLog =
  (log: Log): RequestHandler =>
  (request, response, next) => {
    const began = performance.now();
    request.requestId = randomUUID();
    response.set('X-Request-Id', request.requestId);
    response.on('finish', () => {
      const { method, path, requestId, workshopId, accountId } = request;
      const took_milliseconds = Math.round(performance.now() - began);
      log.info(
        { requestId, workshopId, accountId, method, path, status: response.statusCode, took_milliseconds },
        'request',
      );
    });
    next();
  };

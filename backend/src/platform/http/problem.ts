import type { ErrorRequestHandler, Request, Response } from 'express';
import { MulterError } from 'multer';
import { complaintsOf } from '#shared/problems/complaints-of';
import { problemStatus, type Problem } from '#shared/problems/problem-schema';
import { Rejection } from '#shared/problems/rejection';
import * as z from 'zod';
import { failureOf } from '../database/failure';
import type { Log } from '../log/log';
import type { Identities } from '../session/session-control';
import { words, wordsFor, type Words } from './words';

interface ParserError {
  readonly type?: string;
  readonly status?: number;
}

/** Another workshop's row is no more than a row that is not there, also where a new row points to it. */
function ofDatabase(error: unknown): Rejection | undefined {
  switch (failureOf(error)) {
    case 'unreachable':
      return new Rejection('unavailable', 'problem-unavailable', { retryAfter_seconds: 5 });
    case 'unfounded':
      return new Rejection('not-found', 'problem-not-found');
    case 'needed':
    case 'taken':
      return new Rejection('conflict', 'problem-conflict');
    case undefined:
      return undefined;
  }
}

function ofParser(error: unknown): Rejection | undefined {
  if (error instanceof MulterError) {
    const tooLarge = error.code === 'LIMIT_FILE_SIZE';
    return tooLarge
      ? new Rejection('too-large', 'problem-too-large', { values: { limit: 'this upload' } })
      : new Rejection('invalid', 'problem-invalid');
  }
  const { status, type } = error as ParserError;
  if (status === 413) return new Rejection('too-large', 'problem-too-large', { values: { limit: 'this request' } });
  if (status === 415) return new Rejection('unsupported', 'problem-unsupported');
  return type || (status && status < 500) ? new Rejection('invalid', 'problem-invalid') : undefined;
}

/** The refusal an error amounts to; undefined for a fault of our own. */
export function rejectionOf(error: unknown): Rejection | undefined {
  if (error instanceof Rejection) return error;
  if (error instanceof z.ZodError)
    return new Rejection('invalid', 'problem-invalid', { complaints: complaintsOf(error) });
  if (typeof error !== 'object' || error === null) return undefined;
  return ofDatabase(error) ?? ofParser(error);
}

function problemOf(rejection: Rejection, requestId: string, words: Words): Problem {
  const { complaints = [], values, detail } = rejection.more;
  return {
    type: `urn:problem:${rejection.code}`,
    title: words(rejection.code, values),
    status: problemStatus[rejection.kind],
    instance: `urn:request:${requestId}`,
    errors: complaints.map(({ path, code, values: own }) => ({ path: [...path], message: words(code, own) })),
    ...(detail === undefined ? {} : { current: detail }),
  };
}

const faultOf = (requestId: string): Problem => ({
  type: 'urn:problem:problem-internal',
  title: words('problem-internal', { request: requestId }),
  status: 500,
  instance: `urn:request:${requestId}`,
  errors: [],
});

export function sendProblem(response: Response, problem: Problem): void {
  response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
}

const level = (status: number): 'warn' | 'info' => (status === 400 || status === 404 ? 'info' : 'warn');

/** The words of whoever asked; plain ones where nobody is known, or their workshop cannot be read just now. */
async function wordsOf(request: Request, identities: Identities): Promise<Words> {
  if (request.workshopId === undefined) return words;
  return identities.formatsOf(request.workshopId).then(wordsFor, () => words);
}

/** Turns whatever was thrown into `application/problem+json`: a refusal with its words, anything else one bland sentence with a number. */
export const problemHandler =
  (log: Log, identities: Identities): ErrorRequestHandler =>
  async (error: unknown, request: Request, response: Response, next) => {
    if (response.headersSent) return next(error);
    const { requestId, workshopId, accountId } = request;
    const rejection = rejectionOf(error);
    if (!rejection) {
      log.error({ requestId, workshopId, accountId, error }, 'fault');
      return sendProblem(response, faultOf(requestId));
    }
    const problem = problemOf(rejection, requestId, await wordsOf(request, identities));
    log[level(problem.status)](
      { requestId, workshopId, accountId, refusal: rejection.code, status: problem.status },
      'refused',
    );
    if (rejection.more.retryAfter_seconds) response.set('Retry-After', String(rejection.more.retryAfter_seconds));
    sendProblem(response, problem);
  };

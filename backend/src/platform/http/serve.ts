import type { Request, RequestHandler, Response } from 'express';
import type { Endpoint } from '#shared/actor/endpoint';
import { Rejection } from '#shared/problems/rejection';
import type { Database } from '../database/database';
import { signedInOf, type Sessions } from './sessions';
import { FileAnswer, PreparedAnswer } from './answer';
import type { Call, SignedBody, Upload } from './call';
import { audienceFor } from './guard';
import { keyOf, type IdempotencyKeys } from './idempotency';
import type { Route } from './mount';
import { parseRequest, versionSeen } from './parse';
import { send } from './send';
import { Turns } from './turns';

/** What serving a route needs beside the route. */
export interface Serving {
  readonly database: Database;
  readonly sessions: Sessions;
  readonly keys: IdempotencyKeys;
}

const uploadOf = (request: Request): Upload | undefined =>
  request.file && {
    name: Buffer.from(request.file.originalname, 'latin1').toString('utf8'),
    bytes: request.file.buffer,
  };

const signedOf = (endpoint: Endpoint, request: Request): SignedBody | undefined =>
  endpoint.signature
    ? {
        bytes: Buffer.isBuffer(request.body) ? request.body : Buffer.alloc(0),
        signature: request.get(endpoint.signature) ?? '',
      }
    : undefined;

function callOf(endpoint: Endpoint, request: Request, sessions: Sessions): Call {
  const signedIn = signedInOf(request);
  return {
    ...parseRequest(endpoint, request),
    person: signedIn?.person,
    actor: signedIn?.actor,
    client: request.visitingClient,
    version: versionSeen(endpoint, request),
    upload: uploadOf(request),
    signed: signedOf(endpoint, request),
    session: sessions.control(request),
    from: {
      requestId: request.requestId,
      address: request.ip ?? '',
      agent: (request.get('user-agent') ?? '').slice(0, 200),
    },
  } as Call;
}

/** The answer as its audience may have it: a field the schema does not name is a fault of ours, and nothing is sent. */
function checked(endpoint: Endpoint, request: Request, answer: unknown): unknown {
  if (answer instanceof FileAnswer || answer instanceof PreparedAnswer) return answer;
  const audience = audienceFor(endpoint, signedInOf(request));
  const schema = audience && endpoint.answers[audience];
  if (!schema) return undefined;
  const read = schema.safeParse(answer);
  if (read.success) return read.data;
  throw new Error(`the answer of ${endpoint.name} does not fit its ${audience} schema: ${read.error.message}`);
}

/** A stale version is refused with what stands there now, presented like any answer. */
function withCurrent(route: Route, call: Call, error: unknown): unknown {
  if (!(error instanceof Rejection) || error.kind !== 'stale') return error;
  const { detail, ...more } = error.more;
  const current = detail === undefined ? undefined : route.current?.(detail as never, call);
  return new Rejection('stale', error.code, { ...more, ...(current === undefined ? {} : { detail: current }) });
}

const scopeOf = (endpoint: Endpoint, request: Request): string => {
  const signedIn = signedInOf(request);
  if (endpoint.callers === 'client') return `client ${request.visitingClient?.accessId ?? ''}`;
  return signedIn?.actor?.membershipId ?? signedIn?.person.accountId ?? `address ${request.ip ?? ''}`;
};

/** Reading needs no transaction, and what goes in steps opens its own. */
const isOneTransaction = ({ method, inSteps = false }: Endpoint): boolean => method !== 'get' && !inSteps;

/** The Express handler of a route: parse, run in one transaction if it changes something, check the answer, send it. */
export function serve(route: Route, serving: Serving): RequestHandler {
  const { endpoint } = route;
  const run = async (request: Request, call: Call): Promise<unknown> =>
    checked(endpoint, request, await route.handle(call));
  const once = (request: Request, call: Call): Promise<unknown> => {
    if (!endpoint.idempotent) return run(request, call);
    const content = JSON.stringify([endpoint.name, call.params, call.query, call.body]);
    return serving.keys.once(
      { scope: scopeOf(endpoint, request), key: keyOf(request.get('idempotency-key')), content },
      () => run(request, call),
    );
  };
  const turns = endpoint.atOnce === undefined ? undefined : new Turns(endpoint.atOnce);
  return async (request: Request, response: Response) => {
    const call = callOf(endpoint, request, serving.sessions);
    const work = isOneTransaction(endpoint)
      ? () => serving.database.transaction(() => once(request, call))
      : () => run(request, call);
    const answer = await (turns ? turns.take(work) : work()).catch((error: unknown) =>
      Promise.reject(withCurrent(route, call, error) as Error),
    );
    send(endpoint, { request, response }, answer);
  };
}

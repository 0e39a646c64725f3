import express, { Router, type RequestHandler } from 'express';
import multer, { MulterError } from 'multer';
import type { Endpoint } from '#shared/actor/endpoint';
import { Rejection } from '#shared/problems/rejection';
import { signedInOf } from './sessions';
import { refuseWithoutToken } from './forgery';
import { guard } from './guard';
import type { Route } from './mount';
import { serve, type Serving } from './serve';

export const limits = { body: '2mb', upload_bytes: 20 * 1024 * 1024 } as const;

const upload = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: limits.upload_bytes, files: 1, fields: 20, parts: 21, fieldSize: 64 * 1024 },
});
const json = express.json({ limit: limits.body, strict: true });

/** What the reader of forms throws is about the form, not about us. */
const form =
  (field: string): RequestHandler =>
  (request, response, next) => {
    void upload.single(field)(request, response, (error: unknown) => {
      next(error === undefined || error instanceof MulterError ? error : new Rejection('invalid', 'problem-invalid'));
    });
  };

const bytes = express.raw({ limit: limits.body, type: 'application/json' });

/** A signed body is kept as it came: its signature is over the bytes. */
function reader(endpoint: Endpoint): RequestHandler {
  if (endpoint.signature) return bytes;
  return endpoint.upload ? form(endpoint.upload) : json;
}

/** Before the body is read: what somebody may not send is not taken in. */
const guarded =
  (endpoint: Endpoint): RequestHandler =>
  (request, _response, next) => {
    guard(endpoint, signedInOf(request), request.visitingClient);
    if (!endpoint.signature) refuseWithoutToken(request);
    next();
  };

/** Every parameter once: `?id=1&id=2` and `id[]=1` are not guessed at. */
const single: RequestHandler = (request, _response, next) => {
  const repeated = Object.entries(request.query).filter(([, value]) => Array.isArray(value));
  if (repeated.length === 0) return next();
  const complaints = repeated.map(([name]) => ({
    path: ['query', name],
    code: 'entry-wrong-kind' as const,
    values: {},
  }));
  throw new Rejection('invalid', 'problem-invalid', { complaints });
};

/** All routes, each under its endpoint's own path and method. */
export function apiRouter(routes: readonly Route[], serving: Serving): Router {
  const router = Router({ caseSensitive: true, strict: true });
  for (const route of routes) {
    const { method, path } = route.endpoint;
    router[method](path, guarded(route.endpoint), single, reader(route.endpoint), serve(route, serving));
  }
  router.use('/api', () => {
    throw new Rejection('not-found', 'problem-not-found');
  });
  return router;
}

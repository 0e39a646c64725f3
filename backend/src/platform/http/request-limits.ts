import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import type { Request, RequestHandler } from 'express';
import { Rejection } from '#shared/problems/rejection';
import type { Config } from '../config/config';
import { signedInOf } from './sessions';

/** A person counts for themselves in each workshop; a stranger counts with their address (an IPv6 network as one). */
const keyOf = (request: Request): string => {
  const signedIn = signedInOf(request);
  return signedIn
    ? `${signedIn.actor?.workshopId ?? 'none'} ${signedIn.person.accountId}`
    : ipKeyGenerator(request.ip ?? '');
};

/** Refuses with 429 and Retry-After what comes too often from one person or address within a minute. */
export const requestLimits = (config: Config): RequestHandler =>
  rateLimit({
    windowMs: 60_000,
    limit: config.requestsPerMinute,
    keyGenerator: keyOf,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, response, next) => {
      const wait_seconds = Math.max(1, Number(response.get('Retry-After') ?? 60));
      const values = { wait_minutes: Math.ceil(wait_seconds / 60) };
      next(new Rejection('too-many', 'problem-too-many', { values, retryAfter_seconds: wait_seconds }));
    },
  });

import * as z from 'zod';
import type { RejectionKind } from '#shared/problems/rejection';

/** The HTTP status of each kind of refusal. */
export const problemStatus: Readonly<Record<RejectionKind, number>> = {
  invalid: 400,
  'signed-out': 401,
  'not-allowed': 403,
  'not-found': 404,
  conflict: 409,
  gone: 410,
  stale: 412,
  'too-large': 413,
  unsupported: 415,
  unprocessable: 422,
  'too-many': 429,
  unavailable: 503,
};

/** An answer of RFC 9457 (`application/problem+json`) with every complaint at once. */
export const problemSchema = z.strictObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  instance: z.string(),
  errors: z.array(z.strictObject({ path: z.array(z.union([z.string(), z.number()])), message: z.string() })),
  current: z.unknown().optional(),
});

export type Problem = z.infer<typeof problemSchema>;

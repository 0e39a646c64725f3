import * as z from 'zod';
import { day, identifier, paragraphs } from '#shared/problems/entry-schema';

/** What a person says who gives a client a way in: the last day of it, whether it goes out by mail at once, and a word beside it. */
export const accessRequestSchema = z.strictObject({ endsOn: day, send: z.boolean(), note: paragraphs(2000) });
export type AccessRequest = z.infer<typeof accessRequestSchema>;

/** How a way in stands; the secret itself is kept nowhere. */
export const accessSchema = z.strictObject({
  id: identifier,
  purpose: z.enum(['link', 'sign-in']),
  createdAt: z.string(),
  createdBy: z.string(),
  endsAt: z.string(),
  revokedAt: z.string().nullable(),
  openedAt: z.string().nullable(),
});
export type Access = z.infer<typeof accessSchema>;

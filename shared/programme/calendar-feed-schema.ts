import * as z from 'zod';
import { identifier, instant, line } from '#shared/problems/entry-schema';

/** A calendar that other programs read: of one person, or of the whole workshop (null). */
export const feedEntrySchema = z.strictObject({ name: line(80), personId: identifier.nullable() });

export const calendarFeedSchema = z.strictObject({
  id: identifier,
  name: z.string(),
  personId: z.string().nullable(),
  madeBy: z.string(),
  madeAt: instant,
  revokedAt: instant.nullable(),
  readAt: instant.nullable(),
});
export type Feed = z.infer<typeof calendarFeedSchema>;

/** Shown once: afterwards only its hash is known. */
export const newCalendarFeedSchema = calendarFeedSchema.extend({ address: z.string() });

/** What a calendar's address is known by: 256 bits. */
export const feedSecret = z.string().regex(/^[A-Za-z0-9_-]{43}$/);

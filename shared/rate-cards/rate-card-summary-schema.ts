import * as z from 'zod';
import { day, identifier, line } from '#shared/problems/entry-schema';

/** Where a card stands on a day: still being written, set for a later day, in force, or followed by another. */
export const rateCardStates = ['draft', 'set', 'in-force', 'past'] as const;
export type RateCardState = (typeof rateCardStates)[number];

export const rateCardName = line(120);

/** A rate card without its content. */
export const rateCardSummarySchema = z.strictObject({
  id: identifier,
  version: z.int(),
  name: z.string(),
  state: z.enum(rateCardStates),
  /** The day from which it is worked with; null while it is a draft. */
  from: day.nullable(),
  basedOnId: identifier.nullable(),
  changedAt: z.string(),
});
export type RateCardSummary = z.infer<typeof rateCardSummarySchema>;

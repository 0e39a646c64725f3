import * as z from 'zod';
import { cardSections, type CardDifference } from '#shared/rate-cards/card-differences';

const value = z.union([z.string(), z.number(), z.boolean(), z.null()]);

/** A line in which two rate cards differ. */
export const cardDifferenceSchema = z.strictObject({
  kind: z.enum(['changed', 'added', 'removed', 'moved']),
  section: z.enum(cardSections),
  list: z.string(),
  itemId: z.string(),
  itemName: z.string(),
  field: z.string(),
  before: value,
  after: value,
}) satisfies z.ZodType<CardDifference>;

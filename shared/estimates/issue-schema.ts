import * as z from 'zod';
import { issueStates } from '#shared/estimates/issue-state';
import type { LineDifference } from '#shared/estimates/line-differences';
import { workKinds } from '#shared/estimates/price/work-kind';
import { day, paragraphs } from '#shared/problems/entry-schema';
import { findingSchema } from '#shared/words/reason-schema';

/** What a person says when issuing: a note, and whether a rate card no longer in force is meant. */
export const issueRequestSchema = z.strictObject({
  /** Version of the draft the person saw; somebody else's later change is not issued unseen. */
  version: z.int().min(1),
  note: paragraphs(1000),
  acceptsOldCard: z.boolean(),
});

export const issueMarkSchema = z.strictObject({
  state: z.enum(['sent', 'accepted', 'declined']),
  day: day,
  note: paragraphs(1000),
});

export const issueSummarySchema = z.strictObject({
  id: z.uuid(),
  estimateId: z.uuid(),
  letter: z.string(),
  state: z.enum(issueStates),
  issuedAt: z.string(),
  issuedBy: z.string(),
  note: z.string(),
  validUntil: z.string(),
  leafValidUntil: z.string(),
  markedOn: z.string().nullable(),
  markNote: z.string(),
  sha256: z.string(),
});

export const pricedIssueSummarySchema = issueSummarySchema.extend({
  net_minor: z.int(),
  tax_minor: z.int(),
  gross_minor: z.int(),
  /** What was agreed where its client accepted it on their page: the alternatives by their names, and what it comes to with them. */
  agreed: z
    .strictObject({
      alternatives: z.array(z.string()),
      net_minor: z.int(),
      tax_minor: z.int(),
      gross_minor: z.int(),
    })
    .optional(),
  /** Told where an issue is read whole: its client can take none of its alternatives, for the calculator that worked it was changed since. */
  choicesFixed: z.boolean().optional(),
});
export type IssueSummary = z.infer<typeof issueSummarySchema>;
export type PricedIssueSummary = z.infer<typeof pricedIssueSummarySchema>;

/** The dates an issue was made with: the earliest start, how long it takes, the day that is offered, and what they assume. */
export const frozenDatesSchema = z.strictObject({
  startsOn: day,
  finishesOn: day,
  offeredOn: day,
  workingDays: z.int(),
  assumptions: z.array(findingSchema),
});
export type FrozenDates = z.infer<typeof frozenDatesSchema>;

/** A line in which two issues (or an issue and the draft) differ. */
export const lineDifferenceSchema = z.strictObject({
  lineId: z.string(),
  member: z.string().nullable(),
  kind: z.enum(workKinds),
  name: z.string().nullable(),
  before_minor: z.int().nullable(),
  after_minor: z.int().nullable(),
}) satisfies z.ZodType<LineDifference>;

/** The papers of an issue; those with prices are not for the bench. */
export const papers = ['estimate.pdf', 'estimate.xlsx', 'leaf-order.pdf', 'leaf-order.csv'] as const;
export type Paper = (typeof papers)[number];

import * as z from 'zod';
import { questionSchema } from '#shared/agreements/question-schema';
import { clientIssueSummarySchema } from '#shared/client-page/client-overview-schema';
import { clientLetterheadSchema } from '#shared/client-page/client-letterhead-schema';
import { clientPriceSchema } from '#shared/client-page/client-price-schema';
import type { UsedBuildUp } from '#shared/estimates/buildups-used';
import { shapeSchema } from '#shared/measure/shape-schema';
import { findingSchema } from '#shared/words/reason-schema';

const stripColour = z.string() as unknown as z.ZodType<UsedBuildUp['layers'][number]['colour']>;

/** A build-up as its section strip draws it, with the leaf laid in it and the zones that get it. */
const clientBuildUpSchema = z.strictObject({
  buildUp: z.string(),
  zoneIds: z.array(z.string()),
  leaf: z.array(z.string()),
  layers: z.array(
    z.strictObject({
      stepId: z.string(),
      name: z.string(),
      coats: z.tuple([z.number(), z.number()]),
      colour: stripColour,
      thickness: z.number(),
      thickness_mm: z.number().nullable(),
    }),
  ),
});

/** A member as it is drawn and named; those of an alternative carry its id. */
const clientMemberSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  count: z.int(),
  timber: z.string(),
  shape: shapeSchema,
  ornaments: z.array(z.string()),
  finishes: z.array(z.string()),
  zoneIds: z.array(z.string()),
  alternativeId: z.uuid().nullable(),
});

/** An alternative by itself against the base: total, difference, whole weeks, and the build-ups it brings and takes away. */
const clientAlternativeSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  group: z.string(),
  note: z.string(),
  gross_minor: z.int(),
  difference_minor: z.int(),
  weeks: z.int(),
  replaces: z.array(z.string()),
  before: z.array(clientBuildUpSchema),
  after: z.array(clientBuildUpSchema),
});

/** What was decided, as the client who decided it reads it. */
export const clientDecisionSchema = z.strictObject({
  kind: z.enum(['accepted', 'declined']),
  typedName: z.string(),
  at: z.string(),
  choice: z.array(z.uuid()),
  reason: z.string(),
  gross_minor: z.int(),
  pdfSha256: z.string(),
});

export type ClientDecision = z.infer<typeof clientDecisionSchema>;

/** A whole issue as its client reads it; not a word of cost, margin, hours or rates. */
export const clientIssueSchema = z.strictObject({
  letterhead: clientLetterheadSchema,
  issue: clientIssueSummarySchema,
  /** The issue that stands in its place, where it was replaced. */
  replacedBy: z.uuid().nullable(),
  addressee: z.strictObject({ name: z.string(), contact: z.string(), address: z.string() }),
  job: z.strictObject({ id: z.uuid(), number: z.string(), title: z.string(), reference: z.string(), site: z.string() }),
  issuedBy: z.string(),
  leafValidUntil: z.string().nullable(),
  introduction: z.string(),
  note: z.string(),
  included: z.string(),
  excluded: z.string(),
  terms: z.string(),
  presentation: z.enum(['members', 'kinds']),
  pieces: z.array(z.strictObject({ id: z.uuid(), name: z.string(), members: z.array(clientMemberSchema) })),
  buildUps: z.array(clientBuildUpSchema),
  price: clientPriceSchema,
  alternatives: z.array(clientAlternativeSchema),
  /** Whether alternatives can be chosen here; an issue that was worked by an earlier reckoning is accepted as it stands. */
  mayChoose: z.boolean(),
  isDrying: z.boolean(),
  /** The dates of the base as they were planned when it was issued; null where nothing was planned. */
  programme: z
    .strictObject({ startsOn: z.string(), finishesOn: z.string(), offeredOn: z.string(), workingDays: z.int() })
    .nullable(),
  cautions: z.array(findingSchema),
  /** The accepted issues a variation changes. */
  varies: z.array(z.strictObject({ number: z.string(), letter: z.string(), title: z.string() })),
  questions: z.array(questionSchema),
  decision: clientDecisionSchema.nullable(),
});
export type ClientIssue = z.infer<typeof clientIssueSchema>;

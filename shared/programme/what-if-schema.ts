import * as z from 'zod';
import { climateSchema } from '#shared/drying/drying-card-schema';
import { cardItemId } from '#shared/problems/card-entry-schema';
import { day } from '#shared/problems/entry-schema';
import {
  programmeFrame,
  programmeId,
  programmeItemSchema,
  programmeRequestSchema,
} from '#shared/programme/programme-schema';
import type { WhatIf } from '#shared/programme/what-if';
import { findingSchema } from '#shared/words/reason-schema';

export const whatIfSchema = z.strictObject({
  day: day.nullable(),
  climate: climateSchema.nullable(),
  furtherGradeIds: z.array(cardItemId).max(6),
  lots: z
    .array(z.strictObject({ lotId: programmeId, buildUpId: cardItemId, onlySize: z.boolean().optional() }))
    .max(500),
}) satisfies z.ZodType<WhatIf>;

/** What to solve, and money against the estimate as it stands; a plan's further people are set up besides (`costOfFurtherHands`). */
export const whatIfAnswerSchema = z.strictObject({
  ...programmeFrame,
  request: programmeRequestSchema,
  items: z.array(programmeItemSchema),
  findings: z.array(findingSchema),
  cost_minor: z.int(),
  costDifference_minor: z.int(),
  gross_minor: z.int(),
  grossDifference_minor: z.int(),
  rates: z.array(z.strictObject({ gradeId: z.string(), costPerHour: z.string() })),
  setUp_hours: z.number(),
  overtime_percent: z.number(),
  digits: z.int(),
});
export type WhatIfAnswer = z.infer<typeof whatIfAnswerSchema>;

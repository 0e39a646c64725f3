import * as z from 'zod';
import type { AlternativeSection, AlternativeSections } from '#shared/estimates/alternative-sections';

const colour = z.string() as unknown as z.ZodType<AlternativeSection['layers'][number]['colour']>;

const sectionSchema = z.strictObject({
  buildUp: z.string(),
  zoneIds: z.array(z.string()),
  leaf: z.array(z.string()),
  layers: z.array(
    z.strictObject({
      ...{ stepId: z.string(), name: z.string(), colour, thickness: z.number(), thickness_mm: z.number().nullable() },
      coats: z.tuple([z.number(), z.number()]),
    }),
  ),
  timber: z.string(),
}) satisfies z.ZodType<AlternativeSection>;

/** The sections an alternative changes: those of the base, and its own. */
export const alternativeSectionsSchema: z.ZodType<AlternativeSections> = z.strictObject({
  before: z.array(sectionSchema),
  after: z.array(sectionSchema),
});

import * as z from 'zod';
import { alternativeSectionsSchema } from '#shared/estimates/alternative-sections-schema';
import { figuresSchema, pricedFiguresSchema } from '#shared/estimates/figures-schema';
import { workFiguresSchema } from '#shared/estimates/work-figures-schema';
import { memberContentSchema, pieceContentSchema } from '#shared/estimates/member-schema';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { identifier, instant, version } from '#shared/problems/entry-schema';

/** The first of a job and its like, or a variation of what was agreed on the job. */
export const estimateKinds = ['estimate', 'variation'] as const;
export type EstimateKind = (typeof estimateKinds)[number];

/** An estimate in a list: no figure that everybody may not see. */
export const estimateSummarySchema = z.strictObject({
  id: identifier,
  kind: z.enum(estimateKinds),
  number: z.string(),
  title: z.string(),
  /** The letter of its newest issue; null before the first. */
  letter: z.string().nullable(),
  members: z.int(),
  changedAt: instant,
});
export type EstimateSummary = z.infer<typeof estimateSummarySchema>;

const kept = <S extends z.ZodType>(content: S) => z.strictObject({ id: identifier, version, content });

const pieces = z.array(kept(pieceContentSchema));
const members = z.array(kept(memberContentSchema));

/** What stands over an estimate for every reader. */
const head = {
  id: identifier,
  jobId: identifier,
  number: z.string(),
  /** Raised with every change of anything in it. */
  version,
  rateCardId: identifier,
  currency: z.string(),
  pieces,
  members,
};

const settingsVersion = version;
const benchSettings = settingsSchema.pick({
  title: true,
  place: true,
  restoration: true,
  shop: true,
  site: true,
  alternatives: true,
});
const priceSettings = settingsSchema.omit({ profit: true, contingency: true, extras: true, seed: true });

export const workedEstimateSchema = z.strictObject({
  ...head,
  settings: benchSettings,
  settingsVersion,
  figures: workFiguresSchema,
});
export const pricedEstimateSchema = z.strictObject({
  ...head,
  settings: priceSettings,
  settingsVersion,
  figures: pricedFiguresSchema,
});
export const costedEstimateSchema = z.strictObject({
  ...head,
  settings: settingsSchema,
  settingsVersion,
  figures: figuresSchema,
});

export type CostedEstimate = z.infer<typeof costedEstimateSchema>;
export type PricedEstimate = z.infer<typeof pricedEstimateSchema>;
export type WorkedEstimate = z.infer<typeof workedEstimateSchema>;

/** What comes back when changes were kept: the new versions and the server's figures. */
export const keptChangesSchema = z.strictObject({
  version,
  versions: z.array(z.strictObject({ id: identifier, version })),
  figures: figuresSchema,
});
export type KeptChanges = z.infer<typeof keptChangesSchema>;

/** What one way of doing the work takes: booklets, hours of carving and gilding, and how long until it is ready. */
export const alternativeTallySchema = z.strictObject({
  booklets: z.number(),
  hours: z.number(),
  workingDays: z.number(),
  weeks: z.number(),
});

/** An alternative by itself: its gross total and what it is more or less than the base, in minor units, what it takes, and the sections it changes. */
export const alternativeTotalSchema = z.strictObject({
  id: identifier,
  gross_minor: z.int(),
  difference_minor: z.int(),
  /** Issues made before these were kept have none. */
  tally: alternativeTallySchema.optional(),
  sections: alternativeSectionsSchema.optional(),
});

/** Who else is at work on the estimate, and its version, so that a page knows when to read it again. */
export const presenceSchema = z.strictObject({ version, others: z.array(z.string()), rateCardInForceId: identifier });

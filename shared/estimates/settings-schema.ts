import * as z from 'zod';
import { isAsMeasured, measuredWorkSchema } from '#shared/estimates/measured-work-schema';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import { complain } from '#shared/problems/complaints-of';
import { cardItemId, decimalEntry, percentEntry } from '#shared/problems/card-entry-schema';
import { identifier, line, optionalLine, paragraphs } from '#shared/problems/entry-schema';

export const climateSchema = z.strictObject({
  temperature_celsius: z.number().min(-10).max(45),
  humidity_percent: z.number().min(0).max(100),
});

const anyExtra = {
  id: identifier,
  name: line(120),
  taxCategoryId: cardItemId,
  memberId: identifier.nullable(),
  alternativeId: identifier.nullable(),
};

/** A decimal amount as text that may be negative. */
const signedDecimal = z.string().regex(/^-?\d{1,9}(\.\d{1,6})?$/);

const percentText = decimalEntry.refine((text) => Number(text) <= 100, complain('entry-too-large', { maximum: 100 }));

export const extraLineSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    ...anyExtra,
    kind: z.literal('labour'),
    gradeId: cardItemId,
    hours: z.number().min(0).max(100_000),
    work: z.enum(['making', 'sample', 'packing', 'fitting', 'other']),
  }),
  z.strictObject({ ...anyExtra, kind: z.literal('bought-in'), cost: decimalEntry }),
  z.strictObject({
    ...anyExtra,
    kind: z.literal('timber'),
    volume_dm3: z.number().min(0).max(1e6),
    price_per_dm3: decimalEntry,
    waste_percent: z.number().min(0).max(900),
  }),
  z
    .strictObject({
      ...anyExtra,
      kind: z.literal('paid-quantity'),
      rule: line(200),
      quantity: decimalEntry,
      unit: line(20),
      price: decimalEntry,
      measured: measuredWorkSchema.optional(),
    })
    .refine(isAsMeasured, { ...complain('paid-quantity-differs'), path: ['quantity'] }),
  z.strictObject({ ...anyExtra, kind: z.literal('insurance'), percent: percentText, value: decimalEntry.nullable() }),
  z.strictObject({ ...anyExtra, kind: z.literal('price'), price: signedDecimal }),
]) satisfies z.ZodType<ExtraLine>;

const profitSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('margin'), percent: decimalEntry }).refine(({ percent }) => Number(percent) < 100, {
    ...complain('entry-not-below', { maximum: 100 }),
    path: ['percent'],
  }),
  z.strictObject({ way: z.literal('mark-up'), percent: decimalEntry }),
  z.strictObject({ way: z.literal('lump-sum'), amount: decimalEntry }),
]);

const discountSchema = z
  .strictObject({ way: z.enum(['percent', 'amount']), amount: decimalEntry })
  .refine((discount) => discount.way === 'amount' || Number(discount.amount) <= 100, {
    ...complain('entry-too-large', { maximum: 100 }),
    path: ['amount'],
  });

/** Exactly, as the payments are worked: a sum of floats would let a hair through. */
const isWhole = (parts: readonly { readonly percent: number }[]): boolean =>
  cumulativePercents(parts.map(({ percent }) => percent))
    .at(-1)
    ?.equals(100) ?? false;

const stagesSchema = z
  .strictObject({
    deposit_percent: percentEntry,
    parts: z.array(z.strictObject({ id: identifier, name: line(80), percent: percentEntry })).max(24),
    retention_percent: percentEntry,
  })
  .refine(({ parts }) => parts.length === 0 || isWhole(parts), { ...complain('stages-not-whole'), path: ['parts'] })
  .refine((stages) => stages.deposit_percent + stages.retention_percent <= 100, {
    ...complain('stages-withhold-too-much'),
    path: ['retention_percent'],
  });

/** What is entered of an estimate as a whole. */
export const settingsSchema = z.strictObject({
  title: line(120),
  introduction: paragraphs(4000),
  place: z.enum(['indoors', 'outdoors', 'damp']),
  restoration: z.boolean(),
  shop: climateSchema,
  site: climateSchema,
  presentation: z.enum(['members', 'kinds']),
  profit: profitSchema.nullable(),
  contingency: z.strictObject({ way: z.enum(['share', 'risk']), percent: percentText }).nullable(),
  discount: discountSchema.nullable(),
  taxCategoryId: cardItemId,
  extras: z.array(extraLineSchema).max(100),
  alternatives: z
    .array(
      z.strictObject({
        id: identifier,
        name: line(120),
        group: optionalLine(80),
        note: paragraphs(1000),
        replaces: z.array(identifier).max(400),
      }),
    )
    .max(24),
  stages: stagesSchema,
  validity_days: z.int().min(1).max(730),
  leafValidity_days: z.int().min(1).max(730),
  included: paragraphs(4000),
  excluded: paragraphs(4000),
  terms: paragraphs(8000),
  seed: z.int().min(1).max(4_294_967_295),
}) satisfies z.ZodType<EstimateSettings>;

import * as z from 'zod';
import { type LeafCard, leafCharges, leafFinishes, layingWays } from '#shared/leaf/leaf-card';
import { type LeafBreak, type LeafProduct, alloyMetals, leafForms, leafMetals } from '#shared/leaf/leaf-product';
import { least_mm } from '#shared/measure/length-schema';
import {
  cardItemId,
  cardItemName,
  complainAt,
  decimalPercentEntry,
  itemList,
  lossEntry,
  percentEntry,
  positiveDecimalEntry,
} from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { tripleEntry } from '#shared/units/triple-schema';

const part = z.number().min(0).max(1e6);

const alloySchema = z
  .partialRecord(z.enum(alloyMetals), part)
  .refine((alloy) => Object.values(alloy).some((weight) => weight > 0), complain('leaf-alloy-empty'));

const breakSchema = z.strictObject({ booklets: z.int().min(2).max(10_000), off_percent: decimalPercentEntry });

function packsOnce(breaks: readonly LeafBreak[], context: z.core.$RefinementCtx): void {
  breaks.forEach((offer, at) => {
    if (breaks.findIndex((other) => other.booklets === offer.booklets) < at) {
      complainAt(context, [at, 'booklets'], complain('leaf-pack-twice'));
    }
  });
}

function lengthOfRibbon(product: Pick<LeafProduct, 'form' | 'ribbon_mm'>, context: z.core.$RefinementCtx): void {
  if (product.form === 'ribbon' && product.ribbon_mm === null)
    complainAt(context, ['ribbon_mm'], complain('leaf-ribbon-length'));
  if (product.form !== 'ribbon' && product.ribbon_mm !== null)
    complainAt(context, ['ribbon_mm'], complain('leaf-no-ribbon'));
}

/** A leaf of the rate card. */
export const leafProductSchema = z
  .strictObject({
    id: cardItemId,
    name: cardItemName,
    metal: z.enum(leafMetals),
    form: z.enum(leafForms),
    carat: z.number().gt(0).max(24).nullable(),
    alloy: alloySchema,
    side_mm: z.number().min(5).max(1000),
    ribbon_mm: z.number().min(least_mm).max(1e6).nullable(),
    leavesPerBooklet: z.int().min(1).max(10_000),
    price: positiveDecimalEntry,
    breaks: z.array(breakSchema).max(6).superRefine(packsOnce),
    gramsPerThousand: z.number().gt(0).max(1e6),
    thickness_micrometres: z.number().gt(0).max(1000).nullable(),
  })
  .superRefine(lengthOfRibbon) satisfies z.ZodType<LeafProduct>;

const share = tripleEntry(percentEntry);

const byWay = <S extends z.ZodType>(schema: S) => z.record(z.enum(layingWays), schema);

/** The leaf part of a rate card; breakage is at most 90 %. */
export const leafCardSchema = z.strictObject({
  products: itemList(leafProductSchema, 100),
  laps_mm: byWay(z.number().min(0).max(100)),
  losses: byWay(z.strictObject({ breakage_percent: tripleEntry(lossEntry), faulting_percent: share })),
  secondLaying_percent: z.record(z.enum(leafFinishes), byWay(share)),
  patchCuts: z.int().min(1).max(8),
  charge: z.enum(leafCharges),
  orderPercentile: z.number().min(50).max(99),
  spare_percent: percentEntry,
}) satisfies z.ZodType<LeafCard>;

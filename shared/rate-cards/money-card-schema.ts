import * as z from 'zod';
import { isRated } from '#shared/money/is-rated';
import { explainedCodes, taxCodes } from '#shared/money/tax-codes';
import {
  cardItemId,
  cardItemName,
  cardNote,
  decimalEntry,
  decimalPercentEntry,
  itemList,
} from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import type { MoneyCard, PaymentStage, TaxCategory } from '#shared/rate-cards/money-card';

const gradeSchema = z.strictObject({ id: cardItemId, name: cardItemName, costPerHour: decimalEntry });

/** Who has a rate charges it, all others charge none (EN 16931, BR-S-05, BR-Z/E/AE/IC/G/O-09). */
const rateFits = ({ code, percent }: TaxCategory): boolean =>
  code === 'S' ? Number(percent) > 0 : isRated(code) || Number(percent) === 0;
const reasonFits = ({ code, exemptionReason }: TaxCategory): boolean =>
  explainedCodes.includes(code) === (exemptionReason !== '');

const taxCategorySchema = z
  .strictObject({
    id: cardItemId,
    name: cardItemName,
    code: z.enum(taxCodes),
    percent: decimalPercentEntry,
    exemptionReason: cardNote,
  })
  .refine(rateFits, { ...complain('tax-rate-misfit'), path: ['percent'] })
  .refine(reasonFits, { ...complain('tax-reason-misfit'), path: ['exemptionReason'] }) satisfies z.ZodType<TaxCategory>;

const overheadSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('per-hour'), perHour: decimalEntry }),
  z.strictObject({ way: z.literal('share-of-labour'), percent: decimalEntry }),
]);

const contingencySchema = z.strictObject({
  way: z.enum(['share', 'risk']),
  percent: decimalPercentEntry,
  percentile: z.number().min(50).max(99),
  distribution: z.enum(['triangular', 'pert']),
  commonFactor: z.number().min(0).max(1),
});

const profitSchema = z
  .strictObject({ way: z.enum(['margin', 'mark-up']), percent: decimalEntry })
  .refine(({ way, percent }) => way === 'mark-up' || Number(percent) < 100, {
    ...complain('entry-not-below', { maximum: 100 }),
    path: ['percent'],
  });

const hours = z.number().min(0).max(10_000);
const gradeId = cardItemId;

const extrasSchema = z.strictObject({
  sampleBoard: z.strictObject({ hours, gradeId, booklets: z.int().min(0).max(100), leafProductId: cardItemId }),
  packing: z.strictObject({ hours, gradeId, crate: decimalEntry }),
  fitting: z.strictObject({ people: z.int().min(0).max(50), hours, gradeId }),
  touchingIn: z.strictObject({ hours, gradeId }),
  insurance_percent: decimalPercentEntry,
});

const makingSchema = z.strictObject({
  timbers: itemList(
    z.strictObject({ id: cardItemId, timberId: cardItemId, name: cardItemName, pricePerDm3: decimalEntry }),
    60,
  ),
  waste_percent: z.number().min(0).max(300),
  joineryGradeId: gradeId,
  turningGradeId: gradeId,
});

const comeToAll = (stages: readonly PaymentStage[]): boolean =>
  Math.abs(stages.reduce((sum, stage) => sum + Number(stage.percent), 0) - 100) < 1e-9;

const termsSchema = z
  .strictObject({
    deposit_percent: decimalPercentEntry,
    retention_percent: decimalPercentEntry,
    stages: itemList(z.strictObject({ id: cardItemId, name: cardItemName, percent: decimalPercentEntry }), 20)
      .min(1)
      .refine(comeToAll, complain('terms-stages-not-whole')),
  })
  .refine((terms) => Number(terms.deposit_percent) + Number(terms.retention_percent) <= 100, {
    ...complain('terms-withheld-over'),
    path: ['retention_percent'],
  });

/** The money part of a rate card; tax categories fit their code, stages come to 100 %. */
export const moneyCardSchema = z
  .strictObject({
    grades: itemList(gradeSchema, 40).min(1),
    overhead: overheadSchema,
    contingency: contingencySchema,
    profit: profitSchema,
    consumables_percent: decimalPercentEntry,
    taxCategories: itemList(taxCategorySchema, 20).min(1),
    defaultTaxCategoryId: cardItemId,
    extras: extrasSchema,
    making: makingSchema,
    terms: termsSchema,
    leafPricesHold_days: z.int().min(0).max(3650),
    currency: z
      .string()
      .regex(/^[A-Z]{3}$/)
      .optional(),
  })
  .refine((card) => card.taxCategories.some(({ id }) => id === card.defaultTaxCategoryId), {
    ...complain('entry-not-offered'),
    path: ['defaultTaxCategoryId'],
  }) satisfies z.ZodType<MoneyCard>;

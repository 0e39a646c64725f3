import * as z from 'zod';
import { workKinds } from '#shared/estimates/price/work-kind';
import { taxCodes } from '#shared/money/tax-codes';
import { reasonSchema } from '#shared/words/reason-schema';

const minor = z.int();

/** One line of a price: worked lines are named by their kind, the others have a name. `note` says by what a measured line is paid. */
const clientLineSchema = z.strictObject({
  id: z.string(),
  memberId: z.uuid().nullable(),
  kind: z.enum(workKinds),
  name: z.string().nullable(),
  measured: z
    .strictObject({
      ...{ quantity: z.string(), unit: z.string(), rule: z.string() },
      measures: z.array(reasonSchema.pick({ code: true, values: true })),
    })
    .nullable(),
  price_minor: minor,
});

const clientTaxSchema = z.strictObject({
  name: z.string(),
  code: z.enum(taxCodes),
  percent: z.string(),
  exemptionReason: z.string(),
  net_minor: minor,
  tax_minor: minor,
});

/** One payment in the order they fall due. */
const clientPaymentSchema = z.strictObject({
  of: z.enum(['deposit', 'stage', 'first-release', 'second-release']),
  name: z.string(),
  share_percent: z.number().nullable(),
  work_minor: minor,
  recovered_minor: minor,
  retained_minor: minor,
  paid_minor: minor,
});

/** What a choice comes to: lines, taxes, totals, payments, the whole weeks the work takes, and its care; nothing of how it is worked. */
export const clientPriceSchema = z.strictObject({
  choice: z.array(z.uuid()),
  lines: z.array(clientLineSchema),
  subtotal_minor: minor,
  discount_minor: minor,
  discount_percent: z.number().nullable(),
  net_minor: minor,
  taxes: z.array(clientTaxSchema),
  tax_minor: minor,
  gross_minor: minor,
  payments: z.array(clientPaymentSchema),
  weeks: z.int(),
  care: z.array(z.string()),
});
export type ClientPrice = z.infer<typeof clientPriceSchema>;

/** The last look before accepting: the price, and the SHA-256 of the exact paper. */
export const clientReviewSchema = z.strictObject({ price: clientPriceSchema, pdfSha256: z.string() });

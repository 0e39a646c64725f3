import * as z from 'zod';
import { exemptionCodes } from '#shared/invoices/exemption-codes';
import { invoiceKinds, type InvoiceContent } from '#shared/invoices/invoice';
import { vatId } from '#shared/invoices/invoice-settings-schema';
import { unitCodes } from '#shared/invoices/unit-code';
import { taxCodes } from '#shared/money/tax-codes';
import { decimalEntry, decimalPercentEntry, itemList, positiveDecimalEntry } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { day, identifier, line, optionalEmailAddress, optionalLine, paragraphs } from '#shared/problems/entry-schema';

/** The most an amount may be: a thousandth of what is counted exactly, so that sums of some hundred stay exact too. */
const largest_minor = 9_000_000_000_000;
export const amountEntry = z.int().min(1).max(largest_minor);
const positionEntry = z.int().min(0).max(largest_minor);

/** A quantity, below nothing for what is given back, never nothing. */
const quantityEntry = z
  .string()
  .regex(/^-?\d{1,7}(\.\d{1,6})?$/, { abort: true })
  .refine((text) => Number(text) !== 0, complain('entry-not-above', { minimum: 0 }));

const taxRateSchema = z.strictObject({ code: z.enum(taxCodes), percent: decimalPercentEntry });

const allowanceShape = {
  charge: z.boolean(),
  reason: line(120),
  reasonCode: z
    .string()
    .regex(/^[A-Z0-9]{1,3}$/)
    .nullable(),
  amount: z.discriminatedUnion('way', [
    z.strictObject({ way: z.literal('fixed'), amount_minor: positionEntry }),
    z.strictObject({ way: z.literal('percent'), base_minor: positionEntry, percent: decimalPercentEntry }),
  ]),
};

/** The id of a line: made by the browser, or of the stage it came from. */
const lineId = z.string().regex(/^[a-z0-9-]{1,40}$/);

export const invoiceLineSchema = z.strictObject({
  id: lineId,
  name: line(160),
  description: paragraphs(1000),
  quantity: quantityEntry,
  unit: z.enum(unitCodes),
  price: decimalEntry,
  baseQuantity: positiveDecimalEntry,
  allowancesCharges: z.array(z.strictObject(allowanceShape)).max(10),
  tax: taxRateSchema,
});

export const invoiceBuyerSchema = z.strictObject({
  name: line(120),
  contact: optionalLine(200),
  address: paragraphs(600),
  country: z.string().regex(/^[A-Z]{2}$/),
  vatId,
  companyNumber: optionalLine(40),
  email: optionalEmailAddress,
  reference: optionalLine(80),
});

const periodSchema = z
  .strictObject({ from: day, to: day })
  .refine(({ from, to }) => from <= to, { ...complain('invoice-period-turned'), path: ['to'] });

const exemptionSchema = z.strictObject({
  code: z.enum(taxCodes),
  reasonCode: z
    .string()
    .max(30)
    .refine((code) => code === '' || exemptionCodes.includes(code), complain('invoice-exemption-code')),
  reason: optionalLine(300),
});

const contentShape = {
  clientId: identifier,
  jobId: identifier.nullable(),
  buyer: invoiceBuyerSchema,
  pricesHold: z.enum(['net', 'gross']),
  lines: itemList(invoiceLineSchema, 200),
  allowancesCharges: z.array(z.strictObject({ ...allowanceShape, tax: taxRateSchema })).max(20),
  exemptions: z.array(exemptionSchema).max(10),
  deliveredOn: day.nullable(),
  period: periodSchema.nullable(),
  dueOn: day.nullable(),
  terms: paragraphs(600),
  roundsToCash: z.boolean(),
  note: paragraphs(2000),
};

export const invoiceContentSchema = z.strictObject(contentShape) satisfies z.ZodType<InvoiceContent>;

/** Letters about an invoice: the paper itself, a reminder, thanks for a payment by card. */
export const invoiceLetterKinds = ['paper', 'reminder', 'receipt'] as const;
export type InvoiceLetterKind = (typeof invoiceLetterKinds)[number];

export const invoiceStates = ['draft', 'issued'] as const;
export type InvoiceState = (typeof invoiceStates)[number];

const percentText = z.string().regex(/^\d{1,3}(\.\d{1,6})?$/);

export const stageClaimSchema = z.discriminatedUnion('of', [
  z.strictObject({ of: z.enum(['deposit', 'first-release', 'second-release']) }),
  z.strictObject({ of: z.literal('work'), from_percent: percentText, to_percent: percentText }),
  z.strictObject({ of: z.literal('again'), invoiceId: z.uuid() }),
]);

const findingSchema = z.strictObject({
  kind: z.enum(['refuse', 'missing', 'warn', 'caution', 'note']),
  code: z.string(),
  values: z.record(z.string(), z.union([z.string(), z.number()])),
  about: z.string().optional(),
});

const taxedNetSchema = z.strictObject({ tax: taxRateSchema, net_minor: z.int(), tax_minor: z.int() });

export const invoiceTotalsSchema = z.strictObject({
  lineNets_minor: z.array(z.int()),
  lineSum_minor: z.int(),
  allowances_minor: z.int(),
  charges_minor: z.int(),
  categories: z.array(taxedNetSchema),
  net_minor: z.int(),
  tax_minor: z.int(),
  gross_minor: z.int(),
  due_minor: z.int(),
});

/** One row of the list of invoices. `number` and days are null while it is a draft. */
export const invoiceSummarySchema = z.strictObject({
  id: z.uuid(),
  version: z.int(),
  kind: z.enum(invoiceKinds),
  state: z.enum(invoiceStates),
  number: z.string().nullable(),
  clientId: z.uuid(),
  clientName: z.string(),
  jobId: z.uuid().nullable(),
  creditedInvoiceId: z.uuid().nullable(),
  currency: z.string(),
  issuedOn: z.string().nullable(),
  dueOn: z.string().nullable(),
  isOverdue: z.boolean(),
  net_minor: z.int(),
  tax_minor: z.int(),
  gross_minor: z.int(),
  due_minor: z.int(),
  /** What of it is still to be paid. */
  open_minor: z.int(),
  credited_minor: z.int(),
});
export type InvoiceSummary = z.infer<typeof invoiceSummarySchema>;

/** An invoice read whole: what was entered, what it comes to, and what has to be said of it before it is issued. */
export const invoiceSchema = invoiceSummarySchema.extend({
  content: z.strictObject(contentShape),
  claim: z.strictObject({ issueId: z.uuid(), claim: stageClaimSchema }).nullable(),
  rounding_minor: z.int(),
  totals: invoiceTotalsSchema,
  findings: z.array(findingSchema),
  /** What was given up of it, why, when and by whom. */
  writeOffs: z.array(
    z.strictObject({
      id: z.uuid(),
      amount_minor: z.int(),
      reason: z.string(),
      writtenOn: z.string(),
      byName: z.string(),
    }),
  ),
  /** Where letters about it go now: the address on it, else the one kept of the client; empty where neither is known. */
  mailsTo: z.string(),
  /** What was mailed about it, the oldest first, with what was open of it then. */
  letters: z.array(
    z.strictObject({
      id: z.uuid(),
      kind: z.enum(invoiceLetterKinds),
      email: z.string(),
      at: z.string(),
      byName: z.string(),
      open_minor: z.int(),
    }),
  ),
  sha256: z.string().nullable(),
  papers: z.array(z.enum(['invoice.pdf', 'invoice.xml'])),
});
export type Invoice = z.infer<typeof invoiceSchema>;

/** The papers of an issued invoice. */
export const invoicePapers = ['invoice.pdf', 'invoice.xml'] as const;
export type InvoicePaper = (typeof invoicePapers)[number];

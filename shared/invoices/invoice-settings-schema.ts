import * as z from 'zod';
import { isVatNumber } from '#shared/invoices/exchange-country';
import type { InvoiceSettings } from '#shared/invoices/invoice-settings';
import { isIban } from '#shared/invoices/is-iban';
import { complain } from '#shared/problems/complaints-of';
import { optionalLine, paragraphs, version } from '#shared/problems/entry-schema';

const compact = z
  .string()
  .max(60)
  .transform((text) => text.replace(/\s/g, '').toUpperCase());

const iban = compact.refine((text) => text === '' || isIban(text), complain('invoice-account-wrong'));
const bic = compact.refine(
  (text) => text === '' || /^[A-Z0-9]{8}([A-Z0-9]{3})?$/.test(text),
  complain('entry-wrong-form'),
);

/** The number of a VAT registration with the two letters of its country, or nothing (EN 16931, BR-CO-09). */
export const vatId = compact.refine((text) => text === '' || isVatNumber(text), complain('invoice-vat-form'));

const prefix = z
  .string()
  .max(8)
  .regex(/^[A-Z0-9/-]*$/);

const firstNumber = z.int().min(1).max(999_999);

const settingsShape = {
  seller: z.strictObject({ vatId, taxNumber: optionalLine(40), companyNumber: optionalLine(40) }),
  account: z.strictObject({ name: optionalLine(70), iban, bic }),
  due_days: z.int().min(0).max(365),
  terms: paragraphs(600),
  closing: paragraphs(2000),
  invoicePrefix: prefix,
  creditNotePrefix: prefix,
  begins: z
    .strictObject({ year: z.int().min(1990).max(2200), invoice: firstNumber, creditNote: firstNumber })
    .nullable(),
};

export const invoiceSettingsSchema = z.strictObject(settingsShape) satisfies z.ZodType<InvoiceSettings>;

/** The settings as they are read, with their version: 0 while nobody has written any. */
export const keptInvoiceSettingsSchema = z.strictObject({
  ...settingsShape,
  version: z.union([z.literal(0), version]),
});
export type KeptInvoiceSettings = z.infer<typeof keptInvoiceSettingsSchema>;

import * as z from 'zod';
import { amountEntry } from '#shared/invoices/invoice-schema';
import { ages } from '#shared/invoices/owed-by-age';
import { ledgerKinds } from '#shared/invoices/ledger-entry';
import { currencyEntry } from '#shared/money/currency-schema';
import { complain } from '#shared/problems/complaints-of';
import { complainAt } from '#shared/problems/card-entry-schema';
import { day, identifier, line, optionalLine, paragraphs } from '#shared/problems/entry-schema';

/** How money came or went; `card` is never entered by hand. */
export const paymentWays = ['bank', 'cash', 'card'] as const;
export type PaymentWay = (typeof paymentWays)[number];

/** What a row of money is: one that failed is money back from a refund, a dispute what a bank took back, or gave back. */
export const paymentDeeds = ['payment', 'refund', 'refund-failed', 'dispute'] as const;
export type PaymentDeed = (typeof paymentDeeds)[number];

const shareSchema = z.strictObject({ invoiceId: identifier, amount_minor: amountEntry });

function sharesAreUnique(shares: readonly { readonly invoiceId?: unknown }[], context: z.core.$RefinementCtx): void {
  const seen = new Set<unknown>();
  shares.forEach(({ invoiceId }, place) => {
    if (seen.has(invoiceId)) complainAt(context, [place, 'invoiceId'], complain('entry-twice'));
    seen.add(invoiceId);
  });
}

/** A payment as the office enters it, with what of it is for which invoice; what is over is refused or kept, as is said. */
export const paymentEntrySchema = z.strictObject({
  clientId: identifier,
  way: z.enum(['bank', 'cash']),
  currency: currencyEntry,
  amount_minor: amountEntry,
  receivedOn: day,
  reference: optionalLine(140),
  shares: z.array(shareSchema).max(50).superRefine(sharesAreUnique),
  surplus: z.enum(['refuse', 'keep']),
});
export type PaymentEntry = z.infer<typeof paymentEntrySchema>;

export const shareEntrySchema = shareSchema;

export const refundEntrySchema = z.strictObject({
  /** Made by whoever asks, so that asking twice gives back once, here and at the payment service. */
  refundId: identifier,
  amount_minor: amountEntry,
  refundedOn: day,
  reference: optionalLine(140),
  /** Whether invoices may be left open again. */
  reopens: z.boolean(),
});
export type RefundEntry = z.infer<typeof refundEntrySchema>;

export const writeOffEntrySchema = z.strictObject({ amount_minor: amountEntry, reason: line(200) });

export const paymentSchema = z.strictObject({
  id: z.uuid(),
  clientId: z.uuid(),
  clientName: z.string(),
  deed: z.enum(paymentDeeds),
  way: z.enum(paymentWays),
  currency: z.string(),
  /** Below nothing for what went back. */
  amount_minor: z.int(),
  /** What no invoice has taken yet: it lies here to the client's credit. */
  credit_minor: z.int(),
  receivedOn: z.string(),
  reference: z.string(),
  refundsPaymentId: z.uuid().nullable(),
  shares: z.array(z.strictObject({ invoiceId: z.uuid(), number: z.string(), amount_minor: z.int() })),
  recordedBy: z.string(),
});
export type Payment = z.infer<typeof paymentSchema>;

export const owedSchema = z.strictObject({
  clientId: z.uuid(),
  clientName: z.string(),
  byAge_minor: z.record(z.enum(ages), z.int()),
  open_minor: z.int(),
  credit_minor: z.int(),
});

/** What is owed in one currency. */
export const owedInCurrencySchema = z.strictObject({
  currency: z.string(),
  items: z.array(owedSchema),
  open_minor: z.int(),
});
export type OwedInCurrency = z.infer<typeof owedInCurrencySchema>;

const entryShape = {
  id: z.uuid(),
  day: z.string(),
  kind: z.enum(ledgerKinds),
  clientId: z.uuid(),
  clientName: z.string(),
  number: z.string(),
  net_minor: z.int(),
  tax_minor: z.int(),
  rounding_minor: z.int(),
  amount_minor: z.int(),
};

/** A client's account, each currency by itself. A workshop that changed its currency has old invoices in another. */
export const statementSchema = z.strictObject({
  clientName: z.string(),
  from: z.string(),
  to: z.string(),
  currencies: z.array(
    z.strictObject({
      currency: z.string(),
      opening_minor: z.int(),
      lines: z.array(z.strictObject({ ...entryShape, balance_minor: z.int() })),
      closing_minor: z.int(),
    }),
  ),
});
export type Statement = z.infer<typeof statementSchema>;

const totalShape = { net_minor: z.int(), tax_minor: z.int(), rounding_minor: z.int(), amount_minor: z.int() };

export const journalSchema = z.strictObject({
  from: z.string(),
  to: z.string(),
  currencies: z.array(
    z.strictObject({
      currency: z.string(),
      entries: z.array(
        z.strictObject({
          ...{ ...entryShape, note: z.string() },
          paid: z.strictObject({ way: z.enum(paymentWays), invoices: z.array(z.string()) }).optional(),
        }),
      ),
      totals: z.array(z.strictObject({ kind: z.enum(ledgerKinds), count: z.int(), ...totalShape })),
    }),
  ),
});
export type Journal = z.infer<typeof journalSchema>;
export type JournalInCurrency = Journal['currencies'][number];

const period = { from: day, to: day };
const isInOrder = ({ from, to }: { from: string; to: string }): boolean => from <= to;
const turned = { ...complain('invoice-period-turned'), path: ['to'] };

export const periodQuery = z.strictObject(period).refine(isInOrder, turned);
export const statementLetterSchema = z.strictObject({ ...period, note: paragraphs(1000) }).refine(isInOrder, turned);

/** Where a payment by card stands. */
export const checkoutStates = ['open', 'paid', 'expired', 'refused'] as const;
export type CheckoutState = (typeof checkoutStates)[number];

export const checkoutSchema = z.strictObject({
  id: z.uuid(),
  invoiceId: z.uuid(),
  state: z.enum(checkoutStates),
  amount_minor: z.int(),
  currency: z.string(),
  /** Where the client pays, while it can be paid. */
  url: z.string().nullable(),
  open_minor: z.int(),
  /** Whether a receipt was mailed since it was begun. */
  isReceiptMailed: z.boolean(),
});
export type Checkout = z.infer<typeof checkoutSchema>;

/** What the payment service told of a payment nobody here has begun; the service itself says more of it under this id. */
export const unknownPaymentEventSchema = z.strictObject({ id: z.string(), kind: z.string(), receivedAt: z.string() });
export type UnknownPaymentEvent = z.infer<typeof unknownPaymentEventSchema>;

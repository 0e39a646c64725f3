import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { invoiceSchema } from '#shared/invoices/invoice-schema';
import { oneInvoice } from '#shared/invoices/invoices-endpoints';
import {
  paymentEntrySchema,
  paymentSchema,
  refundEntrySchema,
  shareEntrySchema,
  unknownPaymentEventSchema,
  writeOffEntrySchema,
} from '#shared/invoices/payment-schema';
import { identifier } from '#shared/problems/entry-schema';

const onePayment = z.strictObject({ paymentId: identifier });

export const listPayments = endpoint({
  name: 'listPayments',
  summary: 'Payments and refunds, the newest first, of one client or all',
  method: 'get',
  path: '/api/payments',
  callers: ['owner', 'estimator', 'office'],
  query: z.strictObject({ clientId: identifier.optional(), ...pageQuery }),
  answers: sameForPriced(pageOf(paymentSchema)),
});

export const recordPayment = endpoint({
  name: 'recordPayment',
  summary:
    'Enter a payment by bank or in cash, with what of it is for which invoice; what is over is refused or kept, as is said',
  method: 'post',
  path: '/api/payments',
  callers: ['owner', 'office'],
  body: paymentEntrySchema,
  idempotent: true,
  answers: sameForPriced(paymentSchema),
});

export const sharePayment = endpoint({
  name: 'sharePayment',
  summary: 'Put what lies to a client’s credit to one of their invoices',
  method: 'post',
  path: '/api/payments/:paymentId/shares',
  callers: ['owner', 'office'],
  params: onePayment,
  body: shareEntrySchema,
  idempotent: true,
  answers: sameForPriced(paymentSchema),
});

export const refundPayment = endpoint({
  name: 'refundPayment',
  summary: 'Give a payment back, whole or in part; one by card goes back through the payment service',
  method: 'post',
  path: '/api/payments/:paymentId/refunds',
  callers: ['owner', 'office'],
  params: onePayment,
  body: refundEntrySchema,
  idempotent: true,
  answers: sameForPriced(paymentSchema),
});

export const writeOff = endpoint({
  name: 'writeOff',
  summary: 'Give up what is open of an invoice, whole or in part, and say why',
  method: 'post',
  path: '/api/invoices/:invoiceId/write-offs',
  callers: ['owner'],
  params: oneInvoice,
  body: writeOffEntrySchema,
  idempotent: true,
  answers: { cost: invoiceSchema },
});

export const takePaymentEvent = endpoint({
  name: 'takePaymentEvent',
  summary: 'What the payment service tells, signed by it; each event is taken once',
  method: 'post',
  path: '/api/payment-events',
  callers: 'anyone',
  signature: 'stripe-signature',
  inSteps: true,
  answers: {},
});

export const listUnknownPaymentEvents = endpoint({
  name: 'listUnknownPaymentEvents',
  summary: 'What the payment service told of payments nobody here has begun, the newest hundred',
  method: 'get',
  path: '/api/payment-events',
  callers: ['owner', 'office'],
  answers: sameForPriced(z.strictObject({ items: z.array(unknownPaymentEventSchema) })),
});

import * as z from 'zod';
import { endpoint } from '#shared/actor/endpoint';
import { clientInvoiceSummarySchema } from '#shared/client-page/client-overview-schema';
import { invoicePapers } from '#shared/invoices/invoice-schema';
import { checkoutSchema } from '#shared/invoices/payment-schema';
import { identifier } from '#shared/problems/entry-schema';

const oneInvoice = z.strictObject({ invoiceId: identifier });

/** An invoice or credit note as its client sees it, with its papers and whether it may be paid by card. */
export const clientInvoiceSchema = clientInvoiceSummarySchema.extend({
  papers: z.array(z.enum(invoicePapers)),
  mayPayByCard: z.boolean(),
});
export type ClientInvoice = z.infer<typeof clientInvoiceSchema>;

export const listClientInvoices = endpoint({
  name: 'listClientInvoices',
  summary: 'The invoices and credit notes a client may see, the newest first',
  method: 'get',
  path: '/api/client/invoices',
  callers: 'client',
  answers: { public: z.strictObject({ items: z.array(clientInvoiceSchema) }) },
});

export const readClientInvoicePaper = endpoint({
  name: 'readClientInvoicePaper',
  summary: 'An invoice as PDF or as data, byte for byte as it was issued',
  method: 'get',
  path: '/api/client/invoices/:invoiceId/papers/:paper',
  callers: 'client',
  params: oneInvoice.extend({ paper: z.enum(invoicePapers) }),
  media: 'application/octet-stream',
  answers: { public: z.unknown() },
});

export const beginClientCheckout = endpoint({
  name: 'beginClientCheckout',
  summary: 'Begin to pay what is open of an invoice by card; the amount is our own record’s',
  method: 'post',
  path: '/api/client/invoices/:invoiceId/checkouts',
  callers: 'client',
  params: oneInvoice,
  inSteps: true,
  answers: { public: checkoutSchema },
});

export const askClientCheckout = endpoint({
  name: 'askClientCheckout',
  summary: 'Where a payment by card stands, asked of the payment service and recorded',
  method: 'post',
  path: '/api/client/checkouts/:checkoutId/state',
  callers: 'client',
  params: z.strictObject({ checkoutId: identifier }),
  inSteps: true,
  answers: { public: checkoutSchema },
});

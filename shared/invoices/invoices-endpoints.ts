import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { invoiceKinds } from '#shared/invoices/invoice';
import {
  invoiceContentSchema,
  invoicePapers,
  invoiceSchema,
  invoiceStates,
  invoiceSummarySchema,
} from '#shared/invoices/invoice-schema';
import { invoiceSettingsSchema, keptInvoiceSettingsSchema } from '#shared/invoices/invoice-settings-schema';
import { identifier, paragraphs } from '#shared/problems/entry-schema';

export const oneInvoice = z.strictObject({ invoiceId: identifier });

export const readInvoiceSettings = endpoint({
  name: 'readInvoiceSettings',
  summary: 'How the workshop invoices: its numbers, bank account, days and wording',
  method: 'get',
  path: '/api/invoice-settings',
  callers: ['owner', 'estimator', 'office'],
  answers: sameForPriced(keptInvoiceSettingsSchema),
});

export const keepInvoiceSettings = endpoint({
  name: 'keepInvoiceSettings',
  summary: 'Write how the workshop invoices; version 0 where nobody has yet',
  method: 'put',
  path: '/api/invoice-settings',
  callers: ['owner', 'office'],
  body: invoiceSettingsSchema,
  versioned: true,
  answers: sameForPriced(keptInvoiceSettingsSchema),
});

export const listInvoices = endpoint({
  name: 'listInvoices',
  summary: 'Invoices and credit notes, the newest first; of one job or client, drafts or issued, or only what is open',
  method: 'get',
  path: '/api/invoices',
  callers: ['owner', 'estimator', 'office'],
  query: z.strictObject({
    jobId: identifier.optional(),
    clientId: identifier.optional(),
    kind: z.enum(invoiceKinds).optional(),
    state: z.enum(invoiceStates).optional(),
    open: z.enum(['yes']).optional(),
    ...pageQuery,
  }),
  answers: sameForPriced(pageOf(invoiceSummarySchema)),
});

export const readInvoice = endpoint({
  name: 'readInvoice',
  summary:
    'One invoice or credit note with its totals and, while it is a draft, what has to be said of it before it is issued',
  method: 'get',
  path: '/api/invoices/:invoiceId',
  callers: ['owner', 'estimator', 'office'],
  params: oneInvoice,
  answers: sameForPriced(invoiceSchema),
});

export const keepInvoice = endpoint({
  name: 'keepInvoice',
  summary: 'Begin a plain invoice (version 0) or change a draft; what was issued stays as it is',
  method: 'put',
  path: '/api/invoices/:invoiceId',
  callers: ['owner', 'office'],
  params: oneInvoice,
  body: invoiceContentSchema,
  versioned: true,
  answers: sameForPriced(invoiceSchema),
});

export const removeInvoice = endpoint({
  name: 'removeInvoice',
  summary: 'Remove a draft',
  method: 'delete',
  path: '/api/invoices/:invoiceId',
  callers: ['owner', 'office'],
  params: oneInvoice,
  versioned: true,
  answers: {},
});

export const beginCreditNote = endpoint({
  name: 'beginCreditNote',
  summary: 'Draft a credit note against an issued invoice, with its lines to begin with',
  method: 'post',
  path: '/api/invoices/:invoiceId/credit-notes',
  callers: ['owner', 'office'],
  params: oneInvoice,
  body: z.strictObject({ creditNoteId: identifier }),
  answers: sameForPriced(invoiceSchema),
});

export const issueInvoice = endpoint({
  name: 'issueInvoice',
  summary: 'Issue a draft: it is given its number and its papers and stays as it is from then on',
  method: 'post',
  path: '/api/invoices/:invoiceId/issue',
  callers: ['owner', 'office'],
  params: oneInvoice,
  /** The version of the draft the person saw. */
  body: z.strictObject({ version: z.int().min(1) }),
  idempotent: true,
  atOnce: 2,
  answers: sameForPriced(invoiceSchema),
});

export const readInvoicePaper = endpoint({
  name: 'readInvoicePaper',
  summary: 'An issued invoice as PDF or as data (EN 16931, UBL 2.1), byte for byte as it was issued',
  method: 'get',
  path: '/api/invoices/:invoiceId/papers/:paper',
  callers: ['owner', 'estimator', 'office'],
  params: oneInvoice.extend({ paper: z.enum(invoicePapers) }),
  media: 'application/octet-stream',
  answers: sameForPriced(z.unknown()),
});

export const sendInvoice = endpoint({
  name: 'sendInvoice',
  summary: 'Mail an issued invoice to its buyer, with a note of one’s own',
  method: 'post',
  path: '/api/invoices/:invoiceId/letters',
  callers: ['owner', 'office'],
  params: oneInvoice,
  body: z.strictObject({ note: paragraphs(1000) }),
  idempotent: true,
  answers: {},
});

import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { oneInvoice } from '#shared/invoices/invoices-endpoints';
import {
  journalSchema,
  owedInCurrencySchema,
  periodQuery,
  statementLetterSchema,
  statementSchema,
} from '#shared/invoices/payment-schema';
import { identifier, paragraphs } from '#shared/problems/entry-schema';

const oneClient = z.strictObject({ clientId: identifier });

export const readOwed = endpoint({
  name: 'readOwed',
  summary: 'What is owed today, by client and age, and what lies to clients’ credit',
  method: 'get',
  path: '/api/owed',
  callers: ['owner', 'estimator', 'office'],
  answers: sameForPriced(z.strictObject({ day: z.string(), currencies: z.array(owedInCurrencySchema) })),
});

export const readStatement = endpoint({
  name: 'readStatement',
  summary: 'The account of a client from one day to another',
  method: 'get',
  path: '/api/clients/:clientId/statement',
  callers: ['owner', 'estimator', 'office'],
  params: oneClient,
  query: periodQuery,
  answers: sameForPriced(statementSchema),
});

export const readStatementPaper = endpoint({
  name: 'readStatementPaper',
  summary: 'The same as a PDF',
  method: 'get',
  path: '/api/clients/:clientId/statement.pdf',
  callers: ['owner', 'estimator', 'office'],
  params: oneClient,
  atOnce: 4,
  query: periodQuery,
  media: 'application/pdf',
  answers: sameForPriced(z.unknown()),
});

export const readJournal = endpoint({
  name: 'readJournal',
  summary: 'Every invoice, credit note, payment, refund and write-off of a time, with the sums of each kind',
  method: 'get',
  path: '/api/journal',
  callers: ['owner', 'office'],
  query: periodQuery,
  answers: sameForPriced(journalSchema),
});

export const readJournalList = endpoint({
  name: 'readJournalList',
  summary: 'The same for the accountant, as comma-separated values',
  method: 'get',
  path: '/api/journal.csv',
  callers: ['owner', 'office'],
  query: periodQuery,
  media: 'text/csv',
  answers: sameForPriced(z.unknown()),
});

export const readJournalWorkbook = endpoint({
  name: 'readJournalWorkbook',
  summary: 'The same for the accountant, as a workbook with its sums as formulas',
  method: 'get',
  path: '/api/journal.xlsx',
  callers: ['owner', 'office'],
  query: periodQuery,
  media: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  answers: sameForPriced(z.unknown()),
});

export const remindOfInvoice = endpoint({
  name: 'remindOfInvoice',
  summary: 'Remind the buyer by mail of an invoice that is overdue',
  method: 'post',
  path: '/api/invoices/:invoiceId/reminders',
  callers: ['owner', 'office'],
  params: oneInvoice,
  body: z.strictObject({ note: paragraphs(1000) }),
  idempotent: true,
  answers: {},
});

export const sendStatement = endpoint({
  name: 'sendStatement',
  summary: 'Mail a client their account from one day to another, as a PDF, with a note of one’s own',
  method: 'post',
  path: '/api/clients/:clientId/statement-letters',
  callers: ['owner', 'office'],
  params: oneClient,
  body: statementLetterSchema,
  idempotent: true,
  atOnce: 2,
  answers: {},
});

import * as z from 'zod';
import { issueStandings } from '#shared/agreements/issue-standing';
import { clientLetterheadSchema } from '#shared/client-page/client-letterhead-schema';
import { invoiceKinds } from '#shared/invoices/invoice';

/** An issue in a list. */
export const clientIssueSummarySchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(['estimate', 'variation']),
  number: z.string(),
  letter: z.string(),
  title: z.string(),
  state: z.enum(issueStandings),
  issuedOn: z.string(),
  validUntil: z.string(),
  gross_minor: z.int(),
  currency: z.string(),
});

/** An invoice or credit note in a list, with what is still owed on it. */
export const clientInvoiceSummarySchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(invoiceKinds),
  jobId: z.uuid().nullable(),
  number: z.string(),
  issuedOn: z.string(),
  /** Null for a credit note. */
  dueOn: z.string().nullable(),
  due_minor: z.int(),
  open_minor: z.int(),
  /** What of it was credited. */
  credited_minor: z.int(),
  currency: z.string(),
  isOverdue: z.boolean(),
});
export type ClientInvoiceSummary = z.infer<typeof clientInvoiceSummarySchema>;

/** All a client may come to from here. */
export const clientOverviewSchema = z.strictObject({
  letterhead: clientLetterheadSchema,
  client: z.strictObject({ name: z.string() }),
  jobs: z.array(
    z.strictObject({
      id: z.uuid(),
      number: z.string(),
      title: z.string(),
      issues: z.array(clientIssueSummarySchema),
    }),
  ),
  invoices: z.array(clientInvoiceSummarySchema),
});
export type ClientOverview = z.infer<typeof clientOverviewSchema>;

import * as z from 'zod';
import { invoiceSettingsSchema } from '#shared/invoices/invoice-settings-schema';
import { complain } from '#shared/problems/complaints-of';
import type { Entries } from '../core/forms/schema-controls';

const first = z.int().min(1).max(999_999).nullable();

/** The settings as they are entered: where numbers begin is three entries, all of them empty for whoever had none before. */
export const settingsForm = invoiceSettingsSchema.extend({
  begins: z
    .strictObject({ year: z.int().min(1990).max(2200).nullable(), invoice: first, creditNote: first })
    .refine(({ year, invoice, creditNote }) => year !== null || (invoice === null && creditNote === null), {
      ...complain('entry-missing'),
      path: ['year'],
    }),
});

export const beginningEntry: Entries<typeof settingsForm> & { invoicePrefix: string; creditNotePrefix: string } = {
  seller: { vatId: '', taxNumber: '', companyNumber: '' },
  account: { name: '', iban: '', bic: '' },
  ...{ due_days: 14, terms: '', closing: '', invoicePrefix: '', creditNotePrefix: '' },
  begins: { year: null, invoice: null, creditNote: null },
};

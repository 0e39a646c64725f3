import { migration } from '../src/platform/database/migration';

/** Every letter about an invoice is kept beside it: the paper itself, reminders, receipts. Until now only reminders were. */
export const lettersAboutInvoices = migration('0053-letters-about-invoices', [
  `RENAME TABLE IF EXISTS reminders TO invoice_letters`,
  `ALTER TABLE invoice_letters
    ADD COLUMN IF NOT EXISTS kind VARCHAR(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'reminder'`,
  `ALTER TABLE invoice_letters ALTER COLUMN kind DROP DEFAULT`,
]);

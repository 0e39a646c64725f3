import type { InvoiceKind } from '#shared/invoices/invoice';
import { invoiceNumber, type InvoiceSettings } from '#shared/invoices/invoice-settings';
import { Counters } from '../platform/database/counters';
import type { Database } from '../platform/database/database';

export interface GivenNumber {
  readonly number: string;
  readonly series: InvoiceKind;
  readonly year: number;
  readonly ordinal: number;
}

/** Numbers of invoices and credit notes: one series each, from 1 every year, without gaps (Directive 2006/112/EC, Art. 226(2)). */
export class InvoiceNumbers {
  private readonly counters: Counters;

  constructor(private readonly database: Database) {
    this.counters = new Counters(database);
  }

  /** The next number, kept only if the transaction is; in the year a workshop began here, its series goes on where it was. */
  async next(
    workshopId: string,
    kind: InvoiceKind,
    at: { year: number; settings: InvoiceSettings },
  ): Promise<GivenNumber> {
    const { year, settings } = at;
    const isInvoice = kind === 'invoice';
    const first = isInvoice ? settings.begins?.invoice : settings.begins?.creditNote;
    if (settings.begins?.year === year && first !== undefined)
      await this.begin(workshopId, kind, { year, last: first - 1 });
    const ordinal = await this.counters.next(workshopId, kind, year);
    const prefix = isInvoice ? settings.invoicePrefix : settings.creditNotePrefix;
    return { number: invoiceNumber(prefix, year, ordinal), series: kind, year, ordinal };
  }

  private async begin(
    workshopId: string,
    series: InvoiceKind,
    { year, last }: { year: number; last: number },
  ): Promise<void> {
    await this.database.execute(
      `INSERT INTO counters (workshop_id, series, year, last) VALUES (:workshopId, :series, :year, :last)
       ON DUPLICATE KEY UPDATE last = last`,
      { workshopId, series, year, last },
    );
  }
}

import type { ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import type { TaxableAmount } from '#shared/money/tax-by-category';
import { sumMinor } from '#shared/money/sum-minor';
import { exactAmounts } from './exact-amounts';
import type { InvoiceRow } from './invoice-model';
import type { InvoiceRepository } from './invoice-repository';

/** What a paper comes to under each tax. */
const netsOf = ({ content, currency }: InvoiceRow): TaxableAmount[] =>
  exactAmounts(content, currency, 0).totals.categories.map(({ tax, net_minor }) => ({ tax, net_minor }));

function claiming(row: InvoiceRow, notes: readonly InvoiceRow[]): ClaimingInvoice[] {
  const { id, claim, claimIssueId } = row;
  if (!claim || !claimIssueId) return [];
  const own = notes.filter(({ creditedInvoiceId }) => creditedInvoiceId === id);
  return [
    {
      ...{ invoiceId: id, number: row.number ?? '', issueId: claimIssueId, claim, isIssued: row.state === 'issued' },
      due_minor: row.kind === 'invoice' ? row.dueMinor : -row.dueMinor,
      credited_minor: sumMinor(own.map(({ dueMinor }) => dueMinor)),
      nets: claim.of === 'again' ? netsOf(row) : [],
      credited: own.flatMap(netsOf),
    },
  ];
}

/** What invoices and credit notes claim of contracts, as the accounts of these ask of them: two queries, however many jobs there are. */
export class ClaimReading {
  constructor(private readonly invoices: Pick<InvoiceRepository, 'claiming' | 'creditNotesOf'>) {}

  async ofJobs(workshopId: string, jobIds: readonly string[]): Promise<ClaimingInvoice[]> {
    const rows = await this.invoices.claiming(workshopId, jobIds);
    const credited = rows.filter(({ creditedMinor }) => creditedMinor !== 0).map(({ id }) => id);
    const notes = await this.invoices.creditNotesOf(workshopId, credited);
    return rows.flatMap((row) => claiming(row, notes));
  }
}

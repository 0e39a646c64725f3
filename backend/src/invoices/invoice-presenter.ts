import type { Invoice, InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { Checkout, Payment } from '#shared/invoices/payment-schema';
import type { InvoiceRow } from './invoice-model';
import type { CheckoutRow, InvoiceLetterRow, PaymentRow, WriteOffRow } from './payment-model';

interface Facts {
  readonly clientName: string;
  readonly today: string;
}

export const presentSummary = (row: InvoiceRow, { clientName, today }: Facts): InvoiceSummary => ({
  id: row.id,
  version: row.version,
  kind: row.kind,
  state: row.state,
  number: row.number,
  clientId: row.clientId,
  clientName,
  jobId: row.jobId,
  creditedInvoiceId: row.creditedInvoiceId,
  currency: row.currency,
  issuedOn: row.issuedOn,
  dueOn: row.dueOn,
  isOverdue: row.openMinor > 0 && row.dueOn !== null && row.dueOn < today,
  net_minor: row.netMinor,
  tax_minor: row.taxMinor,
  gross_minor: row.grossMinor,
  due_minor: row.dueMinor,
  open_minor: row.openMinor,
  credited_minor: row.creditedMinor,
});

/** What stands there now, for somebody who changed what they had read before. */
export const presentCurrent = (row: InvoiceRow): InvoiceSummary =>
  presentSummary(row, { clientName: row.content.buyer.name, today: '' });

const papersOf = ({ pdfFileId, xmlFileId }: InvoiceRow): Invoice['papers'] => [
  ...(pdfFileId === null ? [] : (['invoice.pdf'] as const)),
  ...(xmlFileId === null ? [] : (['invoice.xml'] as const)),
];

export const presentInvoice = (
  row: InvoiceRow,
  facts: Facts,
  worked: Pick<Invoice, 'rounding_minor' | 'mailsTo'> & {
    readonly totals: object;
    readonly findings: readonly object[];
    readonly writeOffs: readonly WriteOffRow[];
    readonly letters: readonly InvoiceLetterRow[];
  },
): Invoice => ({
  ...presentSummary(row, facts),
  content: row.content as Invoice['content'],
  claim: row.claim && row.claimIssueId ? { issueId: row.claimIssueId, claim: row.claim } : null,
  rounding_minor: worked.rounding_minor,
  totals: worked.totals as Invoice['totals'],
  findings: [...worked.findings] as Invoice['findings'],
  writeOffs: worked.writeOffs.map(({ id, amountMinor: amount_minor, reason, writtenOn, byName }) => {
    return { id, amount_minor, reason, writtenOn, byName };
  }),
  mailsTo: worked.mailsTo,
  letters: worked.letters.map(({ id, kind, email, at, byName, openMinor: open_minor }) => {
    return { id, kind, email, at: at.toISOString(), byName, open_minor };
  }),
  sha256: row.sha256,
  papers: papersOf(row),
});

export const presentPayment = (
  row: PaymentRow,
  { clientName, shares }: Pick<Payment, 'clientName' | 'shares'>,
): Payment => ({
  id: row.id,
  clientId: row.clientId,
  clientName,
  deed: row.deed ?? (row.refundsPaymentId === null ? 'payment' : 'refund'),
  way: row.way,
  currency: row.currency,
  amount_minor: row.amountMinor,
  credit_minor: row.creditMinor,
  receivedOn: row.receivedOn,
  reference: row.reference,
  refundsPaymentId: row.refundsPaymentId,
  shares,
  recordedBy: row.recordedBy,
});

/** A checkout with what is open of its invoice now and the letters about it. */
export const presentCheckout = (
  row: CheckoutRow,
  { open_minor, letters }: { readonly open_minor: number; readonly letters: readonly InvoiceLetterRow[] },
): Checkout => ({
  id: row.id,
  invoiceId: row.invoiceId,
  state: row.state,
  amount_minor: row.amountMinor,
  currency: row.currency,
  url: row.state === 'open' ? row.url : null,
  open_minor,
  isReceiptMailed: letters.some(({ kind, at }) => kind === 'receipt' && at >= row.createdAt),
});

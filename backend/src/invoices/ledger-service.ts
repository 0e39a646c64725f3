import { clientStatement } from '#shared/invoices/client-statement';
import { journalTotals } from '#shared/invoices/journal-totals';
import type { LedgerEntry } from '#shared/invoices/ledger-entry';
import { owedByAge } from '#shared/invoices/owed-by-age';
import type { Journal, Statement } from '#shared/invoices/payment-schema';
import { sumMinor } from '#shared/money/sum-minor';
import type { InvoiceRow } from './invoice-model';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { PaymentRow, WriteOffRow } from './payment-model';

/** Two days, both included. */
export interface Days {
  readonly from: string;
  readonly to: string;
}

const beginning = '1970-01-01';
const noTax = { net_minor: 0, tax_minor: 0, rounding_minor: 0 } as const;

type Named = ReadonlyMap<string, string>;

function ofInvoice(row: InvoiceRow, names: Named): LedgerEntry {
  const sign = row.kind === 'invoice' ? 1 : -1;
  return {
    ...{ id: row.id, day: row.issuedOn ?? '', kind: row.kind, number: row.number ?? '' },
    ...{ clientId: row.clientId, clientName: names.get(row.clientId) ?? '' },
    net_minor: sign * row.netMinor,
    tax_minor: sign * row.taxMinor,
    rounding_minor: sign * row.roundingMinor,
    amount_minor: sign * row.dueMinor,
  };
}

/** A refund that failed stands among the refunds, below nothing: so their sum is what was really given back. */
function kindOf({ deed, refundsPaymentId }: PaymentRow): LedgerEntry['kind'] {
  if (deed === 'dispute') return 'dispute';
  return refundsPaymentId === null ? 'payment' : 'refund';
}

const ofPayment = (row: PaymentRow, names: Named): LedgerEntry => ({
  ...{ id: row.id, day: row.receivedOn, kind: kindOf(row), number: row.reference },
  ...{ clientId: row.clientId, clientName: names.get(row.clientId) ?? '' },
  ...noTax,
  amount_minor: -row.amountMinor,
});

const ofWriteOff = (row: WriteOffRow, invoice: InvoiceRow | undefined, names: Named): LedgerEntry => ({
  ...{ id: row.id, day: row.writtenOn, kind: 'write-off', number: invoice?.number ?? '' },
  ...{ clientId: invoice?.clientId ?? '', clientName: names.get(invoice?.clientId ?? '') ?? '' },
  ...noTax,
  amount_minor: -row.amountMinor,
});

const byDay = (one: LedgerEntry, other: LedgerEntry): number =>
  one.day < other.day || (one.day === other.day && one.id < other.id) ? -1 : 1;

/** What is owed, statements and the journal: read from the rows, in the currency the workshop keeps its books in. */
export class LedgerService {
  constructor(private readonly parts: InvoiceParts) {}

  async owed(workshopId: string) {
    const { currency } = await this.parts.workshops.get(workshopId);
    const day = await todayIn(this.parts, workshopId);
    const invoices = (await this.parts.invoices.open(workshopId)).filter((row) => row.currency === currency);
    const credits = (await this.parts.payments.withCredit(workshopId)).filter((row) => row.currency === currency);
    const owed = owedByAge(
      invoices.map((row) => ({
        clientId: row.clientId,
        dueOn: row.dueOn ?? row.issuedOn ?? day,
        open_minor: row.openMinor,
      })),
      { today: day, credits: credits.map(({ clientId, creditMinor }) => ({ clientId, credit_minor: creditMinor })) },
    );
    const names = await this.names(
      workshopId,
      owed.map(({ clientId }) => clientId),
    );
    const items = owed.map((one) => ({
      ...one,
      byAge_minor: { ...one.byAge_minor },
      clientName: names.get(one.clientId) ?? '',
    }));
    return { day, currency, items, open_minor: sumMinor(owed.map(({ open_minor }) => open_minor)) };
  }

  async statement(workshopId: string, clientId: string, days: Days): Promise<Statement> {
    const client = await this.parts.jobs.client(workshopId, clientId);
    const { currency, entries } = await this.entries(workshopId, { from: beginning, to: days.to });
    const { opening_minor, lines, closing_minor } = clientStatement(
      entries.filter((entry) => entry.clientId === clientId),
      days,
    );
    return { currency, clientName: client.name, ...days, opening_minor, lines: [...lines], closing_minor };
  }

  async journal(workshopId: string, days: Days): Promise<Journal> {
    const { currency, entries } = await this.entries(workshopId, days);
    return { currency, ...days, entries, totals: journalTotals(entries) };
  }

  /** What clients are called, each asked for once. */
  async names(workshopId: string, clientIds: readonly string[]): Promise<Named> {
    const names = new Map<string, string>();
    for (const id of new Set(clientIds)) names.set(id, (await this.parts.jobs.client(workshopId, id)).name);
    return names;
  }

  private async entries(workshopId: string, days: Days): Promise<{ currency: string; entries: LedgerEntry[] }> {
    const { currency } = await this.parts.workshops.get(workshopId);
    const isOurs = (row: { currency: string }) => row.currency === currency;
    const invoices = (await this.parts.invoices.issuedBetween(workshopId, days)).filter(isOurs);
    const payments = (await this.parts.payments.receivedBetween(workshopId, days)).filter(isOurs);
    const writeOffs = await this.parts.payments.writtenOffBetween(workshopId, days);
    const given = new Map(
      (
        await this.parts.invoices.named(
          workshopId,
          writeOffs.map(({ invoiceId }) => invoiceId),
        )
      ).map((row) => [row.id, row]),
    );
    const names = await this.names(
      workshopId,
      [...invoices, ...payments, ...given.values()].map(({ clientId }) => clientId),
    );
    const ofOurs = writeOffs.filter(({ invoiceId }) => given.get(invoiceId)?.currency === currency);
    const entries = [
      ...invoices.map((row) => ofInvoice(row, names)),
      ...payments.map((row) => ofPayment(row, names)),
      ...ofOurs.map((row) => ofWriteOff(row, given.get(row.invoiceId), names)),
    ];
    return { currency, entries: entries.sort(byDay) };
  }
}

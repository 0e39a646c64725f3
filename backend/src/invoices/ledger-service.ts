import { byCurrency } from '#shared/invoices/by-currency';
import { clientStatement } from '#shared/invoices/client-statement';
import { journalTotals } from '#shared/invoices/journal-totals';
import type { LedgerEntry } from '#shared/invoices/ledger-entry';
import { owedByAge } from '#shared/invoices/owed-by-age';
import type { Journal, OwedInCurrency, Statement } from '#shared/invoices/payment-schema';
import { sumMinor } from '#shared/money/sum-minor';
import { groupedBy } from '#shared/units/grouped-by';
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
    ...{ note: '', currency: row.currency },
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
  ...{ clientId: row.clientId, clientName: names.get(row.clientId) ?? '', note: '', currency: row.currency },
  ...noTax,
  amount_minor: -row.amountMinor,
});

const ofWriteOff = (row: WriteOffRow, invoice: InvoiceRow, names: Named): LedgerEntry => ({
  ...{ id: row.id, day: row.writtenOn, kind: 'write-off', number: invoice.number ?? '' },
  ...{ clientId: invoice.clientId, clientName: names.get(invoice.clientId) ?? '' },
  ...{ note: `${row.reason} (${row.byName})`, currency: invoice.currency },
  ...noTax,
  amount_minor: -row.amountMinor,
});

type Numbers = ReadonlyMap<string, readonly string[]>;

const withPaid = (entry: LedgerEntry, ways: ReadonlyMap<string, PaymentRow['way']>, numbers: Numbers): LedgerEntry => {
  const way = ways.get(entry.id);
  return way === undefined ? entry : { ...entry, paid: { way, invoices: numbers.get(entry.id) ?? [] } };
};

const byDay = (one: LedgerEntry, other: LedgerEntry): number =>
  one.day < other.day || (one.day === other.day && one.id < other.id) ? -1 : 1;

/** What a client may read of an entry: not what the workshop noted of it. */
const toldOf = <T extends LedgerEntry>({ note: _note, currency: _currency, paid: _paid, ...told }: T) => told;

const isMoving = ({ opening_minor, lines }: { opening_minor: number; lines: readonly unknown[] }): boolean =>
  opening_minor !== 0 || lines.length > 0;

/** What is owed, statements and the journal: read from the rows, each currency by itself. */
export class LedgerService {
  constructor(private readonly parts: InvoiceParts) {}

  async owed(workshopId: string): Promise<{ day: string; currencies: OwedInCurrency[] }> {
    const day = await todayIn(this.parts, workshopId);
    const open = (await this.parts.invoices.open(workshopId)).map((row) => ({
      ...{ clientId: row.clientId, currency: row.currency, open_minor: row.openMinor, credit_minor: 0 },
      dueOn: row.dueOn ?? row.issuedOn ?? day,
    }));
    const credit = (await this.parts.payments.withCredit(workshopId)).map((row) => ({
      ...{ clientId: row.clientId, currency: row.currency, open_minor: 0, credit_minor: row.creditMinor, dueOn: day },
    }));
    const rows = [...open, ...credit];
    if (rows.length === 0) return { day, currencies: [] };
    const names = await this.parts.jobs.clientNames(
      workshopId,
      rows.map(({ clientId }) => clientId),
    );
    const currencies = (await this.apart(workshopId, rows)).map(({ currency, rows: own }) => {
      const items = owedByAge(own, { today: day, credits: own }).map((one) => ({
        ...{ ...one, byAge_minor: { ...one.byAge_minor } },
        clientName: names.get(one.clientId) ?? '',
      }));
      return { currency, items, open_minor: sumMinor(items.map(({ open_minor }) => open_minor)) };
    });
    return { day, currencies };
  }

  async statement(workshopId: string, clientId: string, days: Days): Promise<Statement> {
    const client = await this.parts.jobs.client(workshopId, clientId);
    const entries = await this.entries(workshopId, { from: beginning, to: days.to });
    const own = entries.filter((entry) => entry.clientId === clientId);
    const accounts = (await this.apart(workshopId, own)).map(({ currency, rows }) => {
      const { opening_minor, lines, closing_minor } = clientStatement(rows, days);
      return { currency, opening_minor, lines: lines.map(toldOf), closing_minor };
    });
    const moving = accounts.filter(isMoving);
    return { clientName: client.name, ...days, currencies: moving.length > 0 ? moving : accounts.slice(0, 1) };
  }

  async journal(workshopId: string, days: Days): Promise<Journal> {
    const entries = await this.paid(workshopId, await this.entries(workshopId, days), days);
    const currencies = (await this.apart(workshopId, entries)).map(({ currency, rows }) => ({
      currency,
      entries: rows.map(({ currency: _currency, paid, ...entry }) => ({
        ...entry,
        ...(paid ? { paid: { way: paid.way, invoices: [...paid.invoices] } } : {}),
      })),
      totals: journalTotals(rows),
    }));
    return { ...days, currencies };
  }

  /** The entries of money with the way it came and the invoices it is for, what was taken back already counted. */
  private async paid(workshopId: string, entries: readonly LedgerEntry[], days: Days): Promise<LedgerEntry[]> {
    const payments = await this.parts.payments.receivedBetween(workshopId, days);
    const ids = payments.map(({ id }) => id);
    const shares = await this.parts.payments.sharesOf(workshopId, ids);
    const invoiceIds = [...new Set(shares.map(({ invoiceId }) => invoiceId))];
    const invoices = await this.parts.invoices.named(workshopId, invoiceIds);
    const ofPayment = groupedBy(shares, ({ paymentId }) => paymentId);
    const numbersOf = (id: string) => {
      const ofInvoice = groupedBy(ofPayment.get(id) ?? [], ({ invoiceId }) => invoiceId);
      const paid = (row: { id: string }) => sumMinor((ofInvoice.get(row.id) ?? []).map((one) => one.amountMinor)) > 0;
      return invoices.filter(paid).map(({ number }) => number ?? '');
    };
    const numbers = new Map(ids.map((id) => [id, numbersOf(id)]));
    const ways = new Map(payments.map(({ id, way }) => [id, way]));
    return entries.map((entry) => withPaid(entry, ways, numbers));
  }

  private async apart<T extends { readonly currency: string }>(workshopId: string, rows: readonly T[]) {
    const { currency } = await this.parts.workshops.get(workshopId);
    return byCurrency(rows, currency);
  }

  private async entries(workshopId: string, days: Days): Promise<LedgerEntry[]> {
    const invoices = await this.parts.invoices.issuedBetween(workshopId, days);
    const payments = await this.parts.payments.receivedBetween(workshopId, days);
    const writeOffs = await this.parts.payments.writtenOffBetween(workshopId, days);
    const given = await this.parts.invoices.named(
      workshopId,
      writeOffs.map(({ invoiceId }) => invoiceId),
    );
    const names = await this.parts.jobs.clientNames(
      workshopId,
      [...invoices, ...payments, ...given].map(({ clientId }) => clientId),
    );
    const writtenOff = writeOffs.flatMap((row) =>
      given.filter(({ id }) => id === row.invoiceId).map((invoice) => ofWriteOff(row, invoice, names)),
    );
    const moved = [
      ...invoices.map((row) => ofInvoice(row, names)),
      ...payments.map((row) => ofPayment(row, names)),
      ...writtenOff,
    ];
    return moved.sort(byDay);
  }
}

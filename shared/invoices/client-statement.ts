import type { LedgerEntry } from '#shared/invoices/ledger-entry';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** One line of a statement with what is owed after it. */
export interface StatementLine extends LedgerEntry {
  readonly balance_minor: MinorUnits;
}

/** The account of a client over a time: what was owed before, every movement, what is owed after. */
export interface ClientStatement {
  readonly opening_minor: MinorUnits;
  readonly lines: readonly StatementLine[];
  readonly closing_minor: MinorUnits;
}

/** The statement from one day to another, both included; entries in the order of their days, whole minor units. */
export function clientStatement(
  entries: readonly LedgerEntry[],
  { from, to }: { readonly from: string; readonly to: string },
): ClientStatement {
  const opening_minor = sumMinor(entries.filter(({ day }) => day < from).map(({ amount_minor }) => amount_minor));
  let balance_minor = opening_minor;
  const lines = entries
    .filter(({ day }) => day >= from && day <= to)
    .toSorted((one, other) => (one.day === other.day ? 0 : one.day < other.day ? -1 : 1))
    .map((entry) => ({ ...entry, balance_minor: (balance_minor = sumMinor([balance_minor, entry.amount_minor])) }));
  return { opening_minor, lines, closing_minor: balance_minor };
}

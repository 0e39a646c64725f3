import { ledgerKinds, type LedgerEntry, type LedgerKind } from '#shared/invoices/ledger-entry';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** What the entries of one kind come to, in whole minor units. */
export interface JournalTotal {
  readonly kind: LedgerKind;
  readonly count: number;
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly rounding_minor: MinorUnits;
  readonly amount_minor: MinorUnits;
}

/** The sums of a journal kind by kind; added up they are what the accounts of all clients moved by. */
export function journalTotals(entries: readonly LedgerEntry[]): JournalTotal[] {
  return ledgerKinds.map((kind) => {
    const own = entries.filter((entry) => entry.kind === kind);
    const sum = (pick: (entry: LedgerEntry) => MinorUnits) => sumMinor(own.map(pick));
    return {
      kind,
      count: own.length,
      net_minor: sum((entry) => entry.net_minor),
      tax_minor: sum((entry) => entry.tax_minor),
      rounding_minor: sum((entry) => entry.rounding_minor),
      amount_minor: sum((entry) => entry.amount_minor),
    };
  });
}

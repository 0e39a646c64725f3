/** What is in one currency. */
export interface InCurrency<T> {
  readonly currency: string;
  readonly rows: readonly T[];
}

/**
 * Rows apart by their currency (ISO 4217), so that no sum mixes two: the workshop's own first, the others by their letters. Where there is
 * no row at all, the own currency alone with none.
 */
export function byCurrency<T extends { readonly currency: string }>(rows: readonly T[], own: string): InCurrency<T>[] {
  const found = [...new Set(rows.map(({ currency }) => currency))];
  const others = found.filter((currency) => currency !== own).toSorted();
  const inOrder = found.length === 0 || found.includes(own) ? [own, ...others] : others;
  return inOrder.map((currency) => ({ currency, rows: rows.filter((row) => row.currency === currency) }));
}

import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** So much of a payment for one invoice, in whole minor units. */
export interface Share {
  readonly invoiceId: string;
  readonly amount_minor: MinorUnits;
}

/** Spreads an amount over open invoices in their order, each up to what is open; what none takes is left over. Whole minor units. */
export function paymentShares(
  amount_minor: MinorUnits,
  open: readonly { readonly invoiceId: string; readonly open_minor: MinorUnits }[],
): { shares: Share[]; rest_minor: MinorUnits } {
  let rest_minor = amount_minor;
  const shares = open.flatMap(({ invoiceId, open_minor }) => {
    const own_minor = Math.min(rest_minor, open_minor);
    rest_minor = sumMinor([rest_minor, -own_minor]);
    return own_minor > 0 ? [{ invoiceId, amount_minor: own_minor }] : [];
  });
  return { shares, rest_minor };
}

/** Takes an amount back from shares, the newest first, each up to what it holds; what none can give is left over. Whole minor units. */
export function releasedShares(
  amount_minor: MinorUnits,
  shares: readonly Share[],
): { shares: Share[]; rest_minor: MinorUnits } {
  const held = shares.map(({ invoiceId, amount_minor: held_minor }) => ({ invoiceId, open_minor: held_minor }));
  return paymentShares(amount_minor, held.toReversed());
}

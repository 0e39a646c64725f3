import type { ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxableAmount } from '#shared/money/tax-by-category';

/** What was credited of an invoice and is claimed by no other: with tax, and under each tax without it. Whole minor units. */
export interface CreditedRest {
  readonly due_minor: MinorUnits;
  readonly nets: readonly TaxableAmount[];
}

const taken = ({ tax, net_minor }: TaxableAmount): TaxableAmount => ({ tax, net_minor: -net_minor });

/** What of an invoice may be claimed again: what credit notes took off it, less what others whose claims are taken claim of that. */
export function creditedRest(invoice: ClaimingInvoice, taking: readonly ClaimingInvoice[]): CreditedRest {
  const again = taking.filter(({ claim }) => claim.of === 'again' && claim.invoiceId === invoice.invoiceId);
  const { categories } = taxByCategory([...invoice.credited, ...again.flatMap(({ nets }) => nets.map(taken))]);
  const due_minor = sumMinor([invoice.credited_minor, ...again.map((one) => -one.due_minor)]);
  const nets = categories.map(({ tax, net_minor }) => ({ tax, net_minor }));
  const some = nets.filter(({ net_minor }) => net_minor !== 0);
  // A minor unit of rounding alone has a line all the same.
  return { due_minor, nets: some.length === 0 && due_minor !== 0 ? nets.slice(0, 1) : some };
}

/** What the invoice of such a rest is rounded by (BT-114), so that exactly what was credited falls due. */
export const restRounding = ({ due_minor, nets }: CreditedRest): MinorUnits =>
  sumMinor([due_minor, -taxByCategory(nets).gross_minor]);

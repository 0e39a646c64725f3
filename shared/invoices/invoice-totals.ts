import type { AllowanceOrCharge, DocumentAllowanceOrCharge, InvoiceLine } from '#shared/invoices/invoice-lines';
import type { MinorUnits } from '#shared/money/decimal';
import { lineAmount } from '#shared/money/line-amount';
import { percentOf } from '#shared/money/percent-of';
import { safeMinor } from '#shared/money/safe-minor';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxedNet } from '#shared/money/tax-by-category';

/** What totals are worked from; `prepaid_minor` and `rounding_minor` come after the tax (BT-113, BT-114). */
export interface InvoiceAmounts {
  readonly lines: readonly Pick<InvoiceLine, 'quantity' | 'price' | 'baseQuantity' | 'allowancesCharges' | 'tax'>[];
  readonly allowancesCharges: readonly DocumentAllowanceOrCharge[];
  readonly prepaid_minor: MinorUnits;
  readonly rounding_minor: MinorUnits;
}

/** Every total of the document in whole minor units, named as EN 16931 names them (BT-106 … BT-117, BT-131). */
export interface InvoiceTotals {
  readonly lineNets_minor: readonly MinorUnits[];
  readonly lineSum_minor: MinorUnits;
  readonly allowances_minor: MinorUnits;
  readonly charges_minor: MinorUnits;
  readonly categories: readonly TaxedNet[];
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
  readonly due_minor: MinorUnits;
}

/** The amount of an allowance or charge in minor units, a percentage half up of its base (Peppol R040). */
export const allowanceAmount = ({ amount }: AllowanceOrCharge): MinorUnits =>
  amount.way === 'fixed' ? safeMinor(amount.amount_minor) : percentOf(amount.base_minor, amount.percent);

const sumOf = (listed: readonly AllowanceOrCharge[], charge: boolean): MinorUnits =>
  sumMinor(listed.filter((one) => one.charge === charge).map(allowanceAmount));

/** Net amount of a line in minor units: price part rounded by itself, + charges − allowances (BT-131, Peppol R120). */
export const lineNet = (line: InvoiceAmounts['lines'][number], digits: number): MinorUnits =>
  sumMinor([lineAmount(line, digits), sumOf(line.allowancesCharges, true), -sumOf(line.allowancesCharges, false)]);

/**
 * Totals of an invoice or credit note in whole minor units of a currency with so many digits: lines rounded one by one, tax once on the
 * sum of a category, half up away from zero; RangeError beyond safe integers (EN 16931, BR-CO-10 to BR-CO-17).
 */
export function invoiceTotals(amounts: InvoiceAmounts, digits: number): InvoiceTotals {
  const lineNets_minor = amounts.lines.map((line) => lineNet(line, digits));
  const allowances_minor = sumOf(amounts.allowancesCharges, false);
  const charges_minor = sumOf(amounts.allowancesCharges, true);
  const taxed = taxByCategory([
    ...amounts.lines.map(({ tax }, place) => ({ tax, net_minor: lineNets_minor[place] })),
    ...amounts.allowancesCharges.map((one) => ({
      tax: one.tax,
      net_minor: one.charge ? allowanceAmount(one) : -allowanceAmount(one),
    })),
  ]);
  return {
    lineNets_minor,
    lineSum_minor: sumMinor(lineNets_minor),
    allowances_minor,
    charges_minor,
    ...taxed,
    due_minor: sumMinor([taxed.gross_minor, -amounts.prepaid_minor, amounts.rounding_minor]),
  };
}

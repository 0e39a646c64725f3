import type { InvoiceContent } from '#shared/invoices/invoice';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { invoiceTotals, type InvoiceTotals } from '#shared/invoices/invoice-totals';
import { netPricedLines } from '#shared/invoices/net-priced-lines';
import { cashRounding, cashStep } from '#shared/money/cash-rounding';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** What of an invoice is worked from what was entered: lines as they are taxed, rounding and totals. */
export interface WorkedInvoice {
  readonly lines: readonly InvoiceLine[];
  readonly rounding_minor: MinorUnits;
  readonly totals: InvoiceTotals;
}

type Entered = Pick<InvoiceContent, 'pricesHold' | 'lines' | 'allowancesCharges' | 'roundsToCash'>;

/**
 * Works an invoice in a currency: prices with tax become prices without, then the totals, then the rounding to what can be paid in cash,
 * on top of a rounding that is known already (whole minor units; EN 16931, BT-114). RangeError beyond safe integers.
 */
export function workedInvoice(entered: Entered, currency: string, known_minor: MinorUnits = 0): WorkedInvoice {
  const digits = currencyDigits(currency);
  const { lines, rounding_minor: ofPrices_minor } =
    entered.pricesHold === 'gross'
      ? netPricedLines(entered.lines, digits)
      : { lines: entered.lines, rounding_minor: 0 };
  const amounts = { lines, allowancesCharges: entered.allowancesCharges, prepaid_minor: 0 };
  const before_minor = sumMinor([known_minor, ofPrices_minor]);
  const exact = invoiceTotals({ ...amounts, rounding_minor: before_minor }, digits);
  if (!entered.roundsToCash) return { lines, rounding_minor: before_minor, totals: exact };
  const cash = cashRounding(exact.due_minor, cashStep(currency));
  const rounding_minor = sumMinor([before_minor, cash.rounding_minor]);
  return { lines, rounding_minor, totals: { ...exact, due_minor: cash.due_minor } };
}

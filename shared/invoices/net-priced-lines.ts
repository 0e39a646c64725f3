import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { D, type MinorUnits } from '#shared/money/decimal';
import { lineAmount } from '#shared/money/line-amount';
import { roundMinor } from '#shared/money/round-minor';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { sumMinor } from '#shared/money/sum-minor';
import { taxKey, taxOn, type TaxRate } from '#shared/money/tax-by-category';
import { textOf } from '#shared/money/text-of';

/** Lines with prices without tax, and what the tax on them cannot bring back of the prices with tax (BT-114). */
export interface NetPricedLines {
  readonly lines: readonly InvoiceLine[];
  readonly rounding_minor: MinorUnits;
}

const gapOf = (gross_minor: MinorUnits, net_minor: MinorUnits, tax: TaxRate): MinorUnits =>
  gross_minor - net_minor - taxOn(net_minor, tax);

/**
 * The net whose tax brings back an amount with tax, or comes nearest to it. Net + round(net × rate) leaves some amounts out
 * (0.03 at 20 %: 0.02 gives 0.02, 0.03 gives 0.04), so the neighbours are tried and the rest is told.
 */
function netWithin(gross_minor: MinorUnits, tax: TaxRate): { net_minor: MinorUnits; rounding_minor: MinorUnits } {
  const isTaxed = taxOn(10_000_000, tax) !== 0;
  const likely_minor = isTaxed
    ? roundMinor(new D(gross_minor).times(100).div(new D(100).plus(tax.percent)))
    : gross_minor;
  const [best] = [likely_minor, likely_minor - 1, likely_minor + 1]
    .map((net_minor) => ({ net_minor, rounding_minor: gapOf(gross_minor, net_minor, tax) }))
    .sort((one, other) => Math.abs(one.rounding_minor) - Math.abs(other.rounding_minor));
  return best;
}

/** A line that comes to a whole amount: its price is for the whole quantity, so nothing is rounded again (BT-146, BT-149). */
function lineOver(line: InvoiceLine, net_minor: MinorUnits, digits: number): InvoiceLine {
  const quantity = new D(line.quantity).abs();
  const sign = net_minor < 0 ? '-' : '';
  return {
    ...line,
    quantity: `${sign}${quantity.toString()}`,
    price: textOf(Math.abs(net_minor), digits),
    baseQuantity: quantity.toString(),
  };
}

function ofOneTax(lines: readonly InvoiceLine[], digits: number) {
  const grosses_minor = lines.map((line) => lineAmount(line, digits));
  const within = netWithin(sumMinor(grosses_minor), lines[0].tax);
  const weights = grosses_minor.every((gross) => gross === 0) ? lines.map(() => 1) : grosses_minor;
  const nets_minor = splitByLargestRemainder(within.net_minor, weights);
  return {
    rounding_minor: within.rounding_minor,
    lines: lines.map((line, place) => lineOver(line, nets_minor[place], digits)),
  };
}

/**
 * Lines entered with tax in their prices as lines without: per category the net whose tax gives the entered sum back, split by largest
 * remainder; whole minor units. What no net gives back goes to `rounding_minor`. Lines bear no allowances, and no quantity of 0.
 */
export function netPricedLines(lines: readonly InvoiceLine[], digits: number): NetPricedLines {
  const groups = new Map<string, InvoiceLine[]>();
  for (const line of lines) groups.set(taxKey(line.tax), [...(groups.get(taxKey(line.tax)) ?? []), line]);
  const converted = [...groups.values()].map((group) => ofOneTax(group, digits));
  const byId = new Map(converted.flatMap((group) => group.lines).map((line) => [line.id, line]));
  return {
    lines: lines.map((line) => byId.get(line.id) ?? line),
    rounding_minor: sumMinor(converted.map((group) => group.rounding_minor)),
  };
}

import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import type { ClaimedAmount } from '#shared/invoices/stage-claim';
import type { MinorUnits } from '#shared/money/decimal';
import { textOf } from '#shared/money/text-of';
import type { TaxRate } from '#shared/money/tax-by-category';

/** What the lines of a claim are called. */
export interface StageLineNames {
  readonly work: string;
  readonly recovered: string;
  readonly retained: string;
}

interface Amount {
  readonly id: string;
  readonly name: string;
  readonly amount_minor: MinorUnits;
  readonly tax: TaxRate;
}

/** One at an amount; an amount below nothing is a quantity of −1, since a price never is (EN 16931, BR-27). */
const lumpLine = ({ id, name, amount_minor, tax }: Amount, digits: number): InvoiceLine => ({
  ...{ id, name, description: '', unit: 'C62', baseQuantity: '1', allowancesCharges: [], tax },
  quantity: amount_minor < 0 ? '-1' : '1',
  price: textOf(Math.abs(amount_minor), digits),
});

/** The lines of a claim under each tax: the work, then what is recovered of the deposit and what is held back as quantities of −1; one at least. */
export function stageLines(amounts: readonly ClaimedAmount[], names: StageLineNames, digits: number): InvoiceLine[] {
  const lines = amounts.flatMap(({ tax, work_minor, recovered_minor, retained_minor }, place) => [
    { id: `work-${place + 1}`, name: names.work, amount_minor: work_minor, tax },
    { id: `recovered-${place + 1}`, name: names.recovered, amount_minor: -recovered_minor, tax },
    { id: `retained-${place + 1}`, name: names.retained, amount_minor: -retained_minor, tax },
  ]);
  const some = lines.filter(({ amount_minor }) => amount_minor !== 0);
  return (some.length > 0 ? some : lines.slice(0, 1)).map((line) => lumpLine(line, digits));
}

import { amountOf } from './line-rows';
import type { PricePage } from './price-sources';
import { sumRow } from './price-sums';
import { minorOfAmount, roundedAmount, roundedMinor } from './rounded';
import { formula } from './sheet';

/** The rows of the lines, and where the net price stands. */
export interface CostPlace {
  readonly firstRow: number;
  readonly lastRow: number;
  readonly net: string;
}

/** The workshop's side: what the job costs, and what is left of the net price. */
export function costRows(page: PricePage, { firstRow, lastRow, net }: CostPlace): void {
  const { sheet, columns, facts } = page;
  const { say } = facts.words;
  const { digits } = facts.price;
  const { cost } = facts.snapshot.figures;
  const { direct_minor, overhead_minor, contingency_minor, cost_minor, profit_minor, marginLeft_percent } = cost.price;
  const sum = (column: number) => `SUM(${sheet.here(column, firstRow)}:${sheet.here(column, lastRow)})`;
  sheet.add([]);
  const parts = [
    ['sheet-cost-direct', columns.direct, direct_minor],
    ['sheet-cost-overhead', columns.overhead, overhead_minor],
    ['sheet-cost-contingency', columns.contingency, contingency_minor],
  ] as const;
  const cells = parts.map(([label, column, amount_minor]) =>
    sumRow(page, say(label), formula(roundedAmount(sum(column), digits), amountOf(page, amount_minor))),
  );
  const minor = (address: string) => minorOfAmount(address, digits);
  const inAmount = (text: string) => (digits === 0 ? roundedMinor(text) : `${roundedMinor(text)}/${10 ** digits}`);
  const all = formula(inAmount(cells.map(minor).join('+')), amountOf(page, cost_minor));
  const whole = sumRow(page, say('sheet-cost'), all);
  const left = formula(inAmount(`${minor(net)}-${minor(whole)}`), amountOf(page, profit_minor));
  const profit = sumRow(page, say('sheet-profit-left'), left);
  const share = formula(`IF(${net}<=0,0,ROUND(${profit}/${net}*100,4))`, marginLeft_percent ?? 0);
  sumRow(page, say('sheet-margin-left'), share);
}

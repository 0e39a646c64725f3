import { D } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import type { PricePage } from './price-sources';
import { remainderFormula, remainderOf, shareFormula, thresholdFormula, thresholdOf } from './remainder';
import { minorOfAmount } from './rounded';
import { formula, type CellContent } from './sheet';
import type { NumberedLine, WorkbookFacts } from './workbook-facts';

const span = ({ sheet }: PricePage, column: number, { firstRow, lastRow }: RowsOfLines): string =>
  `${sheet.here(column, firstRow)}:${sheet.here(column, lastRow)}`;

/** The rows the lines stand in; one that insures the price has the row of its value before it, which has no price. */
export interface RowsOfLines {
  readonly firstRow: number;
  readonly lastRow: number;
}

export function rowsOfLines({ lines }: WorkbookFacts, firstRow: number): RowsOfLines {
  const insured = lines.filter(({ priced }) => priced.work.insured_percent !== null).length;
  const others = Math.max(1, lines.length - insured);
  return { firstRow, lastRow: firstRow + others + (insured === 0 ? 0 : insured + 1) - 1 };
}

/** What an agreed sum is shared out by: its whole in minor units, and what all lines are worked at together. */
function wholeOf({ facts }: PricePage): { agreed_minor: number; worked: D } {
  const { lumpSum, digits } = facts.price;
  const worked = facts.lines.reduce((sum, { priced }) => sum.plus(priced.unrounded), new D(0));
  return { agreed_minor: minorOf(lumpSum ?? '0', digits), worked };
}

/** The price of a line out of a lump sum: what it is worked at (not rounded), the key of its share, and the share as an amount. */
export function agreedCells(page: PricePage, { number, priced }: NumberedLine, worked: string): CellContent[] {
  const { sheet, columns, facts, money, rateRow } = page;
  const { agreed } = columns;
  if (agreed === null) return [];
  const rows = rowsOfLines(facts, rateRow + 1);
  const row = sheet.next;
  const whole = `SUM(${span(page, agreed.worked, rows)})`;
  const sum_minor = minorOfAmount(money.lumpSum ?? '0', facts.price.digits);
  const share = shareFormula(`${sum_minor}*${sheet.here(agreed.worked, row)}/${whole}`);
  const [key, threshold] = [sheet.here(agreed.remainder, row), sheet.here(agreed.remainder, rateRow)];
  const { agreed_minor, worked: all } = wholeOf(page);
  const exact = all.isZero() ? 0 : priced.unrounded.times(agreed_minor).div(all).toNumber();
  const scale = 10 ** facts.price.digits;
  const part = `(TRUNC(${share})+IF(${key}>=${threshold},1,0))`;
  return [
    formula(worked, priced.unrounded.toNumber()),
    formula(`IF(${whole}=0,0,${remainderFormula(share, number)})`, all.isZero() ? 0 : remainderOf(exact, number)),
    formula(`IF(${whole}=0,0,${part}/${scale})`, new D(priced.price_minor).div(scale).toNumber()),
  ];
}

/** The least remainder that still gets one more, over the remainders, in the row of rates. */
export function setAgreedThreshold(page: PricePage): void {
  const { sheet, columns, facts, rateRow } = page;
  const { agreed } = columns;
  if (agreed === null) return;
  const rows = rowsOfLines(facts, rateRow + 1);
  const values = sheet.rows.slice(rows.firstRow - 1, rows.lastRow).flatMap(({ cells }) => {
    const cell = cells[agreed.remainder - 1];
    return cell !== null && typeof cell === 'object' && 'value' in cell ? [cell.value] : [];
  });
  const row = sheet.rows[rateRow - 1];
  const cells = Array.from({ length: agreed.remainder }, (_, at) => row.cells[at] ?? null);
  cells[agreed.remainder - 1] = formula(thresholdFormula(span(page, agreed.remainder, rows)), thresholdOf(values));
  sheet.rows[rateRow - 1] = { ...row, cells };
}

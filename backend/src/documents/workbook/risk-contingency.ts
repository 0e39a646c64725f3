import type { ContingencyCells } from './line-rows';
import { lineCells } from './price-formula';
import type { PricePage } from './price-sources';
import { minorOfAmount } from './rounded';
import { remainderFormula, remainderOf, shareFormula, thresholdFormula, thresholdOf } from './remainder';
import { formula } from './sheet';
import type { NumberedLine } from './workbook-facts';

/** The rows of the lines that bear a contingency, and where its threshold will stand. */
export interface ContingencyPlace {
  readonly firstRow: number;
  readonly lastRow: number;
  readonly thresholdRow: number;
}

function span({ sheet }: PricePage, column: number, { firstRow, lastRow }: ContingencyPlace): string {
  return `${sheet.here(column, firstRow)}:${sheet.here(column, lastRow)}`;
}

/** The amount the risk trials found, shared out by direct cost and largest remainder; whole minor units. */
export function riskContingency(
  page: PricePage,
  lines: readonly NumberedLine[],
  place: ContingencyPlace,
): ContingencyCells {
  const { columns, facts, money, sheet } = page;
  const amount = minorOfAmount(money.contingency, facts.price.digits);
  const whole = `SUM(${span(page, columns.direct, place)})`;
  const threshold = sheet.here(columns.remainder ?? 0, place.thresholdRow);
  const total = lines.reduce((sum, { priced }) => sum + priced.direct.toNumber(), 0);
  const amount_minor = facts.price.contingency.way === 'risk' ? facts.price.contingency.amount_minor : 0;
  return (row, { priced, number }) => {
    const share = shareFormula(`${amount}*${lineCells(page, row).direct}/${whole}`);
    const key = sheet.here(columns.remainder ?? 0, row);
    const value = total === 0 ? 0 : (amount_minor * priced.direct.toNumber()) / total;
    return [
      formula(`IF(${whole}=0,0,${remainderFormula(share, number)})`, total === 0 ? 0 : remainderOf(value, number)),
      formula(`IF(${whole}=0,0,TRUNC(${share})+IF(${key}>=${threshold},1,0))`, priced.contingency.toNumber()),
    ];
  };
}

/** The least remainder that still gets one more. */
export function thresholdCell(page: PricePage, place: ContingencyPlace) {
  const { columns, sheet } = page;
  const keys = span(page, columns.remainder ?? 0, place);
  const values = sheet.rows.slice(place.firstRow - 1, place.lastRow).flatMap(({ cells }) => {
    const cell = cells[(columns.remainder ?? 0) - 1];
    return cell !== null && typeof cell === 'object' && 'value' in cell ? [cell.value] : [];
  });
  return formula(thresholdFormula(keys), thresholdOf(values));
}

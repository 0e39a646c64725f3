import type { LineWork } from '#shared/estimates/price/line-work';
import type { NumberedLine } from './workbook-facts';
import type { PricePage } from './price-sources';
import { roundedAmount, roundedMinor, settledFormula } from './rounded';

/** Hours as they enter money: to six decimals, floating point settled before. */
const hoursTaken = (hours: string): string => `ROUND(${settledFormula(`(${hours})`)},6)`;

/** Hours of one grade on a line, to six decimals, from carving, gilding, set-up and further lines; null where it has none. */
export function hoursFormula(page: PricePage, { number, priced }: NumberedLine, gradeId: string): string | null {
  const { facts, carving, gilding, setUp, extras } = page;
  const { work } = priced;
  if (work.name !== null) {
    const isItsGrade = work.items.some(({ head, itemId }) => head === 'labour' && itemId === gradeId);
    return isItsGrade ? hoursTaken(extras.hours(work.id) ?? '0') : null;
  }
  const grade = facts.grades.findIndex(({ id }) => id === gradeId) + 1;
  const at = { memberId: work.memberId ?? '', kind: work.kind, gradeId };
  const parts = [
    ...(work.kind === 'carving' ? carving.hoursOf(number, gradeId) : []),
    ...(gilding.hasHours(number, grade) ? [gilding.hoursOnLine(number, grade)] : []),
    ...setUp.hoursOf(at),
  ];
  return parts.length === 0 ? null : hoursTaken(parts.join('+'));
}

/** The cells of a line, by the columns they stand in. */
export function lineCells({ sheet, columns }: PricePage, row: number) {
  const here = (column: number) => sheet.here(column, row);
  return {
    hours: `${here(columns.firstGrade)}:${here(columns.lastGrade)}`,
    labour: here(columns.labour),
    direct: here(columns.direct),
    overhead: here(columns.overhead),
    contingency: here(columns.contingency),
  };
}

/** Hours of all grades, each at its rate. */
export function labourFormula(page: PricePage, row: number): string {
  const { sheet, columns, rateRow } = page;
  const rates = `${sheet.here(columns.firstGrade, rateRow)}:${sheet.here(columns.lastGrade, rateRow)}`;
  return `SUMPRODUCT(${lineCells(page, row).hours},${rates})`;
}

/** Labour with its consumables, goods shared out to the line, and what a further line buys. */
export function directFormula(page: PricePage, { number, priced }: NumberedLine, row: number): string {
  const { money, sharedOut, extras } = page;
  const { work } = priced;
  const goods = sharedOut.goodsOnLine(number);
  const bought = work.name === null ? null : extras.bought(work.id);
  const isWorked = work.items.some(({ head }) => head === 'labour');
  const parts = [
    ...(isWorked ? [`${lineCells(page, row).labour}*(1+${money.consumables}/100)`] : []),
    ...(goods === null ? [] : [goods]),
    ...(bought === null ? [] : [bought]),
  ];
  return parts.length === 0 ? '0' : parts.join('+');
}

export function overheadFormula(page: PricePage, row: number): string {
  const { facts, money, scale } = page;
  const { hours, labour } = lineCells(page, row);
  return facts.price.card.overhead.way === 'per-hour'
    ? `SUM(${hours})*ROUND(${money.overhead}*${scale},6)`
    : `${labour}*${money.overhead}/100`;
}

/** The price of a cost under margin or mark-up, in minor units and not rounded. */
export function priceOfCostFormula({ facts, money }: PricePage, cost: string): string {
  return facts.price.profit.way === 'margin'
    ? `(${cost})*100/(100-${money.share})`
    : `(${cost})*(100+${money.share})/100`;
}

/** (direct + overhead + contingency) at the profit asked for, not rounded. */
export function workedPriceFormula(page: PricePage, row: number): string {
  const { direct, overhead, contingency } = lineCells(page, row);
  return priceOfCostFormula(page, `${direct}+${overhead}+${contingency}`);
}

/** The same, rounded once. */
export const priceFormula = (page: PricePage, row: number): string =>
  roundedAmount(workedPriceFormula(page, row), page.facts.price.digits);

/** A price of its own in minor units. */
export const ownMinorFormula = ({ extras }: PricePage, work: LineWork): string =>
  roundedMinor(extras.price(work.id) ?? '0');

/** A price of its own, taken as it was entered. */
export const ownPriceFormula = ({ extras, facts }: PricePage, work: LineWork): string =>
  roundedAmount(extras.price(work.id) ?? '0', facts.price.digits);

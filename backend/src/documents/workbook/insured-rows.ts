import { insuredValue } from '#shared/estimates/price/insured-work';
import { sumMinor } from '#shared/money/sum-minor';
import { taxNumber } from './tax-number';
import { priceOfCostFormula } from './price-line-formulas';
import { amountOf } from './price-line-rows';
import type { PricePage } from './price-parts';
import { minorOfAmount, roundedAmount } from './rounded';
import { formula, type CellContent } from './sheet';
import type { NumberedLine } from './workbook-facts';

const isShare = ({ facts }: PricePage): boolean => facts.price.contingency.way === 'share';

const contingencyShare = (page: PricePage): string => (isShare(page) ? `${page.money.contingency}/100` : '0');

/** What a line insuring the price adds to it, as a share of the price: insurance × (1 + contingency) × factor. */
function loadFormula(page: PricePage, { priced }: NumberedLine): string {
  const percent = page.extras.insured(priced.work.id) ?? '0';
  return priceOfCostFormula(page, `${percent}/100*(1+${contingencyShare(page)})`);
}

/** The value insured: the whole price, insurance included. V = S ÷ (1 − load), S being the prices of the other lines. */
function valueRow(
  page: PricePage,
  insured: readonly NumberedLine[],
  others: readonly NumberedLine[],
  span: string,
): string {
  const { sheet, columns, facts } = page;
  const load = insured.map((line) => loadFormula(page, line)).join('+');
  const sum = minorOfAmount(`SUM(${span})`, facts.price.digits);
  const others_minor = sumMinor(others.map(({ priced }) => priced.price_minor));
  const works = insured.map(({ priced }) => priced.work);
  const value = insuredValue(others_minor, works, facts.price)?.toNumber() ?? 0;
  const blanks = Array.from({ length: columns.direct - 4 }, () => null);
  const row = sheet.next;
  const label = facts.words.say('sheet-value-insured');
  sheet.add([null, null, label, ...blanks, formula(`IF(${load}>=1,0,${sum}/(1-(${load})))`, value)]);
  return sheet.here(columns.direct, row);
}

/** Lines that insure the price itself, once the others stand above them. */
export function insuredRows(
  page: PricePage,
  lines: { insured: readonly NumberedLine[]; others: readonly NumberedLine[] },
  span: string,
): void {
  if (lines.insured.length === 0) return;
  const { sheet, columns, facts } = page;
  const value = valueRow(page, lines.insured, lines.others, span);
  for (const line of lines.insured) {
    const { priced, number } = line;
    const row = sheet.next;
    const direct = sheet.here(columns.direct, row);
    const contingency = sheet.here(columns.contingency, row);
    const blanks = (count: number): CellContent[] => Array.from({ length: count }, () => null);
    const cost = formula(`${value}*${page.extras.insured(priced.work.id)}/100`, priced.direct.toNumber());
    const own = formula(`${direct}*${contingencyShare(page)}`, priced.contingency.toNumber());
    const price = roundedAmount(priceOfCostFormula(page, `${direct}+${contingency}`), facts.price.digits);
    sheet.add([
      ...[number, '', priced.work.name ?? '', taxNumber(facts, priced.work.taxCategoryId)],
      ...blanks(columns.direct - columns.firstGrade),
      cost,
      ...blanks(columns.contingency - columns.overhead),
      own,
      formula(price, amountOf(page, priced.price_minor)),
    ]);
  }
}

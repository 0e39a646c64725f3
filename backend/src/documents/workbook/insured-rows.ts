import { insuredValue } from '#shared/estimates/price/insured-work';
import { sumMinor } from '#shared/money/sum-minor';
import { taxNumber } from './tax-number';
import { priceOfCostFormula } from './price-formula';
import { agreedCells } from './agreed-cells';
import { amountOf } from './line-rows';
import type { PricePage } from './price-sources';
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

/** The lines that insure the price, the others, and where the prices of those stand. */
export interface InsuredLines {
  readonly insured: readonly NumberedLine[];
  readonly others: readonly NumberedLine[];
  readonly prices: string;
}

const blanks = (count: number): CellContent[] => Array.from({ length: count }, () => null);

/** The value insured: the whole price, insurance included. V = S ÷ (1 − load), S being the prices of the other lines. */
function valueRow(page: PricePage, { insured, others, prices }: InsuredLines): string {
  const { sheet, columns, facts } = page;
  const load = insured.map((line) => loadFormula(page, line)).join('+');
  const sum = minorOfAmount(`SUM(${prices})`, facts.price.digits);
  const others_minor = sumMinor(others.map(({ priced }) => priced.price_minor));
  const works = insured.map(({ priced }) => priced.work);
  const value = insuredValue(others_minor, works, facts.price)?.toNumber() ?? 0;
  const row = sheet.next;
  const label = facts.words.say('sheet-value-insured');
  const { lumpSum } = page.money;
  // A lump sum is what there is to insure.
  const text = lumpSum === null ? `IF(${load}>=1,0,${sum}/(1-(${load})))` : minorOfAmount(lumpSum, facts.price.digits);
  // Beside the costs, which are summed, and not among them.
  sheet.add([null, null, label, ...blanks(columns.labour - 4), formula(text, value)]);
  return sheet.here(columns.labour, row);
}

function insuredRow(page: PricePage, line: NumberedLine, value: string): void {
  const { priced, number } = line;
  const { sheet, columns, facts, extras } = page;
  const row = sheet.next;
  const [direct, contingency] = [sheet.here(columns.direct, row), sheet.here(columns.contingency, row)];
  const worked = priceOfCostFormula(page, `${direct}+${contingency}`);
  sheet.add([
    ...[number, '', priced.work.name ?? '', taxNumber(facts, priced.work.taxCategoryId)],
    ...blanks(columns.direct - columns.firstGrade),
    formula(`${value}*${extras.insured(priced.work.id)}/100`, priced.direct.toNumber()),
    ...blanks(columns.contingency - columns.overhead),
    formula(`${direct}*${contingencyShare(page)}`, priced.contingency.toNumber()),
    ...(columns.agreed
      ? agreedCells(page, line, worked)
      : [formula(roundedAmount(worked, facts.price.digits), amountOf(page, priced.price_minor))]),
  ]);
}

/** Lines that insure the price itself, once the others stand above them. The row of the value is no line, and has no price. */
export function insuredRows(page: PricePage, lines: InsuredLines): void {
  if (lines.insured.length === 0) return;
  const value = valueRow(page, lines);
  for (const line of lines.insured) insuredRow(page, line, value);
}

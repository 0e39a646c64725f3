import type { PriceTax } from '#shared/estimates/price/price';
import { isRated } from '#shared/money/is-rated';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { sumMinor } from '#shared/money/sum-minor';
import { linePlace } from './price-columns';
import { amountOf } from './line-rows';
import type { PricePage } from './price-sources';
import { placeWeight, shareFormula } from './remainder';
import { minorOfAmount, roundedAmount } from './rounded';
import { formula, type FormulaCell } from './sheet';
import { taxNumber } from './tax-number';

/** The rows of the lines, and where the discount stands. */
export interface TaxPlace {
  readonly firstRow: number;
  readonly lastRow: number;
  readonly discount: string | null;
}

/** One tax with what it is worked from, in whole minor units; `exact` and `remainder` are of its part of the discount. */
interface TaxFigures {
  readonly tax: PriceTax;
  readonly lines_minor: number;
  readonly exact: number;
  readonly remainder: number;
  readonly part_minor: number;
}

/** Columns of the table, from the first of hours on. */
const heads = ['lines', 'exact', 'remainder', 'part', 'taxed'] as const;
type Head = (typeof heads)[number];

function taxFigures({ facts }: PricePage): TaxFigures[] {
  const { taxes, lines, discount_minor } = facts.snapshot.figures.price;
  const sums = taxes.map((_, place) =>
    sumMinor(
      lines.filter((line) => taxNumber(facts, line.taxCategoryId) === place + 1).map((line) => line.price_minor),
    ),
  );
  const whole = sumMinor(sums);
  const parts = splitByLargestRemainder(discount_minor, sums);
  const exacts = sums.map((sum) => (whole === 0 ? 0 : Number(((discount_minor * sum) / whole).toFixed(8))));
  const left = discount_minor - exacts.reduce((sum, one) => sum + Math.trunc(one), 0);
  return taxes.map((tax, place) => ({
    ...{ tax, lines_minor: sums[place], exact: exacts[place], part_minor: parts[place] },
    remainder: Number(((exacts[place] - Math.trunc(exacts[place])) * Math.sign(left)).toFixed(8)) - (place + 1) * 1e-12,
  }));
}

interface TaxTable extends TaxPlace {
  readonly first: number;
  readonly count: number;
  readonly at: (head: Head, row: number) => string;
  readonly span: (head: Head) => string;
}

function tableOf({ sheet, columns, facts }: PricePage, place: TaxPlace): TaxTable {
  const first = sheet.next;
  const count = facts.snapshot.figures.price.taxes.length;
  const at: TaxTable['at'] = (head, row) => sheet.here(columns.firstGrade + heads.indexOf(head), row);
  return { ...place, first, count, at, span: (head) => `${at(head, first)}:${at(head, first + count - 1)}` };
}

/** Parts of the discount by largest remainder, a negative one as its absolute value. */
function discountFormulas(
  page: PricePage,
  table: TaxTable,
  row: number,
): Record<'exact' | 'remainder' | 'part', string> {
  if (table.discount === null) return { exact: '0', remainder: '0', part: '0' };
  const minor = minorOfAmount(table.discount, page.facts.price.digits);
  const [exact, remainder] = [table.at('exact', row), table.at('remainder', row)];
  const cut = Array.from({ length: table.count }, (_, place) => `TRUNC(${table.at('exact', table.first + place)})`);
  const left = `(${minor}-(${cut.join('+')}))`;
  const threshold = `LARGE(${table.span('remainder')},MAX(1,ABS(${left})))`;
  const whole = `SUM(${table.span('lines')})`;
  return {
    exact: `IF(${whole}=0,0,${shareFormula(`${minor}*${table.at('lines', row)}/${whole}`)})`,
    remainder: `ROUND((${exact}-TRUNC(${exact}))*SIGN(${left}),8)-${placeWeight(row - table.first + 1)}`,
    part: `TRUNC(${exact})+IF(${left}=0,0,IF(${remainder}>=${threshold},SIGN(${left}),0))`,
  };
}

function linesFormula({ sheet, columns, facts }: PricePage, place: TaxPlace, number: number): string {
  const span = (column: number) => `${sheet.here(column, place.firstRow)}:${sheet.here(column, place.lastRow)}`;
  return minorOfAmount(`SUMIFS(${span(columns.price)},${span(linePlace.tax)},${number})`, facts.price.digits);
}

function taxFormula({ facts, money }: PricePage, tax: PriceTax, at: { place: number; taxed: string }): string {
  if (!isRated(tax.tax.code)) return '0';
  return roundedAmount(`${at.taxed}*${money.taxes[at.place]}/100`, facts.price.digits);
}

function tableCells(
  page: PricePage,
  table: TaxTable,
  { row, figures }: { row: number; figures: TaxFigures },
): FormulaCell[] {
  const discount = discountFormulas(page, table, row);
  const number = row - table.first + 1;
  return [
    formula(linesFormula(page, table, number), figures.lines_minor),
    formula(discount.exact, figures.exact),
    formula(discount.remainder, table.discount === null ? 0 : figures.remainder),
    formula(discount.part, figures.part_minor),
    formula(`${table.at('lines', row)}-${table.at('part', row)}`, figures.tax.net_minor),
  ];
}

/** Tax once per category on the sum of its lines less its part of the discount; gives the sum of the taxes as a formula. */
export function taxRows(page: PricePage, place: TaxPlace): string {
  const { sheet, columns, facts } = page;
  const { say } = facts.words;
  const { taxCategories } = facts.snapshot.card.money;
  sheet.add([null, null, say('sheet-taxes'), null, ...heads.map((head) => say(`sheet-tax-${head}`))], 'head');
  const table = tableOf(page, place);
  const blanks = Array.from({ length: columns.price - columns.firstGrade - heads.length }, () => null);
  taxFigures(page).forEach((figures, index) => {
    const { tax } = figures;
    const row = sheet.next;
    const name = taxCategories.find(({ id }) => id === tax.taxCategoryId)?.name ?? tax.tax.code;
    const text = taxFormula(page, tax, { place: index, taxed: table.at('taxed', row) });
    const cells = tableCells(page, table, { row, figures });
    sheet.add([index + 1, null, name, null, ...cells, ...blanks, formula(text, amountOf(page, tax.tax_minor))]);
  });
  const to = sheet.here(columns.price, sheet.rows.length);
  return table.count === 0 ? '0' : `SUM(${sheet.here(columns.price, table.first)}:${to})`;
}

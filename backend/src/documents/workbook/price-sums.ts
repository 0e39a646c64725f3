import type { NameBook } from './name-book';
import { amountFormat } from './price-columns';
import { amountOf } from './line-rows';
import type { PricePage } from './price-sources';
import { minorOfAmount, roundedAmount, roundedMinor } from './rounded';
import { formula, type CellContent } from './sheet';
import { taxRows } from './tax-rows';

/** Where the sums of a price stand. */
export interface PriceSums {
  /** On the sheet itself. */
  readonly net: string;
  /** For other sheets. */
  readonly gross: string;
}

/** The rows of the lines, and the name book their sums go into. */
export interface SumPlace {
  readonly firstRow: number;
  readonly lastRow: number;
  readonly names: NameBook;
}

/** Writes a sum under the prices and gives its address on the sheet. */
export function sumRow(page: PricePage, label: string, cell: CellContent): string {
  const { sheet, columns } = page;
  const blanks = Array.from({ length: columns.price - 4 }, () => null);
  const row = sheet.add([null, null, label, ...blanks, cell], 'sum', amountFormat(page.facts.price.digits));
  return sheet.here(columns.price, row);
}

function discountFormula({ facts, money }: PricePage, subtotal: string): string {
  const { digits, discount } = facts.price;
  const subtotal_minor = minorOfAmount(subtotal, digits);
  const off =
    discount?.way === 'percent'
      ? roundedAmount(`${subtotal_minor}*${money.discount}/100`, digits)
      : roundedAmount(`${money.discount}*${10 ** digits}`, digits);
  return `IF(${subtotal_minor}=0,0,${off})`;
}

/** Net is the sum of the rounded lines less the discount, tax once per category, gross. */
export function priceSums(page: PricePage, { firstRow, lastRow, names }: SumPlace): PriceSums {
  const { sheet, columns, facts, money } = page;
  const { say } = facts.words;
  const { digits } = facts.price;
  const { subtotal_minor, discount_minor, net_minor, tax_minor, gross_minor } = facts.snapshot.figures.price;
  const prices = `${sheet.here(columns.price, firstRow)}:${sheet.here(columns.price, lastRow)}`;
  sheet.add([]);
  const named = (name: string, address: string) => {
    names.add([name], `'${sheet.name}'!${address}`);
    return address;
  };
  const sum = roundedAmount(minorOfAmount(`SUM(${prices})`, digits), digits);
  const subtotal = named(
    'lines_sum',
    sumRow(page, say('paper-lines-sum'), formula(sum, amountOf(page, subtotal_minor))),
  );
  const discount =
    money.discount === null
      ? null
      : sumRow(page, say('sheet-discount'), formula(discountFormula(page, subtotal), amountOf(page, discount_minor)));
  const less = discount === null ? '' : `-${minorOfAmount(discount, digits)}`;
  const net_formula = roundedAmount(`${minorOfAmount(subtotal, digits)}${less}`, digits);
  const net = named('net', sumRow(page, say('paper-net'), formula(net_formula, amountOf(page, net_minor))));
  const taxes = taxRows(page, { firstRow, lastRow, discount });
  const tax = sumRow(
    page,
    say('sheet-tax-sum'),
    formula(roundedAmount(minorOfAmount(taxes, digits), digits), amountOf(page, tax_minor)),
  );
  const all = roundedMinor(`${minorOfAmount(net, digits)}+${minorOfAmount(tax, digits)}`);
  const gross = sumRow(
    page,
    say('paper-total'),
    formula(digits === 0 ? all : `${all}/${10 ** digits}`, amountOf(page, gross_minor)),
  );
  return { net, gross: `'${sheet.name}'!${named('gross', gross)}` };
}

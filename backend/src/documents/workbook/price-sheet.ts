import { exactMinor } from '#shared/money/minor-of';
import { setAgreedThreshold } from './agreed-cells';
import { costRows } from './cost-rows';
import { insuredRows } from './insured-rows';
import type { NameBook } from './name-book';
import { priceColumns, priceHeads, priceSheetColumns } from './price-columns';
import { lineRows, sharedContingency } from './line-rows';
import type { PricePage, PriceSources } from './price-sources';
import { priceSums, type PriceSums } from './price-sums';
import { riskContingency, thresholdCell, type ContingencyPlace } from './risk-contingency';
import { formula, Sheet } from './sheet';
import type { NumberedLine, WorkbookFacts } from './workbook-facts';

/** The rates of the grades over the lines, in minor units an hour. */
function rateRow(page: PricePage): void {
  const { sheet, facts, money, scale } = page;
  const { digits } = facts.price;
  const rates = facts.grades.map((grade, place) => {
    const value = exactMinor(grade.costPerHour, digits).toNumber();
    return formula(`ROUND(${money.grades[place]}*${scale},6)`, value);
  });
  sheet.add([null, null, facts.words.say('sheet-rate-row'), null, ...(rates.length === 0 ? [null] : rates)], 'sum');
}

const isInsuring = ({ priced }: NumberedLine): boolean => priced.work.insured_percent !== null;

/** Every line with what stands behind it, the others first, then those that insure the price they all come to. */
function allLines(page: PricePage): { firstRow: number; lastRow: number } {
  const { facts, sheet, columns } = page;
  const insured = facts.lines.filter(isInsuring);
  const others = facts.lines.filter((line) => !isInsuring(line));
  const firstRow = sheet.next;
  const place: ContingencyPlace = {
    firstRow,
    lastRow: firstRow + Math.max(0, others.length - 1),
    thresholdRow: page.rateRow,
  };
  const isRisk = facts.price.contingency.way === 'risk';
  lineRows(page, others, isRisk ? riskContingency(page, others, place) : sharedContingency(page));
  if (others.length === 0) sheet.add([]);
  if (isRisk) setThreshold(page, place);
  const prices = `${sheet.here(columns.price, firstRow)}:${sheet.here(columns.price, sheet.rows.length)}`;
  insuredRows(page, { insured, others, prices });
  setAgreedThreshold(page);
  return { firstRow, lastRow: sheet.rows.length };
}

/** The threshold stands over the remainders, in the row of rates. */
function setThreshold(page: PricePage, place: ContingencyPlace): void {
  const { sheet, columns } = page;
  const row = sheet.rows[page.rateRow - 1];
  const cells = Array.from({ length: columns.remainder ?? 0 }, (_, at) => row.cells[at] ?? null);
  cells[(columns.remainder ?? 1) - 1] = thresholdCell(page, place);
  sheet.rows[page.rateRow - 1] = { ...row, cells };
}

/** The price, line by line as the estimate has it: each worked by itself and rounded once, then discount, tax and total. */
export function priceSheet(
  facts: WorkbookFacts,
  sources: PriceSources,
  { names, unit }: { readonly names: NameBook; readonly unit: string },
): Pick<PriceSums, 'gross'> & { readonly sheet: Sheet } {
  const { words, price } = facts;
  const columns = priceColumns(facts);
  const sheet = new Sheet(words.say('sheet-price'), priceSheetColumns(columns, facts));
  sheet.head(words.say('sheet-price'), words.say('sheet-price-note', { unit }), priceHeads(columns, facts, unit));
  const page: PricePage = { ...sources, sheet, facts, columns, scale: 10 ** price.digits, rateRow: sheet.next };
  rateRow(page);
  const rows = allLines(page);
  const sums = priceSums(page, { ...rows, names });
  costRows(page, { ...rows, net: sums.net });
  return { sheet, gross: sums.gross };
}

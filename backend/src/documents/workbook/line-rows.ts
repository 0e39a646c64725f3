import { textOf } from '#shared/money/text-of';
import { agreedCells } from './agreed-cells';
import { taxNumber } from './tax-number';
import {
  directFormula,
  hoursFormula,
  labourFormula,
  lineCells,
  overheadFormula,
  ownMinorFormula,
  ownPriceFormula,
  priceFormula,
  workedPriceFormula,
} from './price-formula';
import type { PricePage } from './price-sources';
import { formula, type CellContent } from './sheet';
import type { NumberedLine } from './workbook-facts';

/** Contingency of one line: a share of its direct cost, or its part of what the risk trials found. */
export type ContingencyCells = (row: number, line: NumberedLine) => readonly CellContent[];

export const amountOf = ({ facts }: PricePage, amount_minor: number): number =>
  Number(textOf(amount_minor, facts.price.digits));

function frame(page: PricePage, { number, priced }: NumberedLine): CellContent[] {
  const { facts } = page;
  const { work } = priced;
  const member = facts.prepared.work.members.find((one) => one.member.id === work.memberId)?.member.name;
  const name = work.name ?? facts.words.say(`work-kind-${work.kind}`);
  return [number, member ?? '', name, taxNumber(facts, work.taxCategoryId)];
}

function hourCells(page: PricePage, line: NumberedLine): CellContent[] {
  const { grades } = page.facts;
  if (grades.length === 0) return [null];
  return grades.map(({ id }) => {
    const text = hoursFormula(page, line, id);
    const item = line.priced.work.items.find(({ head, itemId }) => head === 'labour' && itemId === id);
    return text === null ? null : formula(text, item?.hours.toNumber() ?? 0);
  });
}

function labourOf({ priced }: NumberedLine): number {
  const items = priced.work.items.filter(({ head }) => head === 'labour');
  return items.reduce((sum, { cost }) => sum + cost.toNumber(), 0);
}

/** A line with a price of its own: neither hours nor cost behind it. */
function ownPriceRow(page: PricePage, line: NumberedLine): void {
  const { columns, sheet } = page;
  const first = columns.agreed?.worked ?? columns.price;
  const blanks = Array.from({ length: first - columns.firstGrade }, () => null);
  const price = amountOf(page, line.priced.price_minor);
  const cells = columns.agreed
    ? agreedCells(page, line, ownMinorFormula(page, line.priced.work))
    : [formula(ownPriceFormula(page, line.priced.work), price)];
  sheet.add([...frame(page, line), ...blanks, ...cells]);
}

/** A worked line: hours by grade, labour, direct cost, overhead, contingency, and the price they come to. */
function workedRow(page: PricePage, line: NumberedLine, contingency: ContingencyCells): void {
  const { sheet } = page;
  const { priced } = line;
  const row = sheet.next;
  const hours = hourCells(page, line);
  const isWorked = hours.some((cell) => cell !== null);
  sheet.add([
    ...frame(page, line),
    ...hours,
    isWorked ? formula(labourFormula(page, row), labourOf(line)) : null,
    formula(directFormula(page, line, row), priced.direct.toNumber()),
    isWorked ? formula(overheadFormula(page, row), priced.overhead.toNumber()) : null,
    ...contingency(row, line),
    ...(page.columns.agreed
      ? agreedCells(page, line, workedPriceFormula(page, row))
      : [formula(priceFormula(page, row), amountOf(page, priced.price_minor))]),
  ]);
}

/** Lines one after another, as they were priced. */
export function lineRows(page: PricePage, lines: readonly NumberedLine[], contingency: ContingencyCells): void {
  for (const line of lines) {
    if (line.priced.work.price_minor !== null) ownPriceRow(page, line);
    else workedRow(page, line, contingency);
  }
}

/** Contingency as a share of each line's direct cost. */
export const sharedContingency =
  (page: PricePage): ContingencyCells =>
  (row, { priced }) => [
    formula(`${lineCells(page, row).direct}*${page.money.contingency}/100`, priced.contingency.toNumber()),
  ];

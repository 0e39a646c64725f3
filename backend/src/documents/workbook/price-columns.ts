import type { SheetColumn } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** Where the columns of the price stand: as many of hours as there are grades, a key only where contingency is shared out from risk. */
export interface PriceColumns {
  readonly firstGrade: number;
  readonly lastGrade: number;
  readonly labour: number;
  readonly direct: number;
  readonly overhead: number;
  readonly remainder: number | null;
  readonly contingency: number;
  /** Only where a lump sum is shared out: what a line is worked at, and what its exact share has behind the point. */
  readonly agreed: { readonly worked: number; readonly remainder: number } | null;
  readonly price: number;
}

export const linePlace = { number: 1, member: 2, work: 3, tax: 4 } as const;

/** The columns of an issue's price. */
export function priceColumns({ grades, price }: WorkbookFacts): PriceColumns {
  const firstGrade = linePlace.tax + 1;
  const lastGrade = linePlace.tax + Math.max(1, grades.length);
  const [labour, direct, overhead] = [lastGrade + 1, lastGrade + 2, lastGrade + 3];
  const remainder = price.contingency.way === 'risk' ? overhead + 1 : null;
  const contingency = (remainder ?? overhead) + 1;
  const agreed = price.lumpSum ? { worked: contingency + 1, remainder: contingency + 2 } : null;
  const last = agreed?.remainder ?? contingency;
  return { firstGrade, lastGrade, labour, direct, overhead, remainder, contingency, agreed, price: last + 1 };
}

const hoursFormat = '#,##0.00####';
const minorFormat = '#,##0.00##';

/** How amounts of the currency are shown, with as many decimals as it has. */
export const amountFormat = (digits: number): string => (digits === 0 ? '#,##0' : `#,##0.${'0'.repeat(digits)}`);

/** Widths and formats of those columns. */
export function priceSheetColumns(columns: PriceColumns, { price, grades }: WorkbookFacts): SheetColumn[] {
  const figure = (width: number, format: string) => ({ width, format });
  return [
    ...[figure(7, '0'), figure(30, ''), figure(30, ''), figure(6, '0')],
    ...Array.from({ length: Math.max(1, grades.length) }, () => figure(13, hoursFormat)),
    ...[figure(16, minorFormat), figure(16, minorFormat), figure(16, minorFormat)],
    ...(columns.remainder === null ? [] : [figure(18, '0.000000000000')]),
    figure(16, minorFormat),
    ...(columns.agreed === null ? [] : [figure(18, minorFormat), figure(18, '0.000000000000')]),
    figure(16, amountFormat(price.digits)),
  ];
}

/** Their heads. */
export function priceHeads(
  columns: PriceColumns,
  { words: { say }, grades, snapshot }: WorkbookFacts,
  unit: string,
): string[] {
  const { currency } = snapshot.workshop;
  const names = grades.length === 0 ? [''] : grades.map(({ name }) => say('sheet-head-hours-of', { grade: name }));
  return [
    ...[say('sheet-head-line'), say('sheet-head-member'), say('sheet-head-work'), say('sheet-head-tax')],
    ...names,
    ...[say('sheet-head-labour', { unit }), say('sheet-head-direct', { unit }), say('sheet-head-overhead', { unit })],
    ...(columns.remainder === null ? [] : [say('sheet-head-remainder')]),
    say('sheet-head-contingency', { unit }),
    ...(columns.agreed === null ? [] : [say('sheet-head-worked', { unit }), say('sheet-head-remainder')]),
    say('sheet-head-price', { currency }),
  ];
}

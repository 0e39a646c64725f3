import type { ExtraLine } from '#shared/estimates/settings';
import { extraCells, type ExtraResult } from './extra-cells';
import type { MeasuresPage } from './measures-sheet';
import { formula, input, Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The further lines with what they are worked from. */
export interface ExtrasPage {
  readonly sheet: Sheet;
  /** What a line buys, in minor units, or the price it was given, in currency, as formulas; null where it has none. */
  readonly bought: (lineId: string) => string | null;
  readonly price: (lineId: string) => string | null;
  readonly hours: (lineId: string) => string | null;
  /** Percent of the price that insures the price itself. */
  readonly insured: (lineId: string) => string | null;
}

const at = { name: 1, kind: 2, amount: 3, unit: 4, price: 5, percent: 6, result: 7 } as const;

interface Worked {
  readonly of: ExtraResult;
  readonly address: string;
}

const figureOr = (figure: number | undefined) => (figure === undefined ? null : input(figure));

interface ExtrasFrom {
  readonly facts: WorkbookFacts;
  readonly measures: MeasuresPage;
}

function extraRow(sheet: Sheet, extra: ExtraLine, { facts, measures }: ExtrasFrom): Worked {
  const cells = extraCells(extra, 10 ** facts.price.digits);
  const quantity = measures.quantity(extra.id);
  const row = sheet.next;
  const here = (column: number) => sheet.here(column, row);
  sheet.add([
    ...[extra.name, facts.words.say(`sheet-extra-${extra.kind}`)],
    ...[quantity === null ? figureOr(cells.amount) : formula(quantity, cells.amount ?? 0), cells.unit ?? null],
    ...[figureOr(cells.price), figureOr(cells.percent)],
    formula(cells.result(here(at.amount), here(at.price), here(at.percent)), cells.value.toNumber()),
  ]);
  return { of: cells.of, address: sheet.at(at.result, row) };
}

/** Further lines: what each is worked from, in the order they were entered. */
export function extrasSheet(facts: WorkbookFacts, measures: MeasuresPage, unit: string): ExtrasPage {
  const { words, price, snapshot } = facts;
  const column = (width: number, format = '') => ({ width, format });
  const figure = column(14, '#,##0.00####');
  const sheet = new Sheet(words.say('sheet-extras'), [
    ...[column(40), column(24), figure, column(10), figure, figure, column(16, '#,##0.00##')],
  ]);
  sheet.head(words.say('sheet-extras'), words.say('sheet-extras-note', { unit }), [
    ...[words.say('sheet-head-what'), words.say('sheet-head-kind'), words.say('sheet-head-amount')],
    ...[words.say('sheet-head-unit'), words.say('sheet-head-price', { currency: snapshot.workshop.currency }), '%'],
    words.say('sheet-head-result', { unit }),
  ]);
  const worked = new Map(price.extras.map((extra) => [extra.id, extraRow(sheet, extra, { facts, measures })]));
  const of = (kind: ExtraResult) => (lineId: string) => {
    const found = worked.get(lineId);
    return found?.of === kind ? found.address : null;
  };
  return { sheet, bought: of('bought'), price: of('price'), hours: of('hours'), insured: of('insured') };
}

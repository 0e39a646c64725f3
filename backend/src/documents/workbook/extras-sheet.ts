import type { ExtraLine } from '#shared/estimates/settings';
import { D } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';
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
  readonly of: 'bought' | 'price' | 'hours' | 'insured';
  readonly address: string;
}

interface ExtraCells {
  readonly of: Worked['of'];
  readonly amount?: number;
  readonly unit?: string;
  readonly price?: number;
  readonly percent?: number;
  /** What comes of it, from the addresses of amount, price and percent. */
  readonly result: (amount: string, price: string, percent: string) => string;
  readonly value: D;
}

function cellsOf(extra: ExtraLine, scale: number): ExtraCells {
  switch (extra.kind) {
    case 'labour':
      return {
        of: 'hours',
        amount: extra.hours,
        unit: 'h',
        result: (hours) => hours,
        value: new D(String(extra.hours)),
      };
    case 'bought-in':
      return {
        of: 'bought',
        price: Number(extra.cost),
        result: (_, price) => `${price}*${scale}`,
        value: new D(extra.cost).times(scale),
      };
    case 'timber':
      return {
        ...{ of: 'bought', amount: exactFigure(extra.volume_dm3).toNumber(), unit: 'dm³' },
        ...{ price: Number(extra.price_per_dm3), percent: exactFigure(extra.waste_percent).toNumber() },
        result: (volume, price, waste) => `${volume}*(1+${waste}/100)*${price}*${scale}`,
        value: exactFigure(extra.volume_dm3)
          .times(exactFigure(extra.waste_percent).div(100).plus(1))
          .times(extra.price_per_dm3)
          .times(scale),
      };
    case 'paid-quantity':
      return {
        ...{ of: 'price', amount: Number(extra.quantity), unit: extra.unit, price: Number(extra.price) },
        result: (quantity, price) => `${quantity}*${price}*${scale}`,
        value: new D(extra.quantity).times(extra.price).times(scale),
      };
    case 'price':
      return {
        of: 'price',
        price: Number(extra.price),
        result: (_, price) => `${price}*${scale}`,
        value: new D(extra.price).times(scale),
      };
    case 'insurance':
      if (extra.value === null)
        return {
          of: 'insured',
          percent: Number(extra.percent),
          result: (_, __, percent) => percent,
          value: new D(extra.percent),
        };
      return {
        ...{ of: 'bought', price: Number(extra.value), percent: Number(extra.percent) },
        result: (_, value, percent) => `${value}*${scale}*${percent}/100`,
        value: new D(extra.value).times(scale).times(extra.percent).div(100),
      };
  }
}

const figureOr = (figure: number | undefined) => (figure === undefined ? null : input(figure));

function extraRow(sheet: Sheet, extra: ExtraLine, facts: WorkbookFacts): Worked {
  const cells = cellsOf(extra, 10 ** facts.price.digits);
  const row = sheet.next;
  const here = (column: number) => sheet.here(column, row);
  sheet.add([
    ...[extra.name, facts.words.say(`sheet-extra-${extra.kind}`), figureOr(cells.amount), cells.unit ?? null],
    ...[figureOr(cells.price), figureOr(cells.percent)],
    formula(cells.result(here(at.amount), here(at.price), here(at.percent)), cells.value.toNumber()),
  ]);
  return { of: cells.of, address: sheet.at(at.result, row) };
}

/** Further lines: what each is worked from, in the order they were entered. */
export function extrasSheet(facts: WorkbookFacts, unit: string): ExtrasPage {
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
  const worked = new Map(price.extras.map((extra) => [extra.id, extraRow(sheet, extra, facts)]));
  const of = (kind: Worked['of']) => (lineId: string) => {
    const found = worked.get(lineId);
    return found?.of === kind ? found.address : null;
  };
  return { sheet, bought: of('bought'), price: of('price'), hours: of('hours'), insured: of('insured') };
}

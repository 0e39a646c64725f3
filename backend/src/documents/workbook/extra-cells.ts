import type { ExtraLine } from '#shared/estimates/settings';
import { D } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';

/** What a further line comes to: something bought, a price of its own, hours, or a share of the price it insures. */
export type ExtraResult = 'bought' | 'price' | 'hours' | 'insured';

/** The figures a further line is worked from, and what comes of them. */
export interface ExtraCells {
  readonly of: ExtraResult;
  readonly amount?: number;
  readonly unit?: string;
  readonly price?: number;
  readonly percent?: number;
  /** As a formula of the addresses of amount, price and percent. */
  readonly result: (amount: string, price: string, percent: string) => string;
  readonly value: D;
}

type Of<Kind extends ExtraLine['kind']> = Extract<ExtraLine, { kind: Kind }>;

const labour = ({ hours }: Of<'labour'>): ExtraCells => ({
  ...{ of: 'hours', amount: hours, unit: 'h', value: new D(String(hours)) },
  result: (amount) => amount,
});

const amountOf = (of: ExtraResult, amount: string, scale: number): ExtraCells => ({
  ...{ of, price: Number(amount), value: new D(amount).times(scale) },
  result: (_, price) => `${price}*${scale}`,
});

/** Timber as it is bought: volume in the piece × (1 + waste) × price. */
function timber({ volume_dm3, waste_percent, price_per_dm3 }: Of<'timber'>, scale: number): ExtraCells {
  const [volume, waste] = [exactFigure(volume_dm3), exactFigure(waste_percent)];
  return {
    ...{
      of: 'bought',
      amount: volume.toNumber(),
      unit: 'dm³',
      price: Number(price_per_dm3),
      percent: waste.toNumber(),
    },
    result: (amount, price, percent) => `${amount}*(1+${percent}/100)*${price}*${scale}`,
    value: volume.times(waste.div(100).plus(1)).times(price_per_dm3).times(scale),
  };
}

const paidQuantity = ({ quantity, unit, price }: Of<'paid-quantity'>, scale: number): ExtraCells => ({
  ...{ of: 'price', amount: Number(quantity), unit, price: Number(price) },
  result: (amount, each) => `${amount}*${each}*${scale}`,
  value: new D(quantity).times(price).times(scale),
});

function insurance({ percent, value }: Of<'insurance'>, scale: number): ExtraCells {
  const share = { percent: Number(percent) };
  if (value === null) return { of: 'insured', ...share, result: (_, __, own) => own, value: new D(percent) };
  return {
    ...{ of: 'bought', price: Number(value), ...share },
    result: (_, price, own) => `${price}*${scale}*${own}/100`,
    value: new D(value).times(scale).times(percent).div(100),
  };
}

/** What a further line is worked from; money comes out in minor units, so many in one of the currency. */
export function extraCells(extra: ExtraLine, scale: number): ExtraCells {
  switch (extra.kind) {
    case 'labour':
      return labour(extra);
    case 'bought-in':
      return amountOf('bought', extra.cost, scale);
    case 'timber':
      return timber(extra, scale);
    case 'paid-quantity':
      return paidQuantity(extra, scale);
    case 'price':
      return amountOf('price', extra.price, scale);
    case 'insurance':
      return insurance(extra, scale);
  }
}

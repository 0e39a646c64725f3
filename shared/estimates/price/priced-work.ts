import { directOf, hoursOf, labourOf, type LineWork } from '#shared/estimates/price/line-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { PriceRates } from '#shared/estimates/price/price-rates';
import { D, type MinorUnits } from '#shared/money/decimal';
import { priceOfCost } from '#shared/money/margin';
import { roundMinor } from '#shared/money/round-minor';

/**
 * How the price of a line arises, from what stands on that line alone:
 *
 *   direct       = its labour + consumables on it + its goods
 *   overhead     = its hours × rate, or its labour cost × share
 *   contingency  = its direct cost × share
 *   price        = (direct + overhead + contingency) × factor, rounded half up once
 *
 * so an hour more moves its own line and no other. Four things are totals before they are lines, and are shared out: leaf and materials
 * bought for the job (on the cost side), contingency from risk (by direct cost), insurance of the price itself, and an agreed lump sum.
 */
export interface PricedWork {
  readonly work: LineWork;
  readonly hours: D;
  /** Unrounded minor units, all five. */
  readonly labour: D;
  readonly direct: D;
  readonly overhead: D;
  readonly contingency: D;
  readonly unrounded: D;
  /** The price of record, before discount and tax. */
  readonly price_minor: MinorUnits;
}

/** What the price of any line arises with. */
export interface Pricing {
  readonly input: PriceInput;
  readonly rates: PriceRates;
}

function overheadOf(on: { hours: D; labour: D }, { way, rate }: PriceRates['overhead']): D {
  return way === 'per-hour' ? on.hours.times(rate) : on.labour.times(rate).div(100);
}

/** A line with its price, given its contingency; a line with a price of its own keeps it. Unrounded minor units in. */
export function pricedWork(work: LineWork, contingency: D, { input, rates }: Pricing): PricedWork {
  const [hours, labour, direct] = [hoursOf(work), labourOf(work), directOf(work)];
  const overhead = overheadOf({ hours, labour }, rates.overhead);
  const worked = priceOfCost(direct.plus(overhead).plus(contingency), input.profit);
  const unrounded = work.price_minor === null ? worked : new D(work.price_minor);
  return { work, hours, labour, direct, overhead, contingency, unrounded, price_minor: roundMinor(unrounded) };
}

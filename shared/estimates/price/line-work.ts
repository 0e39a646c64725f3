import type { CostHead, WorkKind } from '#shared/estimates/price/work-kind';
import { D } from '#shared/money/decimal';

/** One thing a line's money goes to, in unrounded minor units. */
export interface CostItem {
  readonly head: CostHead;
  readonly itemId: string | null;
  readonly name: string;
  readonly hours: D;
  readonly cost: D;
}

/** A line before it is priced: what stands behind it, or the price it was given, or what it insures. */
export interface LineWork {
  readonly id: string;
  readonly memberId: string | null;
  readonly kind: WorkKind;
  readonly name: string | null;
  readonly taxCategoryId: string;
  readonly items: readonly CostItem[];
  /** A price of its own, in whole minor units, instead of one worked from cost. */
  readonly price_minor: number | null;
  /** Insurance in care of the price itself, in percent: it can only be worked once the other lines are. */
  readonly insured_percent: D | null;
}

const nothing = new D(0);

/** Sum of decimal amounts, all of one unit. */
export const sumOf = (amounts: readonly D[]): D => amounts.reduce((sum, amount) => sum.plus(amount), nothing);

/** Direct cost of a line: everything spent on it, in unrounded minor units. */
export const directOf = (line: LineWork): D => sumOf(line.items.map((item) => item.cost));

/** Direct hours of a line. */
export const hoursOf = (line: LineWork): D => sumOf(line.items.map((item) => item.hours));

/** Labour cost of a line, in unrounded minor units. */
export const labourOf = (line: LineWork): D =>
  sumOf(line.items.filter((item) => item.head === 'labour').map((item) => item.cost));

/** A thing bought: no hours of the workshop's own. */
export const boughtItem = (head: CostHead, cost: D, of?: { itemId: string; name: string }): CostItem => ({
  head,
  itemId: of?.itemId ?? null,
  name: of?.name ?? '',
  hours: nothing,
  cost,
});

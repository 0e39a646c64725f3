import type { CostHead, WorkKind } from '#shared/estimates/price/work-kind';
import type { MinorUnits } from '#shared/money/decimal';
import type { TaxedNet } from '#shared/money/tax-by-category';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** One line of record: a rounded price before discount and tax. Worked lines have no name of their own, extra lines have. */
export interface PriceLine {
  /** `member/kind` or `general/kind` for worked lines, the extra line's id for the others. */
  readonly id: string;
  readonly memberId: string | null;
  readonly kind: WorkKind;
  readonly name: string | null;
  readonly taxCategoryId: string;
  readonly price_minor: MinorUnits;
}

/** The tax of one category of the workshop on its subtotal. */
export interface PriceTax extends TaxedNet {
  readonly taxCategoryId: string;
}

/** The client's side: prices, discount, tax, and not a word of cost. `reasons` explain only what a client may see. */
export interface PriceLines {
  readonly lines: readonly PriceLine[];
  readonly subtotal_minor: MinorUnits;
  readonly discount_minor: MinorUnits;
  /** Subtotal less discount. */
  readonly net_minor: MinorUnits;
  readonly taxes: readonly PriceTax[];
  readonly tax_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
  readonly reasons: readonly Reason[];
}

/** What one line costs, and how its price came about. */
export interface PriceLineCost {
  readonly lineId: string;
  readonly hours: number;
  readonly direct_minor: MinorUnits;
  readonly overhead_minor: MinorUnits;
  readonly contingency_minor: MinorUnits;
  readonly cost_minor: MinorUnits;
  readonly reasons: readonly Reason[];
}

/** What is spent under one head: labour by grade, leaf and materials by item, the others as one. */
export interface PriceHead {
  readonly head: CostHead;
  readonly itemId: string | null;
  /** Name of the grade, the leaf or the material; empty where the head is one. */
  readonly name: string;
  readonly hours: number;
  readonly cost_minor: MinorUnits;
}

/** The workshop's side: cost, overhead, contingency, and what is left. Heads sum to the direct cost, lines to the cost. */
export interface PriceCost {
  readonly heads: readonly PriceHead[];
  readonly lines: readonly PriceLineCost[];
  readonly hours: number;
  readonly direct_minor: MinorUnits;
  readonly overhead_minor: MinorUnits;
  readonly contingency_minor: MinorUnits;
  readonly cost_minor: MinorUnits;
  /** Of the subtotal, lines entered at a price of their own, with no cost behind them. */
  readonly priced_minor: MinorUnits;
  /** Asked for, shown both ways. */
  readonly margin_percent: number;
  readonly markUp_percent: number;
  /** Net less cost, and what that is of the net and of the cost, after discount; null where there is nothing to divide by. */
  readonly profit_minor: MinorUnits;
  readonly marginLeft_percent: number | null;
  readonly markUpLeft_percent: number | null;
  readonly reasons: readonly Reason[];
}

/** A worked price: what a client may see, what only the workshop sees, and what is to be told about the input. */
export interface Price {
  readonly client: PriceLines;
  readonly cost: PriceCost;
  readonly findings: readonly Finding[];
}

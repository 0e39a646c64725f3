import type { WorkKind } from '#shared/estimates/price/work-kind';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import type { DecimalText, MinorUnits } from '#shared/money/decimal';
import type { MoneyCard, Profit } from '#shared/rate-cards/money-card';

/** Hours of one grade on one kind of work of one member (null: of the job as a whole). Entries of the same place add up. */
export interface PriceLabour {
  readonly memberId: string | null;
  readonly kind: WorkKind;
  readonly gradeId: string;
  readonly hours: number;
}

/** Which line carries how much of something bought for the whole job; weights are exact leaves, grams, litres …, any one unit. */
export interface GoodsShare {
  readonly memberId: string | null;
  readonly kind: WorkKind;
  readonly weight: number;
}

/** Leaf of one product or one material, bought for the job as a whole: its total cost, and where it is used. */
export interface PriceGoods {
  readonly head: 'leaf' | 'materials';
  readonly itemId: string;
  readonly name: string;
  /** What it comes to, in the workshop's currency; rounded half up to the minor unit before it is shared out. */
  readonly cost: DecimalText;
  readonly shares: readonly GoodsShare[];
}

/** Contingency as a share of direct cost, or the amount the risk calculation found. */
export type PriceContingency =
  | { readonly way: 'share'; readonly percent: DecimalText }
  | { readonly way: 'risk'; readonly amount_minor: MinorUnits };

/** All that a price is worked from; alternatives not chosen are left out by the caller. */
export interface PriceInput {
  /** Decimals of the currency, from `currencyDigits`. */
  readonly digits: number;
  readonly card: Pick<MoneyCard, 'grades' | 'overhead' | 'consumables_percent' | 'taxCategories'>;
  readonly profit: Profit;
  readonly contingency: PriceContingency;
  readonly discount: EstimateSettings['discount'];
  /** Tax category of the worked lines; extra lines bring their own. */
  readonly taxCategoryId: string;
  /** Members in the order of the estimate, which is the order of their lines; ones not named follow as they first appear. */
  readonly memberIds: readonly string[];
  readonly labour: readonly PriceLabour[];
  readonly goods: readonly PriceGoods[];
  readonly extras: readonly ExtraLine[];
  /** An agreed total before discount and tax, spread over the lines by largest remainder. */
  readonly lumpSum?: DecimalText | null;
}

import type { Climate } from '#shared/drying/climate';
import type { MeasuredWork } from '#shared/estimates/price/measured-work';
import type { DecimalText } from '#shared/money/decimal';
import type { Profit } from '#shared/rate-cards/money-card';

/** One further line of an estimate: work or goods that no member carries. */
export type ExtraLine = {
  readonly id: string;
  readonly name: string;
  readonly taxCategoryId: string;
  readonly memberId: string | null;
  readonly alternativeId: string | null;
} & (
  | {
      readonly kind: 'labour';
      readonly gradeId: string;
      readonly hours: number;
      readonly work: 'making' | 'sample' | 'packing' | 'fitting' | 'other';
    }
  | { readonly kind: 'bought-in'; readonly cost: DecimalText }
  | {
      readonly kind: 'timber';
      readonly volume_dm3: number;
      readonly price_per_dm3: DecimalText;
      readonly waste_percent: number;
    }
  | {
      readonly kind: 'paid-quantity';
      readonly rule: string;
      readonly quantity: DecimalText;
      readonly unit: string;
      readonly price: DecimalText;
      /** What the quantity is reckoned from; absent where it follows a rule of the workshop's own. */
      readonly measured?: MeasuredWork | undefined;
    }
  | { readonly kind: 'insurance'; readonly percent: DecimalText; readonly value: DecimalText | null }
  | { readonly kind: 'price'; readonly price: DecimalText }
);

/** Another way of doing part of the work; of one group at most one is chosen, one without a group may be ticked. */
export interface Alternative {
  readonly id: string;
  readonly name: string;
  readonly group: string;
  readonly note: string;
  /** Base members, zones, ornaments and extra lines that fall away when it is chosen. */
  readonly replaces: readonly string[];
}

/** One stage of payment: a share of the contract with what it waits for. */
export interface Stage {
  readonly id: string;
  readonly name: string;
  readonly percent: number;
}

/** How the price comes of the cost: by margin, by mark-up, or a lump sum agreed before discount and tax. */
export type EstimateProfit = Profit | { readonly way: 'lump-sum'; readonly amount: DecimalText };

/** What an estimate says as a whole, beside its pieces and members. */
export interface EstimateSettings {
  readonly title: string;
  readonly introduction: string;
  readonly place: 'indoors' | 'outdoors' | 'damp';
  readonly restoration: boolean;
  readonly shop: Climate;
  readonly site: Climate;
  readonly presentation: 'members' | 'kinds';
  /** Null follows the rate card. */
  readonly profit: EstimateProfit | null;
  readonly contingency: { readonly way: 'share' | 'risk'; readonly percent: DecimalText } | null;
  readonly discount: { readonly way: 'percent' | 'amount'; readonly amount: DecimalText } | null;
  readonly taxCategoryId: string;
  readonly extras: readonly ExtraLine[];
  readonly alternatives: readonly Alternative[];
  readonly stages: {
    readonly deposit_percent: number;
    readonly parts: readonly Stage[];
    readonly retention_percent: number;
  };
  readonly validity_days: number;
  readonly leafValidity_days: number;
  readonly included: string;
  readonly excluded: string;
  readonly terms: string;
  /** Seed of the risk draws: the same seed gives the same figure. */
  readonly seed: number;
}

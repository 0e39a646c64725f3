import type { MinorUnits } from '#shared/money/decimal';
import type { Reason } from '#shared/words/reason';

/** A figure at its likely inputs and at four percentiles of the trials. The likely figure is not a likely total. */
export interface Percentiles {
  readonly atLikely: number;
  readonly p10: number;
  readonly p50: number;
  readonly p80: number;
  readonly p90: number;
}

/** Exact leaves of one product, and the booklets that cover them. */
export interface LeafPercentiles {
  readonly productId: string;
  readonly leaves: Percentiles;
  readonly booklets: Percentiles;
}

/** What 4,000 trials say of a job; the same seed gives the same figures on every machine. */
export interface Risk {
  readonly generator: 'xoshiro128**';
  readonly trials: number;
  readonly seed: number;
  readonly hours: Percentiles;
  /** Direct cost, whole minor units. */
  readonly direct_minor: Percentiles;
  readonly leaf: readonly LeafPercentiles[];
  /** Booklets of all products together; null in issues drawn before these were told. */
  readonly booklets: Percentiles | null;
  /** Direct cost at the percentile asked for. */
  readonly atPercentile_minor: MinorUnits;
  /** max(0, percentile − direct cost at the likely values). */
  readonly contingency_minor: MinorUnits;
  readonly reasons: readonly Reason[];
}

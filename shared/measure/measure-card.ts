import type { Relief } from '#shared/measure/relief';

/** What a rate card says about measuring: house values, true surface ÷ plan surface, plain numbers of at least 1. */
export interface MeasureCard {
  /** By relief; `in-the-round` is the factor on an enclosing plain form. */
  readonly reliefFactors: Readonly<Record<Relief, number>>;
  /** In the round where the surface itself was measured. */
  readonly measuredInTheRoundFactor: number;
}

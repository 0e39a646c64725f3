import type { CostedEstimate, PricedEstimate, WorkedEstimate } from '#shared/estimates/estimate-schema';
import type { EstimateSettings } from '#shared/estimates/settings';

/** An estimate as the reader may have it: whole for owner and estimator, with prices for the office, with neither for the bench. */
export type ReadEstimate = CostedEstimate | PricedEstimate | WorkedEstimate;

/** The settings every reader has, and those that only some have. */
export type ReaderSettings = Pick<
  EstimateSettings,
  'title' | 'place' | 'restoration' | 'shop' | 'site' | 'alternatives'
> &
  Partial<EstimateSettings>;

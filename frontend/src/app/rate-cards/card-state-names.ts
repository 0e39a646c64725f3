import type { RateCardState } from '#shared/rate-cards/rate-card-summary-schema';

/** Where a card stands, on screen. */
export const cardStateNames: Readonly<Record<RateCardState, string>> = {
  draft: $localize`draft`,
  set: $localize`set for a day`,
  'in-force': $localize`in force`,
  past: $localize`past`,
};

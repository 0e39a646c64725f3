import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { dryingFactor } from '#shared/drying/drying-factor';
import { dryingProgress, type ClimateStretch } from '#shared/drying/drying-progress';
import type { ClimateModel } from '#shared/buildups/buildup';
import { countUp } from '#shared/money/settled';

/** What has dried so far, and the air it goes on in. */
export interface DryingSoFar {
  readonly needed_minutes: number;
  readonly stretches: readonly ClimateStretch[];
  readonly climate: Climate;
}

/** Minutes still to dry in the air of now, rounded up to the minute: 0 when dry, null where it would never dry. `needed_minutes` is at the reference air. */
export function minutesToDry(model: ClimateModel, soFar: DryingSoFar, card: DryingCard): number | null {
  const left = soFar.needed_minutes - dryingProgress(model, soFar.stretches, card).reference_minutes;
  if (left <= 1e-6) return 0;
  const { factor } = dryingFactor(model, soFar.climate, card);
  return factor === null ? null : countUp(left * factor);
}

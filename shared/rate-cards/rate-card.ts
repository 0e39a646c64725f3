import type { BuildUpCard } from '#shared/buildups/buildup-card';
import type { CarvingCard } from '#shared/carving/carving-card';
import type { DryingCard } from '#shared/drying/drying-card';
import type { LeafCard } from '#shared/leaf/leaf-card';
import type { MeasureCard } from '#shared/measure/measure-card';
import type { MoneyCard } from '#shared/rate-cards/money-card';

/** Everything an estimate is worked from besides the piece itself: one document per version; an item keeps its id through every copy. */
export interface RateCard {
  readonly measure: MeasureCard;
  readonly carving: CarvingCard;
  readonly leaf: LeafCard;
  readonly buildUps: BuildUpCard;
  readonly drying: DryingCard;
  readonly money: MoneyCard;
}

import type { BuildUpCard } from '#shared/buildups/buildup-card';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

/** Share (0 to 1) that is burnished of a zone burnished and matte: its own, else the card's. */
export const burnishedShare = (facts: Pick<ZoneFacts, 'burnished_percent'>, card: BuildUpCard): number =>
  (facts.burnished_percent ?? card.burnished_percent) / 100;
